/** Supplies. */
@NullMarked
package earward.supplies;

import org.jspecify.annotations.NullMarked;
