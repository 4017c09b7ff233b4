/** What a reviewed kit says, gathered into the rows of a sheet. Not for use from outside. */
@NullMarked
package earward.sheet.internal.gather;

import org.jspecify.annotations.NullMarked;
