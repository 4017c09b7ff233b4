/**
 * Carrier-averaged detection: one carrier cycle solved for all carrier-driven devices at each
 * instant of the audio, inside a harmonic balance at the audio rate.
 */
@NullMarked
package earward.engine.detection;

import org.jspecify.annotations.NullMarked;
