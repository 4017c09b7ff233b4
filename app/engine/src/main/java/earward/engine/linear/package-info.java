/** Small dense linear systems on flat arrays, allocated once and refilled. */
@NullMarked
package earward.engine.linear;

import org.jspecify.annotations.NullMarked;
