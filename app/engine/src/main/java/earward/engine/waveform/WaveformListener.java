package earward.engine.waveform;

/** Is told how a full waveform goes on, and may end it. Called once a carrier cycle. */
public interface WaveformListener {
  /** One that only waits. */
  WaveformListener PATIENT = (stepsPerCycle, period, share) -> true;

  /**
   * Tells how far it is.
   *
   * @param stepsPerCycle steps of a carrier cycle, 0 while the bare carrier settles
   * @param period which audio period is being run with these steps, from 1
   * @param share of it that is done, from 0 to 1
   * @return whether to go on
   */
  boolean goesOn(int stepsPerCycle, int period, double share);
}
