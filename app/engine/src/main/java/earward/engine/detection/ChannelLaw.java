package earward.engine.detection;

/**
 * A junction field-effect transistor by its gate-source and gate-drain ports. The square law
 * (Shockley 1952, in the square-law form) below and above pinch-off is one difference of squares: i
 * = Idss·(a² − b²) with a = max(0, 1 + vgs/Vp), b = max(0, 1 + vgd/Vp). Ports run from the gate of
 * an n-channel, to the gate of a p-channel device. No current flows in the gate.
 */
public final class ChannelLaw extends PortLaw {
  private double saturatedAmperes = 5e-3;
  private double pinchOffVolts = 2;

  /**
   * Sets the figures.
   *
   * @param saturatedAmperes Idss, above 0
   * @param pinchOffVolts magnitude of Vp, above 0
   */
  public void set(double saturatedAmperes, double pinchOffVolts) {
    this.saturatedAmperes = saturatedAmperes;
    this.pinchOffVolts = pinchOffVolts;
  }

  @Override
  public int ports() {
    return 2;
  }

  @Override
  void currents(double first, double second) {
    double source = Math.max(0, 1 + first / pinchOffVolts);
    double drain = Math.max(0, 1 + second / pinchOffVolts);
    firstAmperes = saturatedAmperes * (source * source - drain * drain);
    firstByFirst = 2 * saturatedAmperes * source / pinchOffVolts;
    firstBySecond = -2 * saturatedAmperes * drain / pinchOffVolts;
    secondAmperes = -firstAmperes;
    secondByFirst = -firstByFirst;
    secondBySecond = -firstBySecond;
  }

  @Override
  double limited(int port, double from, double to) {
    return to;
  }

  @Override
  double gentleVolts() {
    return pinchOffVolts / 10;
  }
}
