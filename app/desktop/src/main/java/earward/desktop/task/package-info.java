/** Work off the event thread. */
@NullMarked
package earward.desktop.task;

import org.jspecify.annotations.NullMarked;
