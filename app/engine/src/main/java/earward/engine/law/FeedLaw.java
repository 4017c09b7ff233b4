package earward.engine.law;

/**
 * What brings the carrier. At the carrier itself its held quantity is given as one volt: the e.m.f.
 * of an untuned feed, the winding's voltage of a tuned one.
 */
public abstract class FeedLaw extends Law {
  FeedLaw(Seat seat) {
    super(seat);
  }

  /** Whether the held quantity is the voltage of a resonant winding. */
  public abstract boolean tuned();

  /** Adds the right-hand side of one held volt. */
  public abstract void hold(double[] sideRe, DirectStage point);

  /** Branch whose current the held winding gives; −1 for an untuned feed. */
  public abstract int heldBranch();

  /**
   * Impedance of a tuned feed's circuit at a multiple of the carrier with its core turned, real
   * part in Ω; 0 for an untuned feed. It stands in the row and column of {@link #heldBranch}.
   */
  public double circuitRealOhms(
      DirectStage point, int harmonic, double carrierRadians, double turnedRadians) {
    return 0;
  }

  /** The same, imaginary part. */
  public double circuitImaginaryOhms(
      DirectStage point, int harmonic, double carrierRadians, double turnedRadians) {
    return 0;
  }

  /** Rp of a tuned feed, in Ω; NaN for an untuned one. */
  public abstract double tankOhms(DirectStage point);

  /** C of a tuned feed, in F, at the carrier in rad/s; NaN for an untuned one. */
  public abstract double tankFarads(DirectStage point, double carrierRadians);

  /**
   * Resistance whose thermal noise beside the carrier is modulation like any other, in Ω: that of
   * the source, or Rp of a winding.
   */
  public abstract double sidebandOhms(DirectStage point);

  /** By how much the peak lies above the carrier as the builder left it, in rad/s. */
  public abstract double detuningRadians(DirectStage point);
}
