/** Blocks side by side in rows. */
@NullMarked
package earward.drawing.internal.page;

import org.jspecify.annotations.NullMarked;
