/**
 * Build stages: the kit fitted and tried from the loudspeaker back, each partial kit solved as it
 * stands with what the builder connects where the path is cut.
 */
@NullMarked
package earward.kit.stage;

import org.jspecify.annotations.NullMarked;
