/** The sections of the sheet, each made from content into pieces. Not for use from outside. */
@NullMarked
package earward.sheet.internal.section;

import org.jspecify.annotations.NullMarked;
