/** Published formulas that blocks share: pure functions with their source. */
@NullMarked
@Offered(since = 1)
package earward.block.law;

import earward.block.mark.Offered;
import org.jspecify.annotations.NullMarked;
