/** What a designer may set. */
@NullMarked
@Offered(since = 1)
package earward.block.setting;

import earward.block.mark.Offered;
import org.jspecify.annotations.NullMarked;
