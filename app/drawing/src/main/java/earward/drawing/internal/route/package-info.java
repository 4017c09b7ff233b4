/** Wires between placed parts. */
@NullMarked
package earward.drawing.internal.route;

import org.jspecify.annotations.NullMarked;
