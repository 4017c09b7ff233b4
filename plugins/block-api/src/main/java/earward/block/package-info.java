/** All that a block author sees. */
@NullMarked
package earward.block;

import org.jspecify.annotations.NullMarked;
