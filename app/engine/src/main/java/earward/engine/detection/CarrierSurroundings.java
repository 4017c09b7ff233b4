package earward.engine.detection;

/**
 * What surrounds N carrier-driven devices: a linear network, seen from their ports at the carrier's
 * harmonics and at those of the tone. Ports run from anode to cathode.
 *
 * <p>Mutable: its owner, one solver, fills the rows in place before each solve. Index of a matrix
 * entry: {@code (harmonic * devices + row) * devices + column}; row 0 of the carrier matrices is
 * not used, since the mean belongs to the audio rate.
 */
public final class CarrierSurroundings {
  /** An open voltage whose rounding is looked at, in V. */
  private static final double LEAST_VOLTS = 0.1;

  private final int devices;
  private final int carrierHarmonics;
  private final int audioHarmonics;

  /**
   * Impedances at k·fc in ohms. At k = 1 the e.m.f. of an untuned feed, or the node of a tuned one,
   * is held; from k = 2 a tuned feed's own impedance is inside.
   */
  public final double[] carrierRealOhms;

  public final double[] carrierImaginaryOhms;

  /** Open-circuit voltage at each port over the e.m.f. (or over the tuned node's voltage) at fc. */
  public final double[] transferReal;

  public final double[] transferImaginary;

  /** Impedances at h·fm in ohms, h from 0. */
  public final double[] audioRealOhms;

  public final double[] audioImaginaryOhms;

  /** Voltage at each port when no device conducts, from supplies and bias. */
  public final double[] openVolts;

  /** Series resistance of each device, in ohms. */
  public final double[] seriesOhms;

  /** Whether the feed is tuned. */
  public boolean tuned;

  /** Tuned feed: Rp of the winding, without anything that hangs on it. */
  public double tankOhms;

  /** Tuned feed: C of the winding. */
  public double tankFarads;

  /** Tuned feed: ωc − ω0, in radians a second. */
  public double detuningRadians;

  /**
   * Tuned feed: whether its core is turned until the winding is in phase with what drives it. Then
   * {@link #detuningRadians} is not looked at: it follows from the solution.
   */
  public boolean peaking;

  /** Admittance at fc that the linear network presents to the held node, in siemens. */
  public double loadRealSiemens;

  public double loadImaginarySiemens;

  /** ωc, in radians a second. */
  public double carrierRadians;

  /**
   * Surroundings filled with zeros.
   *
   * @param devices N, at least 1
   * @param carrierHarmonics K, at least 1
   * @param audioHarmonics H, at least 1
   */
  public CarrierSurroundings(int devices, int carrierHarmonics, int audioHarmonics) {
    this.devices = devices;
    this.carrierHarmonics = carrierHarmonics;
    this.audioHarmonics = audioHarmonics;
    int entries = devices * devices;
    carrierRealOhms = new double[(carrierHarmonics + 1) * entries];
    carrierImaginaryOhms = new double[(carrierHarmonics + 1) * entries];
    audioRealOhms = new double[(audioHarmonics + 1) * entries];
    audioImaginaryOhms = new double[(audioHarmonics + 1) * entries];
    transferReal = new double[devices];
    transferImaginary = new double[devices];
    openVolts = new double[devices];
    seriesOhms = new double[devices];
  }

  /** N. */
  public int devices() {
    return devices;
  }

  /** K. */
  public int carrierHarmonics() {
    return carrierHarmonics;
  }

  /** H. */
  public int audioHarmonics() {
    return audioHarmonics;
  }

  /** Where the entry of a harmonic, row and column stands. */
  public int index(int harmonic, int row, int column) {
    return (harmonic * devices + row) * devices + column;
  }

  /** Takes over another's impedances, open voltages and detuning. */
  public void copy(CarrierSurroundings other) {
    System.arraycopy(other.carrierRealOhms, 0, carrierRealOhms, 0, carrierRealOhms.length);
    System.arraycopy(
        other.carrierImaginaryOhms, 0, carrierImaginaryOhms, 0, carrierImaginaryOhms.length);
    System.arraycopy(other.audioRealOhms, 0, audioRealOhms, 0, audioRealOhms.length);
    System.arraycopy(other.audioImaginaryOhms, 0, audioImaginaryOhms, 0, audioImaginaryOhms.length);
    System.arraycopy(other.openVolts, 0, openVolts, 0, openVolts.length);
    detuningRadians = other.detuningRadians;
  }

  /**
   * Whether another's impedances, open voltages and detuning are the same but for a small share.
   */
  public boolean near(CarrierSurroundings other, double share) {
    return detuningRadians == other.detuningRadians
        && near(carrierRealOhms, other.carrierRealOhms, share)
        && near(carrierImaginaryOhms, other.carrierImaginaryOhms, share)
        && near(audioRealOhms, other.audioRealOhms, share)
        && near(audioImaginaryOhms, other.audioImaginaryOhms, share)
        && nearVolts(other, share);
  }

  /** As much as of the other rows, or of a tenth of a volt: without bias they are nothing. */
  private boolean nearVolts(CarrierSurroundings other, double share) {
    boolean near = true;
    for (int i = 0; i < devices; i++) {
      double off = Math.abs(openVolts[i] - other.openVolts[i]);
      near &= off <= share * (LEAST_VOLTS + Math.abs(openVolts[i]));
    }
    return near;
  }

  private static boolean near(double[] one, double[] other, double share) {
    double largest = 0;
    double off = 0;
    for (int i = 0; i < one.length; i++) {
      largest = Math.max(largest, Math.abs(one[i]));
      off = Math.max(off, Math.abs(one[i] - other[i]));
    }
    return off <= share * largest;
  }
}
