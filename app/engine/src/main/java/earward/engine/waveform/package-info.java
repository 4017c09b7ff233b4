/**
 * The full waveform: the whole nonlinear path at the carrier's own rate, nothing averaged. The
 * yardstick of carrier-averaged detection, whose code it does not share.
 */
@NullMarked
package earward.engine.waveform;

import org.jspecify.annotations.NullMarked;
