package earward.engine.law;

import earward.engine.detection.JunctionLaw;
import earward.engine.linear.RealLu;
import java.util.Arrays;

/**
 * The equations of the circuit at DC about one point: Kirchhoff's sums with their derivatives, and
 * what the laws need to know of the state. Node −1 is ground.
 *
 * <p>Row of a node: sum of the currents that leave it, in A. Row of a branch: its own equation.
 * Mutable, for one thread.
 */
public final class DirectStage {
  /** Conductance from every node to ground that keeps floating nodes defined, in S. */
  public static final double FLOOR_SIEMENS = 1e-12;

  private final int nodes;
  private final double[] x;
  private final double[] residual;
  private final double[] flow;
  private final RealLu matrix;
  private final double[] drivenAmperes;
  private final double[] signalAmperes;
  private final JunctionLaw[] junctions;
  private double[] values = new double[0];
  private double celsius = 25;
  private double sourceShare = 1;
  private double floorSiemens = FLOOR_SIEMENS;
  private boolean powered = true;
  private boolean detecting;
  private boolean slopes = true;

  /**
   * A stage.
   *
   * @param nodes how many nodes beside ground
   * @param size nodes and branches
   * @param driven how many carrier-driven diodes
   * @param amplifiers how many audio amplifiers
   * @param diodes how many diodes, driven or not
   */
  public DirectStage(int nodes, int size, int driven, int amplifiers, int diodes) {
    this.nodes = nodes;
    x = new double[size];
    residual = new double[size];
    flow = new double[size];
    matrix = new RealLu(size);
    drivenAmperes = new double[driven];
    signalAmperes = new double[amplifiers];
    junctions = new JunctionLaw[diodes];
    Arrays.setAll(junctions, i -> new JunctionLaw());
  }

  /** Takes over the state of a case; the row of values is read, never written. */
  public void state(double[] row, double ambientCelsius, boolean supplied, boolean carrierOn) {
    values = row;
    celsius = ambientCelsius;
    powered = supplied;
    detecting = carrierOn;
  }

  /** Sets the continuation: share of all sources and conductance to ground. */
  public void continuation(double share, double siemens) {
    sourceShare = share;
    floorSiemens = siemens;
  }

  /**
   * Clears the equations and gives every node its conductance to ground.
   *
   * @param withSlopes whether the derivatives are wanted too; without them the matrix stays as it
   *     is, factors and all
   */
  public void begin(boolean withSlopes) {
    slopes = withSlopes;
    if (withSlopes) {
      matrix.clear();
    }
    Arrays.fill(residual, 0);
    Arrays.fill(flow, 0);
    for (int node = 0; node < nodes; node++) {
      conductance(node, -1, floorSiemens);
    }
  }

  public double value(int slot) {
    return values[slot];
  }

  public double celsius() {
    return celsius;
  }

  public double sourceShare() {
    return sourceShare;
  }

  public boolean powered() {
    return powered;
  }

  /** Whether carrier-driven diodes stand as sources of their mean current. */
  public boolean detecting() {
    return detecting;
  }

  /** Mean currents of the carrier-driven diodes, in A; written by the solver. */
  public double[] drivenAmperes() {
    return drivenAmperes;
  }

  /** Mean supply currents of the amplifiers' signals, in A; written by the solver. */
  public double[] signalAmperes() {
    return signalAmperes;
  }

  /** The junction of each diode at the case's temperature; written by its law. */
  public JunctionLaw junction(int ordinal) {
    return junctions[ordinal];
  }

  /** Node volts, then branch currents. */
  public double[] solution() {
    return x;
  }

  public double[] residual() {
    return residual;
  }

  /** Sum of the magnitudes that were added to each row: the scale of its rounding. */
  public double[] flow() {
    return flow;
  }

  public RealLu matrix() {
    return matrix;
  }

  /** Voltage of a node. */
  public double volts(int node) {
    return node < 0 ? 0 : x[node];
  }

  /** Value of a branch unknown. */
  public double branch(int index) {
    return x[index];
  }

  /** A conductance between two nodes. */
  public void conductance(int a, int b, double siemens) {
    double va = volts(a);
    double vb = volts(b);
    double amperes = siemens * (va - vb);
    double scale = siemens * (Math.abs(va) + Math.abs(vb));
    leaves(a, amperes, scale);
    leaves(b, -amperes, scale);
    if (!slopes) {
      return;
    }
    slope(a, a, siemens);
    slope(a, b, -siemens);
    slope(b, a, -siemens);
    slope(b, b, siemens);
  }

  /** A current from one node to another, without its derivatives. */
  public void current(int from, int to, double amperes) {
    leaves(from, amperes, Math.abs(amperes));
    leaves(to, -amperes, Math.abs(amperes));
  }

  /** Derivative of a current from one node to another, by the voltage of a third. */
  public void currentSlope(int from, int to, int by, double siemens) {
    slope(from, by, siemens);
    slope(to, by, -siemens);
  }

  /** Adds to the residual of any row. */
  public void leaves(int row, double amount, double scale) {
    if (row >= 0) {
      residual[row] += amount;
      flow[row] += scale;
    }
  }

  /** Adds to the derivative of a row by an unknown. */
  public void slope(int row, int by, double amount) {
    if (slopes && row >= 0 && by >= 0) {
      matrix.add(row, by, amount);
    }
  }

  /** A branch whose current flows from one node, through the branch, to another. */
  public void branchCurrent(int branch, int from, int to) {
    current(from, to, x[branch]);
    slope(from, branch, 1);
    slope(to, branch, -1);
  }

  /** Adds factor · unknown to a branch's equation. */
  public void term(int branchRow, int unknown, double factor) {
    if (unknown >= 0) {
      double amount = factor * x[unknown];
      leaves(branchRow, amount, Math.abs(amount));
      slope(branchRow, unknown, factor);
    }
  }
}
