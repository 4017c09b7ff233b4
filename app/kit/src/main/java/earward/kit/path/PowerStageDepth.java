package earward.kit.path;

import earward.block.law.ClippedSine;

/** The depth of modulation at which the power stage clips so far that it distorts by 3 %. */
final class PowerStageDepth {
  private static final double CLEAN_DISTORTION = 0.03;

  /** Drive over clip level of a sine that is clipped to 3 %: 1.080. */
  private static final double OVERDRIVE = ClippedSine.overdriveOf(CLEAN_DISTORTION);

  private PowerStageDepth() {}

  /**
   * What is heard grows with the depth, so the depth that clips is in proportion.
   *
   * @param depth of the signal that was solved
   * @param overloadDecibels its peak over the edge of clipping, below 0 where it does not clip
   */
  static double of(double depth, double overloadDecibels) {
    return depth * OVERDRIVE * Math.pow(10, -overloadDecibels / 20);
  }
}
