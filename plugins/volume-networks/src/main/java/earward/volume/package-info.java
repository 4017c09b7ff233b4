/** Volume networks. */
@NullMarked
package earward.volume;

import org.jspecify.annotations.NullMarked;
