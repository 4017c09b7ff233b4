/** Symbols and marks as forms on a grid of cells. */
@NullMarked
package earward.drawing.internal.form;

import org.jspecify.annotations.NullMarked;
