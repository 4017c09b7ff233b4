/** The kit design: the document, its path and its review. */
@NullMarked
package earward.kit;

import org.jspecify.annotations.NullMarked;
