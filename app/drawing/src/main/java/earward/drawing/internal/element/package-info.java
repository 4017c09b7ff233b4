/** What a drawing is made of: immutable geometry in points, y growing downwards. */
@NullMarked
package earward.drawing.internal.element;

import org.jspecify.annotations.NullMarked;
