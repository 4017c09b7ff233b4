/** Paper, type, tables and the flow of pieces over pages. Not for use from outside. */
@NullMarked
package earward.sheet.internal.page;

import org.jspecify.annotations.NullMarked;
