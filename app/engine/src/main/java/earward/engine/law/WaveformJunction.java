package earward.engine.law;

/**
 * A junction over time: i = Is·(exp(u/nVt) − 1), breakdown, and the charge of Cj0/(1 − u/Vj)^M,
 * continued linearly in its capacitance above Vj/2. Leakage is linear and stamped apart.
 *
 * <p>Source: Shockley 1949; depletion charge as in any device text. It shares no code with the
 * carrier-averaged method, whose yardstick it is part of.
 *
 * @param saturationAmperes Is at the case's temperature
 * @param scaledVolts n·Vt
 * @param farads Cj0, 0 for none
 * @param builtInVolts Vj
 * @param grading M
 * @param breakdownVolts reverse voltage of breakdown
 */
record WaveformJunction(
    double saturationAmperes,
    double scaledVolts,
    double farads,
    double builtInVolts,
    double grading,
    double breakdownVolts)
    implements WaveformDevice {
  /** Beyond this exponent the exponential goes on along its tangent. */
  private static final double MOST_EXPONENT = 80;

  /** So far above breakdown nothing of it is seen. */
  private static final double NO_BREAKDOWN = -40;

  @Override
  public int controls() {
    return 1;
  }

  @Override
  public int outputs() {
    return 1;
  }

  @Override
  public void evaluate(
      double[] volts, int at, double[] into, int outputAt, double[] slopes, int slopeAt) {
    double exponent = volts[at] / scaledVolts;
    double capped = Math.min(exponent, MOST_EXPONENT);
    double e = Math.exp(capped);
    double amperes = saturationAmperes * (e * (1 + exponent - capped) - 1);
    double siemens = saturationAmperes * e / scaledVolts;
    double reverse = -(volts[at] + breakdownVolts) / scaledVolts;
    if (reverse > NO_BREAKDOWN) {
      double held = Math.min(reverse, MOST_EXPONENT);
      double r = Math.exp(held);
      amperes -= saturationAmperes * r * (1 + reverse - held);
      siemens += saturationAmperes * r / scaledVolts;
    }
    into[outputAt] = amperes;
    slopes[slopeAt] = siemens;
  }

  @Override
  public double limited(int control, double from, double to) {
    double knee = scaledVolts * Math.log(scaledVolts / saturationAmperes);
    if (to <= knee || to - from <= 2 * scaledVolts) {
      return to;
    }
    double start = Math.max(from, knee);
    return start + scaledVolts * Math.log1p((to - start) / scaledVolts);
  }

  @Override
  public double kneeVolts() {
    return scaledVolts;
  }

  @Override
  public boolean charged() {
    return farads > 0;
  }

  @Override
  public double capacitance(double volts) {
    double half = builtInVolts / 2;
    if (volts <= half) {
      return farads * Math.pow(1 - volts / builtInVolts, -grading);
    }
    double atHalf = farads * Math.pow(0.5, -grading);
    return atHalf * (1 + 2 * grading / builtInVolts * (volts - half));
  }

  @Override
  public double charge(double volts) {
    double half = builtInVolts / 2;
    double below = Math.min(volts, half);
    double left = 1 - grading;
    double charge = farads * builtInVolts / left * (1 - Math.pow(1 - below / builtInVolts, left));
    double over = volts - below;
    double atHalf = farads * Math.pow(0.5, -grading);
    return charge + atHalf * over * (1 + grading / builtInVolts * over);
  }
}
