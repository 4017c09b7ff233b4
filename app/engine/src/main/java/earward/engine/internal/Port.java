package earward.engine.internal;

import earward.engine.law.CarrierDriven;
import earward.engine.law.DirectStage;

/**
 * One port of a carrier-driven part.
 *
 * @param law of the part
 * @param which of its ports
 */
record Port(String part, CarrierDriven law, int which) {
  /** Unknown at which its current begins, −1 for ground. */
  int anode(DirectStage stage) {
    return law.anode(stage, which);
  }

  /** Unknown at which its current ends, −1 for ground. */
  int cathode(DirectStage stage) {
    return law.cathode(stage, which);
  }

  /** Resistance between it and its junction, in Ω. */
  double seriesOhms(DirectStage stage) {
    return law.seriesOhms(stage, which);
  }
}
