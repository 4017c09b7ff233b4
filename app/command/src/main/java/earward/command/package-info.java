/** The command line and the launcher. */
@NullMarked
package earward.command;

import org.jspecify.annotations.NullMarked;
