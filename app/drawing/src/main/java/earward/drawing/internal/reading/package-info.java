/** Reads a drawing as somebody would who has nothing but the paper. */
@NullMarked
package earward.drawing.internal.reading;

import org.jspecify.annotations.NullMarked;
