/** Loads. */
@NullMarked
package earward.loads;

import org.jspecify.annotations.NullMarked;
