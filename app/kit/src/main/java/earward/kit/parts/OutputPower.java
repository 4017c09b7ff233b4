package earward.kit.parts;

import earward.block.law.ClippedSine;

/**
 * One output power of an amplifier IC, as a data sheet has it.
 *
 * @param supplyVolts the supply at which it holds, above 0
 * @param loadOhms the load, above 0
 * @param watts the power, above 0
 * @param distortion at which it holds, from 0 to 0.4; 0 for the edge of clipping
 * @param typical whether it is typical; otherwise the least of any specimen
 */
public record OutputPower(
    double supplyVolts, double loadOhms, double watts, double distortion, boolean typical) {
  public OutputPower {
    requireAbove(supplyVolts, "supply (V)");
    requireAbove(loadOhms, "load (Ω)");
    requireAbove(watts, "power (W)");
    if (!(distortion >= 0 && distortion <= 0.4)) {
      throw new IllegalArgumentException(
          "the distortion of an output power is " + distortion + "; it must be from 0 to 40 %");
    }
  }

  private static void requireAbove(double value, String what) {
    if (!(value > 0) || Double.isInfinite(value)) {
      throw new IllegalArgumentException(
          "the " + what + " of an output power is " + value + "; it must be above 0");
    }
  }

  /** Peak volts across the load at the edge of clipping: √(2·RL·P/ratio), a clipped sine's. */
  double clipVolts() {
    return Math.sqrt(2 * loadOhms * watts / clippedRatio());
  }

  private double clippedRatio() {
    return distortion == 0 ? 1 : ClippedSine.powerRatio(ClippedSine.overdriveOf(distortion));
  }
}
