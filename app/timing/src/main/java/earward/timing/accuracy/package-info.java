/** The accuracy of carrier-averaged detection over random designs, against the full waveform. */
@NullMarked
package earward.timing.accuracy;

import org.jspecify.annotations.NullMarked;
