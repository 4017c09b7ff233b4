package earward.engine.law;

import earward.block.law.ThermalVoltage;

/**
 * Sums the noise of all sources at one output and one frequency. The adjoint solution says how the
 * output answers to a source in each row of the circuit, so that one solve serves every source
 * (Rohrer, Nagel, Meyer and Weber 1971).
 *
 * <p>Mutable, for one thread. Densities are one-sided, for one hertz.
 */
public final class NoiseStage {
  private final AlternatingStage stage;
  private double[] re = new double[0];
  private double[] im = new double[0];
  private double sum;
  private double fourKelvinJoules;

  /** A sum over the circuit that another stage holds. */
  public NoiseStage(AlternatingStage stage) {
    this.stage = stage;
  }

  /** Begins with the adjoint solution of an output, which is read, never written. */
  public void begin(double[] adjointRe, double[] adjointIm) {
    re = adjointRe;
    im = adjointIm;
    sum = 0;
    double kelvin = stage.point().celsius() + ThermalVoltage.ZERO_CELSIUS;
    fourKelvinJoules = 4 * ThermalVoltage.BOLTZMANN * kelvin;
  }

  /** The circuit at the frequency at hand. */
  public AlternatingStage stage() {
    return stage;
  }

  /** Sum so far, in V²/Hz. */
  public double squareVoltsPerHertz() {
    return sum;
  }

  /** 4kT, in J: times ohms it is V²/Hz, times siemens A²/Hz. */
  public double fourKelvinJoules() {
    return fourKelvinJoules;
  }

  /** Thermal noise of a conductance between two nodes: 4kTG (Johnson and Nyquist 1928). */
  public void thermal(int a, int b, double siemens) {
    current(a, b, fourKelvinJoules * siemens);
  }

  /** Thermal noise of the real part of an impedance between two nodes. */
  public void thermalOfImpedance(int a, int b, double real, double imaginary) {
    thermal(a, b, real / (real * real + imaginary * imaginary));
  }

  /** Shot noise of a current between two nodes: 2qI (Schottky 1918). */
  public void shot(int a, int b, double amperes) {
    current(a, b, 2 * ThermalVoltage.CHARGE * Math.abs(amperes));
  }

  /** A noise current between two nodes, in A²/Hz. */
  public void current(int a, int b, double squareAmperesPerHertz) {
    double r = re(b) - re(a);
    double i = im(b) - im(a);
    sum += squareAmperesPerHertz * (r * r + i * i);
  }

  /** Thermal noise of a resistance whose voltage stands in a branch's own row: 4kTR. */
  public void thermalInRow(int row, double ohms) {
    double squares = re[row] * re[row] + im[row] * im[row];
    sum += fourKelvinJoules * ohms * squares;
  }

  /**
   * A noise that stands in two rows at once, each with a complex factor; −1 for no second row.
   *
   * @param density of the noise, in the square of its unit for one hertz
   */
  public void inRows(
      double density, int one, double oneRe, double oneIm, int two, double twoRe, double twoIm) {
    double r = re(one) * oneRe - im(one) * oneIm + re(two) * twoRe - im(two) * twoIm;
    double i = re(one) * oneIm + im(one) * oneRe + re(two) * twoIm + im(two) * twoRe;
    sum += density * (r * r + i * i);
  }

  /** Adds the noise of a source whose answer at the output is already known. */
  public void known(double density, double answerRe, double answerIm) {
    sum += density * (answerRe * answerRe + answerIm * answerIm);
  }

  /** How the output answers to one ampere from a node to another, real part. */
  public double answerRe(int from, int to) {
    return re(to) - re(from);
  }

  /** The same, imaginary part. */
  public double answerIm(int from, int to) {
    return im(to) - im(from);
  }

  private double re(int row) {
    return row < 0 ? 0 : re[row];
  }

  private double im(int row) {
    return row < 0 ? 0 : im[row];
  }
}
