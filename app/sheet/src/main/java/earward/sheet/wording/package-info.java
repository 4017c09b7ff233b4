/** The words of the sheet, one file a language, with checked placeholders. */
@NullMarked
package earward.sheet.wording;

import org.jspecify.annotations.NullMarked;
