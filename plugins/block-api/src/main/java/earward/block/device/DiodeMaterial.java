package earward.block.device;

/**
 * What a diode's junction is made of: it sets how the saturation current moves with temperature.
 *
 * <p>Is(T) = Is0·(T/T0)^(x/n)·exp((q·Eg/(n·k))·(1/T0 − 1/T)); x and Eg are common practice, from
 * memory.
 */
public enum DiodeMaterial {
  SILICON(1.11, 3),
  SCHOTTKY(0.69, 2),
  GERMANIUM(0.67, 3);

  private final double gapElectronVolts;
  private final double temperatureExponent;

  DiodeMaterial(double gapElectronVolts, double temperatureExponent) {
    this.gapElectronVolts = gapElectronVolts;
    this.temperatureExponent = temperatureExponent;
  }

  /** Eg, in electron volts. */
  public double gapElectronVolts() {
    return gapElectronVolts;
  }

  /** x, a plain number. */
  public double temperatureExponent() {
    return temperatureExponent;
  }
}
