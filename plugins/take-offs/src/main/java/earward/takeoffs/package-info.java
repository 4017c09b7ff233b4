/** Take-offs: AGC, meter, muting. */
@NullMarked
package earward.takeoffs;

import org.jspecify.annotations.NullMarked;
