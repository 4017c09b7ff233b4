/** All that a block author sees: {@link earward.block.BlockType} is the place to start. */
@NullMarked
@Offered(since = 1)
package earward.block;

import earward.block.mark.Offered;
import org.jspecify.annotations.NullMarked;
