/** Benchmarks; never shipped. */
@NullMarked
package earward.timing;

import org.jspecify.annotations.NullMarked;
