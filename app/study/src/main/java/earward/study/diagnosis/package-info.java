/** From a builder's readings to the faults that explain them. */
@NullMarked
package earward.study.diagnosis;

import org.jspecify.annotations.NullMarked;
