package earward.engine.detection;

/**
 * Currents through the one or two ports of a device by the voltages across them, in amperes and
 * volts, with their slopes. Results stand in the fields until the next call: a cycle is solved
 * thousands of times, and nothing may be allocated. One instance a device and thread.
 */
public abstract class PortLaw {
  /** Beyond this exponent an exponential goes on along its tangent, so that nothing overflows. */
  static final double MOST_EXPONENT = 80;

  double firstAmperes;
  double secondAmperes;
  double firstByFirst;
  double firstBySecond;
  double secondByFirst;
  double secondBySecond;

  /** Charge and capacitance at the first port: only a device of one port has them. */
  double coulombs;

  double farads;

  /** How many ports, 1 or 2. */
  public abstract int ports();

  /** Fills currents and slopes. */
  abstract void currents(double first, double second);

  /** Whether there is a charge at all. */
  public boolean charged() {
    return false;
  }

  /** Fills charge and capacitance. */
  void charges(double volts) {}

  /** A voltage of a port towards which a Newton step may go. */
  abstract double limited(int port, double from, double to);

  /** A change of voltage, in V, over which the device is nearly linear. */
  abstract double gentleVolts();

  static double exponential(double exponent) {
    return exponent <= MOST_EXPONENT
        ? Math.exp(exponent)
        : Math.exp(MOST_EXPONENT) * (1 + exponent - MOST_EXPONENT);
  }

  /**
   * Shortens a large step up an exponential to the logarithm of what it asks, so that the current
   * does not explode.
   */
  static double shortened(double saturationAmperes, double thermalVolts, double from, double to) {
    double knee = thermalVolts * Math.log(thermalVolts / saturationAmperes);
    if (to <= knee || to - from <= 2 * thermalVolts) {
      return to;
    }
    double base = Math.max(from, knee);
    return base + thermalVolts * Math.log1p((to - base) / thermalVolts);
  }
}
