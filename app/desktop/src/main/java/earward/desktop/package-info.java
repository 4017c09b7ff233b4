/** The desktop program. */
@NullMarked
package earward.desktop;

import org.jspecify.annotations.NullMarked;
