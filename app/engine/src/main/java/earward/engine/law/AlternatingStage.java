package earward.engine.law;

import earward.engine.linear.ComplexLu;
import earward.engine.linear.HarmonicLu;
import org.jspecify.annotations.Nullable;

/**
 * The linearised equations of the circuit at one frequency, about a DC point. Node −1 is ground.
 *
 * <p>Mutable, for one thread.
 */
public final class AlternatingStage {
  /** Stands for all of several systems. */
  private static final int ALL = -1;

  private final int nodes;
  private final int size;
  private final ComplexLu audio;
  private final ComplexLu heldCarrier;
  private final ComplexLu freeCarrier;
  private ComplexLu matrix;
  private @Nullable HarmonicLu several;
  private int system;
  private final DirectStage point;
  private double omega;
  private int carrierHarmonic;
  private double carrierOmega;
  private boolean feedFree;
  private double turnedRadians;
  private LoadView load = LoadView.AS_IT_IS;
  private double leastLoadShare = 1;
  private double openBelowFarads;
  private double openAboveFarads = Double.POSITIVE_INFINITY;

  /** A stage about the DC point that another holds. */
  public AlternatingStage(int nodes, int size, DirectStage point) {
    this.nodes = nodes;
    this.size = size;
    this.point = point;
    audio = new ComplexLu(size);
    heldCarrier = new ComplexLu(size);
    freeCarrier = new ComplexLu(size);
    matrix = audio;
  }

  /** Sets the carrier, in rad/s: the winding of a tuned feed is known by its resonance. */
  public void carrier(double radians) {
    carrierOmega = radians;
  }

  /** Sets how far the core of a tuned winding is turned from resonance: ωc − ω0, in rad/s. */
  public void turnCore(double radians) {
    turnedRadians = radians;
  }

  /** How far the core of a tuned winding is turned: ωc − ω0, in rad/s. */
  public double turnedRadians() {
    return turnedRadians;
  }

  /** How loudspeakers appear from now on; for the least load with the share of Re that is left. */
  public void viewLoad(LoadView view, double leastShare) {
    load = view;
    leastLoadShare = leastShare;
  }

  /** Leaves out capacitors below and above these capacitances, in F, from now on. */
  public void leaveOut(double belowFarads, double aboveFarads) {
    openBelowFarads = belowFarads;
    openAboveFarads = aboveFarads;
  }

  /** Begins the carrier itself with the feed at rest behind its own impedance, not held. */
  public void beginFreeCarrier(double radians) {
    begin(freeCarrier, radians, 1, radians);
    feedFree = true;
  }

  /** Begins an audio frequency, in rad/s. */
  public void beginAudio(double radians) {
    begin(audio, radians, 0, carrierOmega);
  }

  /** Begins a multiple of the carrier, whose own frequency is given in rad/s. */
  public void beginCarrier(int harmonic, double radians) {
    begin(heldCarrier, harmonic * radians, harmonic, radians);
  }

  private void begin(ComplexLu system, double radians, int harmonic, double carrierRadians) {
    matrix = system;
    omega = radians;
    carrierHarmonic = harmonic;
    carrierOmega = carrierRadians;
    feedFree = false;
    matrix.clear();
    for (int node = 0; node < nodes; node++) {
      matrix.add(node, node, DirectStage.FLOOR_SIEMENS, 0);
    }
  }

  /** Begins several systems at once, with what is the same in all of them. */
  public void beginSeveral(HarmonicLu systems) {
    several = systems;
    system = ALL;
    feedFree = false;
    systems.clear();
    for (int node = 0; node < nodes; node++) {
      systems.addToAll(node, node, DirectStage.FLOOR_SIEMENS, 0);
    }
  }

  /**
   * Begins one of several systems: a multiple of the tone (harmonic 0) or of the carrier, in rad/s.
   */
  public void beginSystem(int index, double radians, int harmonic, double carrierRadians) {
    system = index;
    omega = radians;
    carrierHarmonic = harmonic;
    carrierOmega = carrierRadians;
  }

  /** Goes back to one system at a time. */
  public void endSeveral() {
    several = null;
  }

  public int size() {
    return size;
  }

  /** The DC point. */
  public DirectStage point() {
    return point;
  }

  public double value(int slot) {
    return point.value(slot);
  }

  public double omega() {
    return omega;
  }

  /** Which multiple of the carrier this is; 0 at audio. */
  public int carrierHarmonic() {
    return carrierHarmonic;
  }

  public double carrierOmega() {
    return carrierOmega;
  }

  /** Whether the feed rests behind its own impedance at the carrier. */
  public boolean feedFree() {
    return feedFree;
  }

  public LoadView load() {
    return load;
  }

  /** Share of a loudspeaker's DC resistance that the least load has. */
  public double leastLoadShare() {
    return leastLoadShare;
  }

  /** Whether a capacitor of this size is left out. */
  public boolean leftOut(double farads) {
    return farads < openBelowFarads || farads > openAboveFarads;
  }

  /** Keeps the orders of elimination from now on: see {@link ComplexLu#freeze}. */
  public void freeze() {
    audio.freeze();
    heldCarrier.freeze();
    freeCarrier.freeze();
  }

  /** The system of the frequency that was begun last: each kind has an order of its own. */
  public ComplexLu matrix() {
    return matrix;
  }

  /** An admittance between two nodes. */
  public void admittance(int a, int b, double real, double imaginary) {
    add(a, a, real, imaginary);
    add(a, b, -real, -imaginary);
    add(b, a, -real, -imaginary);
    add(b, b, real, imaginary);
  }

  /** An impedance between two nodes. */
  public void impedance(int a, int b, double real, double imaginary) {
    double norm = real * real + imaginary * imaginary;
    admittance(a, b, real / norm, -imaginary / norm);
  }

  /** A current from one node to another, of so much per volt of a third node. */
  public void transconductance(int from, int to, int by, double real, double imaginary) {
    add(from, by, real, imaginary);
    add(to, by, -real, -imaginary);
  }

  /** A branch whose current flows from one node, through the branch, to another. */
  public void branchCurrent(int branch, int from, int to) {
    add(from, branch, 1, 0);
    add(to, branch, -1, 0);
  }

  /** Adds to one element of the matrix. */
  public void add(int row, int column, double real, double imaginary) {
    if (row >= 0 && column >= 0) {
      if (several == null) {
        matrix.add(row, column, real, imaginary);
      } else if (system == ALL) {
        several.addToAll(row, column, real, imaginary);
      } else {
        several.add(system, row, column, real, imaginary);
      }
    }
  }
}
