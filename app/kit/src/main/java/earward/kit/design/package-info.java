/** The kit design: one immutable document; an edit is a function from design to design. */
@NullMarked
package earward.kit.design;

import org.jspecify.annotations.NullMarked;
