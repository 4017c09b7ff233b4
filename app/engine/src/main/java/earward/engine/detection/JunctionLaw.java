package earward.engine.detection;

/**
 * The law of one junction at one temperature: i = Is·(exp(u/nVt) − 1) + g·u, breakdown, and a
 * charge of Cj0/(1 − u/Vj)^M. Series resistance is not part of it; it belongs to the surroundings.
 *
 * <p>Source: Shockley 1949; depletion charge as in any device text, its capacitance continued
 * linearly above Vj/2. One instance a device and solver; {@link #set} changes its figures.
 */
public final class JunctionLaw extends PortLaw {
  /** Further than this many thermal voltages from breakdown its current is below any rounding. */
  private static final double FAR = 80;

  private double saturationAmperes;
  private double scaledThermalVolts;
  private double leakageSiemens;
  private double junctionFarads;
  private double builtInVolts;
  private double gradingExponent;
  private double breakdownVolts;
  private int version;
  private final PowerTable power = new PowerTable();

  /** The exponent for which {@link #kneePower} holds. */
  private double kneeExponent = Double.NaN;

  private double kneePower;

  /** A law without figures yet. */
  public JunctionLaw() {
    set(1e-9, 25.7e-3, 0, 0, 0.5, 0.5, 1e3);
  }

  /**
   * Sets the figures.
   *
   * @param saturationAmperes Is at this temperature, above 0
   * @param scaledThermalVolts n·Vt, above 0
   * @param leakageSiemens conductance in parallel, at least 0
   * @param junctionFarads Cj0, at least 0
   * @param builtInVolts Vj, above 0
   * @param gradingExponent M, from 0 to 0.9
   * @param breakdownVolts above 0
   */
  public void set(
      double saturationAmperes,
      double scaledThermalVolts,
      double leakageSiemens,
      double junctionFarads,
      double builtInVolts,
      double gradingExponent,
      double breakdownVolts) {
    if (this.saturationAmperes != saturationAmperes
        || this.scaledThermalVolts != scaledThermalVolts
        || this.leakageSiemens != leakageSiemens
        || this.junctionFarads != junctionFarads
        || this.builtInVolts != builtInVolts
        || this.gradingExponent != gradingExponent
        || this.breakdownVolts != breakdownVolts) {
      version++;
    }
    this.saturationAmperes = saturationAmperes;
    this.scaledThermalVolts = scaledThermalVolts;
    this.leakageSiemens = leakageSiemens;
    this.junctionFarads = junctionFarads;
    this.builtInVolts = builtInVolts;
    this.gradingExponent = gradingExponent;
    this.breakdownVolts = breakdownVolts;
    if (gradingExponent != kneeExponent) {
      kneeExponent = gradingExponent;
      kneePower = Math.pow(0.5, -gradingExponent - 1);
      power.set(-gradingExponent);
    }
  }

  /** Current in amperes at a junction voltage. */
  public double current(double volts) {
    return saturationAmperes * (exponential(volts / scaledThermalVolts) - 1)
        + leakageSiemens * volts
        - saturationAmperes * exponential(-(volts + breakdownVolts) / scaledThermalVolts);
  }

  /** Slope of the current, in siemens. */
  public double conductance(double volts) {
    return saturationAmperes
            / scaledThermalVolts
            * (slope(volts / scaledThermalVolts)
                + slope(-(volts + breakdownVolts) / scaledThermalVolts))
        + leakageSiemens;
  }

  @Override
  public int ports() {
    return 1;
  }

  @Override
  void currents(double first, double second) {
    double exponent = first / scaledThermalVolts;
    double grown = exponential(exponent);
    double slope = exponent <= MOST_EXPONENT ? grown : Math.exp(MOST_EXPONENT);
    double beyond = -(first + breakdownVolts) / scaledThermalVolts;
    firstAmperes = saturationAmperes * (grown - 1) + leakageSiemens * first;
    if (beyond > -FAR) {
      firstAmperes -= saturationAmperes * exponential(beyond);
      slope += slope(beyond);
    }
    firstByFirst = saturationAmperes / scaledThermalVolts * slope + leakageSiemens;
  }

  @Override
  void charges(double volts) {
    double here = Math.min(volts, builtInVolts / 2);
    double left = 1 - here / builtInVolts;
    double grown = gradingExponent == 0.5 ? 1 / Math.sqrt(left) : power.of(left);
    farads = junctionFarads * grown;
    coulombs = junctionFarads * builtInVolts / (1 - gradingExponent) * (1 - left * grown);
    if (volts > here) {
      double over = volts - here;
      double slope = capacitanceSlopeAtKnee();
      coulombs += farads * over + slope * over * over / 2;
      farads += slope * over;
    }
  }

  /** Whether there is a junction charge at all. */
  @Override
  public boolean charged() {
    return junctionFarads > 0;
  }

  /** Charge in coulombs. */
  public double charge(double volts) {
    double knee = builtInVolts / 2;
    if (volts <= knee) {
      return depletionCharge(volts);
    }
    double over = volts - knee;
    return depletionCharge(knee)
        + capacitance(knee) * over
        + capacitanceSlopeAtKnee() * over * over / 2;
  }

  /** Capacitance in farads. */
  public double capacitance(double volts) {
    double knee = builtInVolts / 2;
    double here = Math.min(volts, knee);
    double farads = junctionFarads * Math.pow(1 - here / builtInVolts, -gradingExponent);
    return volts <= knee ? farads : farads + capacitanceSlopeAtKnee() * (volts - knee);
  }

  /** A voltage towards which a Newton step may go: see {@link PortLaw#shortened}. */
  public double limited(double from, double to) {
    return shortened(saturationAmperes, scaledThermalVolts, from, to);
  }

  /** Is at this temperature, in A. */
  public double saturationAmperes() {
    return saturationAmperes;
  }

  /** Changes whenever a figure does. */
  int version() {
    return version;
  }

  /** Slope of the capacitance that {@link #charges} has just found, in F/V. */
  double faradsByVolt(double volts) {
    return volts < builtInVolts / 2
        ? farads * gradingExponent / (builtInVolts - volts)
        : capacitanceSlopeAtKnee();
  }

  /** Slope of that slope, in F/V². */
  double faradsByVoltSquared(double volts, double byVolt) {
    return volts < builtInVolts / 2 ? byVolt * (gradingExponent + 1) / (builtInVolts - volts) : 0;
  }

  /** n·Vt, in V. */
  double scaledThermalVolts() {
    return scaledThermalVolts;
  }

  /** Above this voltage breakdown adds nothing, in V. */
  double leastVolts() {
    return FAR * scaledThermalVolts - breakdownVolts;
  }

  /** Conductance in parallel, in S. */
  public double leakageSiemens() {
    return leakageSiemens;
  }

  @Override
  double limited(int port, double from, double to) {
    return limited(from, to);
  }

  @Override
  double gentleVolts() {
    return scaledThermalVolts;
  }

  private double depletionCharge(double volts) {
    double power = 1 - gradingExponent;
    return junctionFarads * builtInVolts / power * (1 - Math.pow(1 - volts / builtInVolts, power));
  }

  private double capacitanceSlopeAtKnee() {
    return junctionFarads * gradingExponent / builtInVolts * kneePower;
  }

  private static double slope(double exponent) {
    return Math.exp(Math.min(exponent, MOST_EXPONENT));
  }
}
