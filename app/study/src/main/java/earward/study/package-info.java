/** Many solves of one design: batch, limits, fault guide. */
@NullMarked
package earward.study;

import org.jspecify.annotations.NullMarked;
