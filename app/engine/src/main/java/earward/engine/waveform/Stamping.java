package earward.engine.waveform;

import earward.engine.law.WaveformStage;

/** Gives the equations of the circuit that is to be run. */
@FunctionalInterface
public interface Stamping {
  /**
   * The equations.
   *
   * @param tuningRadians ωc less the resonance of a tuned feed's winding, in rad/s
   * @param quiet whether audio amplifiers only rest
   */
  WaveformStage stamped(double tuningRadians, boolean quiet);
}
