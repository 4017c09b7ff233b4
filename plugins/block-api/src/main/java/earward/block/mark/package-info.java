/** The mark of what may be built against. */
@NullMarked
@Offered(since = 1)
package earward.block.mark;

import org.jspecify.annotations.NullMarked;
