/** Units and preferred values. */
@NullMarked
@Offered(since = 1)
package earward.block.quantity;

import earward.block.mark.Offered;
import org.jspecify.annotations.NullMarked;
