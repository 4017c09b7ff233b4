/** Curves on a Graphics2D, for the screen and the sheet alike. */
@NullMarked
package earward.drawing.curve;

import org.jspecify.annotations.NullMarked;
