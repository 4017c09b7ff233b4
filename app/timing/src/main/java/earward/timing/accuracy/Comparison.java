package earward.timing.accuracy;

import earward.block.figure.CaseName;
import earward.block.figure.FigureName;
import earward.block.figure.Quantity;
import earward.engine.CircuitException;
import earward.engine.CompiledCircuit;
import earward.engine.Engine;
import earward.engine.SolveOutcome;
import earward.engine.waveform.WaveformListener;
import earward.engine.waveform.WaveformResult;
import earward.engine.waveform.WaveformSettings;
import java.util.List;
import java.util.Locale;

/**
 * One random design both ways.
 *
 * @param draw its values
 * @param fast DC, audio and distortion by carrier-averaged detection
 * @param full the same by the full waveform
 * @param stepsPerCycle of the full waveform
 * @param trouble what was not solved; empty where both were
 * @param said what the fast method says of its own domain; empty where it says nothing
 */
public record Comparison(
    Draw draw, Figures fast, Figures full, int stepsPerCycle, String trouble, String said) {
  /** Share of the full waveform's by which DC and audio may differ. */
  public static final double LEVEL = 1e-3;

  /** By so much distortion may differ, as a fraction; above a tenth by a share of itself. */
  public static final double DISTORTION = 5e-4;

  private static final double HEAVY = 0.1;
  private static final double HEAVY_SHARE = 0.01;

  /**
   * What is compared.
   *
   * @param dcVolts at the detector
   * @param audioRmsVolts behind its filter
   * @param distortion there, as a fraction
   */
  public record Figures(double dcVolts, double audioRmsVolts, double distortion) {
    static final Figures NONE = new Figures(Double.NaN, Double.NaN, Double.NaN);

    String text() {
      return String.format(
          Locale.ROOT,
          "dc %.6g V, audio %.6g V, distortion %.4f %%",
          dcVolts,
          audioRmsVolts,
          100 * distortion);
    }
  }

  /** Solves a design both ways. */
  public static Comparison of(Draw draw) {
    List<FigureName> wanted =
        List.of(
            new FigureName(RandomCircuit.DETECTED, Quantity.DC_VOLTS, CaseName.TEST),
            new FigureName(RandomCircuit.WIPER, Quantity.AUDIO_RMS_VOLTS, CaseName.TEST),
            new FigureName(RandomCircuit.WIPER, Quantity.DISTORTION, CaseName.TEST));
    try {
      CompiledCircuit circuit =
          Engine.compile(RandomCircuit.of(draw), List.of(RandomCircuit.test(draw)), wanted);
      double[] row = new double[wanted.size()];
      SolveOutcome outcome = circuit.newSolver().solve(circuit.nominalValues(), row);
      WaveformResult result =
          circuit.fullWaveform(
              circuit.nominalValues(),
              CaseName.TEST,
              WaveformSettings.of(List.of(RandomCircuit.DETECTED, RandomCircuit.WIPER)),
              WaveformListener.PATIENT);
      return of(draw, new Figures(row[0], row[1], row[2]), outcome, result);
    } catch (CircuitException e) {
      return new Comparison(draw, Figures.NONE, Figures.NONE, 0, e.finding().sentence(), "");
    }
  }

  private static Comparison of(
      Draw draw, Figures fast, SolveOutcome outcome, WaveformResult result) {
    boolean solved = result.end() == WaveformResult.End.SOLVED;
    Figures full =
        result.figures().isEmpty()
            ? Figures.NONE
            : new Figures(
                result.at(RandomCircuit.DETECTED).dcVolts(),
                result.at(RandomCircuit.WIPER).audioRmsVolts(),
                result.at(RandomCircuit.WIPER).distortion());
    String said = outcome.findings().isEmpty() ? "" : outcome.findings().get(0).sentence();
    String trouble = solved ? "" : "full waveform: " + result.trouble();
    if (!outcome.solved()) {
      trouble = "fast: " + said;
    }
    return new Comparison(draw, fast, full, result.stepsPerCycle(), trouble, said);
  }

  /** The largest difference over what it may be; infinite where one way found no solution. */
  public double off() {
    if (!trouble.isEmpty()) {
      return Double.POSITIVE_INFINITY;
    }
    double dc = Math.abs(fast.dcVolts - full.dcVolts) / (LEVEL * Math.abs(full.dcVolts));
    double audio = Math.abs(fast.audioRmsVolts - full.audioRmsVolts) / (LEVEL * full.audioRmsVolts);
    double allowed = full.distortion > HEAVY ? HEAVY_SHARE * full.distortion : DISTORTION;
    double distortion = Math.abs(fast.distortion - full.distortion) / allowed;
    double most = Math.max(dc, Math.max(audio, distortion));
    return Double.isNaN(most) ? Double.POSITIVE_INFINITY : most;
  }

  /** Whether it is within the bar. */
  public boolean kept() {
    return off() <= 1;
  }

  /** Several lines: how far off, both ways, the values. */
  public String text() {
    return String.format(
        Locale.ROOT,
        "design %d, %s%s: %.2f of the bar%s%s%n  fast %s%n  full %s (%d steps a cycle)%n  %s",
        draw.number(),
        draw.kind().name().toLowerCase(Locale.ROOT).replace('_', ' '),
        draw.tuned() ? ", tuned" : ", untuned",
        off(),
        trouble.isEmpty() ? "" : "; " + trouble,
        said.isEmpty() ? "" : "; " + said,
        fast.text(),
        full.text(),
        stepsPerCycle,
        draw);
  }
}
