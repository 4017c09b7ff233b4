package earward.engine.law;

import java.util.ArrayList;
import java.util.List;

/**
 * The equations of the circuit over time, as a list of terms: each row's sum is 0. Node −1 is
 * ground. Row of a node: currents that leave it. A state has an unknown rate and a row of its own.
 * Curved devices and kinks (max(0, control)) stand apart, so that the rest is linear.
 *
 * <p>Carrier and drive hold as they are; nothing is averaged. Mutable while it is being stamped.
 */
public final class WaveformStage {
  /** Series resistance of a capacitor that has none, in Ω: two in parallel stay solvable. */
  private static final double LEAST_OHMS = 1e-6;

  private static final int STATE_ROWS = 1 << 24;

  private final DirectStage point;
  private final double carrierRadians;
  private final double tuningRadians;
  private final boolean quiet;
  private final List<WaveformTerm> terms = new ArrayList<>();
  private final List<WaveformTerm> deviceControls = new ArrayList<>();
  private final List<WaveformTerm> kinkControls = new ArrayList<>();
  private final List<WaveformTerm> power = new ArrayList<>();
  private final List<WaveformDevice> devices = new ArrayList<>();
  private final List<Double> starts = new ArrayList<>();
  private int unknowns;
  private int kinks;
  private int controls;
  private int outputs;

  /**
   * A stage about a DC point, from which all states start.
   *
   * @param nodes how many nodes beside ground
   * @param size nodes and branches
   * @param carrierRadians ωc, in rad/s
   * @param tuningRadians ωc less the resonance of a tuned feed's winding, in rad/s
   * @param quiet whether audio amplifiers only rest: so the bare carrier settles without their
   *     answer to its onset; the states are the same ones
   */
  public WaveformStage(
      int nodes,
      int size,
      DirectStage point,
      double carrierRadians,
      double tuningRadians,
      boolean quiet) {
    this.unknowns = size;
    this.point = point;
    this.carrierRadians = carrierRadians;
    this.tuningRadians = tuningRadians;
    this.quiet = quiet;
    for (int node = 0; node < nodes; node++) {
      conductance(node, -1, DirectStage.FLOOR_SIEMENS);
    }
  }

  /** The DC point. */
  public DirectStage point() {
    return point;
  }

  public double carrierRadians() {
    return carrierRadians;
  }

  /** By how much the carrier lies above the resonance of a tuned feed, in rad/s. */
  public double tuningRadians() {
    return tuningRadians;
  }

  /** Whether audio amplifiers only rest. */
  public boolean quiet() {
    return quiet;
  }

  /** DC voltage between two nodes, in V. */
  public double startVolts(int a, int b) {
    return point.volts(a) - point.volts(b);
  }

  /** One more unknown; its row has the same index. */
  public int unknown() {
    return unknowns++;
  }

  /** One more state that starts at a value. */
  public int state(double start) {
    starts.add(start);
    return starts.size() - 1;
  }

  /** The row that belongs to a state. */
  public int rowOf(int state) {
    return STATE_ROWS + state;
  }

  /** Adds factor times an unknown to a row. */
  public void term(int row, int unknown, double factor) {
    if (unknown >= 0) {
      addTerm(row, WaveformTerm.Kind.UNKNOWN, unknown, factor);
    }
  }

  /** Adds factor times the rate of a state. */
  public void rate(int row, int state, double factor) {
    addTerm(row, WaveformTerm.Kind.RATE, state, factor);
  }

  /** Adds factor times a state. */
  public void stateTerm(int row, int state, double factor) {
    addTerm(row, WaveformTerm.Kind.STATE, state, factor);
  }

  /** Adds a constant. */
  public void constant(int row, double amount) {
    addTerm(row, WaveformTerm.Kind.CONSTANT, 0, amount);
  }

  /** Adds factor times the drive. */
  public void drive(int row, double factor) {
    addTerm(row, WaveformTerm.Kind.DRIVE, 0, factor);
  }

  void addTerm(int row, WaveformTerm.Kind kind, int index, double factor) {
    if (row >= 0 && factor != 0) {
      terms.add(new WaveformTerm(row, kind, index, factor));
    }
  }

  void addControl(boolean kink, int control, WaveformTerm.Kind kind, int index, double factor) {
    (kink ? kinkControls : deviceControls).add(new WaveformTerm(control, kind, index, factor));
  }

  /** A conductance between two nodes. */
  public void conductance(int a, int b, double siemens) {
    term(a, a, siemens);
    term(a, b, -siemens);
    term(b, a, -siemens);
    term(b, b, siemens);
  }

  /** A constant current from one node to another. */
  public void current(int from, int to, double amperes) {
    constant(from, amperes);
    constant(to, -amperes);
  }

  /** A branch whose current flows from one node, through the branch, to another. */
  public void branchCurrent(int branch, int from, int to) {
    term(from, branch, 1);
    term(to, branch, -1);
  }

  /** A capacitor behind a resistance; its state is its charge, the rate its current. */
  public void capacitor(int a, int b, double farads, double ohms) {
    int charge = state(farads * startVolts(a, b));
    int row = rowOf(charge);
    rate(a, charge, 1);
    rate(b, charge, -1);
    term(row, a, 1);
    term(row, b, -1);
    rate(row, charge, -Math.max(LEAST_OHMS, ohms));
    stateTerm(row, charge, -1 / farads);
  }

  /** An inductor with a resistance; its state is its current, which starts at a value. */
  public void inductor(int a, int b, double henries, double ohms, double startAmperes) {
    int amperes = state(startAmperes);
    int row = rowOf(amperes);
    stateTerm(a, amperes, 1);
    stateTerm(b, amperes, -1);
    term(row, a, 1);
    term(row, b, -1);
    rate(row, amperes, -henries);
    stateTerm(row, amperes, -ohms);
  }

  /** A curved device. */
  public WaveformElement device(WaveformDevice device) {
    WaveformElement element = new WaveformElement(this, false, controls, outputs);
    devices.add(device);
    controls += device.controls();
    outputs += device.outputs();
    return element;
  }

  /** max(0, control). */
  public WaveformElement kink() {
    return new WaveformElement(this, true, kinks, kinks++);
  }

  /** Adds factor times an unknown to what the drive is multiplied by to give the feed's power. */
  public void powerOf(int unknown, double factor) {
    if (unknown >= 0) {
      power.add(new WaveformTerm(0, WaveformTerm.Kind.UNKNOWN, unknown, factor));
    }
  }

  /** Adds factor times the drive to the same. */
  public void powerOfDrive(double factor) {
    power.add(new WaveformTerm(0, WaveformTerm.Kind.DRIVE, 0, factor));
  }

  /** All terms of all rows; the row of a state comes after those of all unknowns. */
  public List<WaveformTerm> terms() {
    return terms.stream()
        .map(
            each ->
                each.row() < STATE_ROWS
                    ? each
                    : new WaveformTerm(
                        unknowns + each.row() - STATE_ROWS,
                        each.kind(),
                        each.index(),
                        each.factor()))
        .toList();
  }

  /** Terms of the devices' controls. */
  public List<WaveformTerm> deviceControls() {
    return List.copyOf(deviceControls);
  }

  /** Terms of the kinks' controls. */
  public List<WaveformTerm> kinkControls() {
    return List.copyOf(kinkControls);
  }

  /** Terms of what the drive is multiplied by to give the power that the feed delivers, in W. */
  public List<WaveformTerm> power() {
    return List.copyOf(power);
  }

  /** The devices, in order of their controls. */
  public List<WaveformDevice> devices() {
    return List.copyOf(devices);
  }

  /** Where the states start. */
  public double[] starts() {
    return starts.stream().mapToDouble(Double::doubleValue).toArray();
  }

  /** How many unknowns there are, nodes and branches included. */
  public int unknowns() {
    return unknowns;
  }

  /** How many kinks. */
  public int kinks() {
    return kinks;
  }
}
