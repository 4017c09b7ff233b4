/** Windows and panels; only these touch widgets. */
@NullMarked
package earward.desktop.view;

import org.jspecify.annotations.NullMarked;
