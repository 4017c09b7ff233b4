package earward.engine.detection;

/**
 * A bipolar transistor by its base-emitter and base-collector ports: Ebers and Moll 1954 in the
 * transport form, with Early's factor 1 + vce/Va, not below a tenth. Ports run from base to emitter
 * and from base to collector of an npn, the other way round of a pnp.
 */
public final class TransistorLaw extends PortLaw {
  private static final double LEAST_EARLY = 0.1;

  private double saturationAmperes = 1e-14;
  private double thermalVolts = 25.7e-3;
  private double forwardGain = 100;
  private double reverseGain = 1;
  private double earlyVolts = 100;

  /**
   * Sets the figures.
   *
   * @param saturationAmperes Is at this temperature, above 0
   * @param thermalVolts Vt, above 0
   * @param forwardGain above 0
   * @param reverseGain above 0
   * @param earlyVolts above 0, infinite for none
   */
  public void set(
      double saturationAmperes,
      double thermalVolts,
      double forwardGain,
      double reverseGain,
      double earlyVolts) {
    this.saturationAmperes = saturationAmperes;
    this.thermalVolts = thermalVolts;
    this.forwardGain = forwardGain;
    this.reverseGain = reverseGain;
    this.earlyVolts = earlyVolts;
  }

  @Override
  public int ports() {
    return 2;
  }

  @Override
  void currents(double first, double second) {
    double forward = saturationAmperes * exponential(first / thermalVolts);
    double backward = saturationAmperes * exponential(second / thermalVolts);
    double byForward = slope(first);
    double byBackward = slope(second);
    double factor = 1 + (first - second) / earlyVolts;
    boolean bounded = factor < LEAST_EARLY;
    double early = bounded ? LEAST_EARLY : factor;
    double growth = bounded ? 0 : (forward - backward) / earlyVolts;
    double across = (forward - backward) * early;
    double acrossByFirst = byForward * early + growth;
    double acrossBySecond = -byBackward * early - growth;
    firstAmperes = (forward - saturationAmperes) / forwardGain + across;
    secondAmperes = (backward - saturationAmperes) / reverseGain - across;
    firstByFirst = byForward / forwardGain + acrossByFirst;
    firstBySecond = acrossBySecond;
    secondByFirst = -acrossByFirst;
    secondBySecond = byBackward / reverseGain - acrossBySecond;
  }

  private double slope(double volts) {
    return saturationAmperes
        / thermalVolts
        * Math.exp(Math.min(volts / thermalVolts, MOST_EXPONENT));
  }

  @Override
  double limited(int port, double from, double to) {
    return shortened(saturationAmperes, thermalVolts, from, to);
  }

  @Override
  double gentleVolts() {
    return thermalVolts;
  }
}
