/** The names of figures: place, quantity, case. */
@NullMarked
@Offered(since = 1)
package earward.block.figure;

import earward.block.mark.Offered;
import org.jspecify.annotations.NullMarked;
