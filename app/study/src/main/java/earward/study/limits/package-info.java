/** What a healthy kit reads at each test point, on the builder's own instruments. */
@NullMarked
package earward.study.limits;

import org.jspecify.annotations.NullMarked;
