/** Finds, checks, loads and guards plug-ins. */
@NullMarked
package earward.host;

import org.jspecify.annotations.NullMarked;
