/** Many kits of one design, each out of other parts: spread of the readings, and the yield. */
@NullMarked
package earward.study.batch;

import org.jspecify.annotations.NullMarked;
