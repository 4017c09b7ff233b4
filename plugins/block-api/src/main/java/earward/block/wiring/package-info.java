/** Parts on nodes, each with one placement word, and the ports by which blocks meet. */
@NullMarked
@Offered(since = 1)
package earward.block.wiring;

import earward.block.mark.Offered;
import org.jspecify.annotations.NullMarked;
