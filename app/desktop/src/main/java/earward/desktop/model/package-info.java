/** What the window shows and does, without any widget. */
@NullMarked
package earward.desktop.model;

import org.jspecify.annotations.NullMarked;
