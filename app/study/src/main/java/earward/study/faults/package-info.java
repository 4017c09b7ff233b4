/** What the readings and observations of a kit would be for each single fault. */
@NullMarked
package earward.study.faults;

import org.jspecify.annotations.NullMarked;
