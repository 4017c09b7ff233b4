/** Power stages. */
@NullMarked
package earward.power;

import org.jspecify.annotations.NullMarked;
