/** Detectors. */
@NullMarked
package earward.detectors;

import org.jspecify.annotations.NullMarked;
