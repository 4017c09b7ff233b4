package earward.engine;

import org.junit.jupiter.params.aggregator.ArgumentsAccessor;

/**
 * A row of detector-cases.csv: feed → diode → A (C1 ∥ R1) → R2 → B (C2) → Cc → W (RL), solved at
 * the full carrier rate by a program outside the project (fourth-order Runge-Kutta, 200 and 400
 * steps a cycle agreeing to five figures); T = 300.15 K, no junction capacitance, no leakage.
 *
 * @param name of the case
 * @param tuned whether a winding feeds it, which alone resonates at the carrier
 * @param saturationAmperes at 27 °C
 * @param n emission coefficient
 * @param sourceOhms of the generator, or Rp of the winding
 * @param directVolts at A
 * @param audioVolts r.m.s. at W
 * @param distortionPercent at W
 * @param rippleVolts at A
 */
public record ReferenceRow(
    String name,
    boolean tuned,
    double saturationAmperes,
    double n,
    double seriesOhms,
    double carrierHertz,
    double toneHertz,
    double sourceOhms,
    double quality,
    double peakVolts,
    double depth,
    double c1,
    double r1,
    double r2,
    double c2,
    double cc,
    double rl,
    double directVolts,
    double audioVolts,
    double distortionPercent,
    double rippleVolts) {
  /** The file, among the tests' resources. */
  public static final String FILE = "/earward/engine/detector-cases.csv";

  /** Of a line of the file. */
  public static ReferenceRow of(ArgumentsAccessor line) {
    return new ReferenceRow(
        line.getString(0),
        line.getString(1).equals("tuned"),
        line.getDouble(2),
        line.getDouble(3),
        line.getDouble(4),
        line.getDouble(5),
        line.getDouble(6),
        line.getDouble(7),
        line.getDouble(8),
        line.getDouble(9),
        line.getDouble(10),
        line.getDouble(11),
        line.getDouble(12),
        line.getDouble(13),
        line.getDouble(14),
        line.getDouble(15),
        line.getDouble(16),
        line.getDouble(17),
        line.getDouble(18),
        line.getDouble(19),
        line.getDouble(20));
  }
}
