/** Circuit drawings and curves on a Graphics2D. */
@NullMarked
package earward.drawing;

import org.jspecify.annotations.NullMarked;
