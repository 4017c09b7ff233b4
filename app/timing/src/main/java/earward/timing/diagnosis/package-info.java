/** Faults that are known, diagnosed from readings as a builder would take them. */
@NullMarked
package earward.timing.diagnosis;

import org.jspecify.annotations.NullMarked;
