/** Puts the geometry on a graphics. */
@NullMarked
package earward.drawing.internal.paint;

import org.jspecify.annotations.NullMarked;
