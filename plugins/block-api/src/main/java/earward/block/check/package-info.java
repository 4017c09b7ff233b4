/** Checks and remedies as data, and the one finding type. */
@NullMarked
@Offered(since = 1)
package earward.block.check;

import earward.block.mark.Offered;
import org.jspecify.annotations.NullMarked;
