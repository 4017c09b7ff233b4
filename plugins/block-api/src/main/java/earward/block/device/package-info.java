/** The sealed device kinds, each with one law, and the figures of library parts. */
@NullMarked
@Offered(since = 1)
package earward.block.device;

import earward.block.mark.Offered;
import org.jspecify.annotations.NullMarked;
