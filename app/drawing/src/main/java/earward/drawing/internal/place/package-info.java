/** Where the parts of one block stand. */
@NullMarked
package earward.drawing.internal.place;

import org.jspecify.annotations.NullMarked;
