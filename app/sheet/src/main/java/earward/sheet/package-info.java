/** The build sheet as a PDF. */
@NullMarked
package earward.sheet;

import org.jspecify.annotations.NullMarked;
