/** Audio filters. */
@NullMarked
package earward.filters;

import org.jspecify.annotations.NullMarked;
