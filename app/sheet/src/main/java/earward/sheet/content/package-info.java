/** What one build sheet says, as data: figures, rows and sentences, ready to be laid out. */
@NullMarked
package earward.sheet.content;

import org.jspecify.annotations.NullMarked;
