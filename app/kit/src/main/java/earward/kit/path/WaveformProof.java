package earward.kit.path;

import earward.block.figure.CaseName;
import earward.block.figure.FigureName;
import earward.block.figure.Quantity;
import earward.engine.CircuitException;
import earward.engine.CompiledCircuit;
import earward.engine.Drive;
import earward.engine.Engine;
import earward.engine.Slot;
import earward.engine.SolveCase;
import earward.engine.SolveOutcome;
import earward.engine.waveform.WaveformFigures;
import earward.engine.waveform.WaveformListener;
import earward.engine.waveform.WaveformResult;
import earward.engine.waveform.WaveformSettings;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Objects;

/**
 * A kit's figures held against the full waveform of the whole path.
 *
 * @param caseName which case
 * @param wantedToneHertz the tone of the conditions; both ways were run with the nearest whole
 *     fraction of the carrier, {@link WaveformResult#toneHertz}
 * @param result how the full waveform came out
 * @param rows test points first, then the path's end; empty where there is nothing to compare
 * @param trouble why there is nothing to compare; empty where there is
 */
public record WaveformProof(
    CaseName caseName,
    double wantedToneHertz,
    WaveformResult result,
    List<ProofRow> rows,
    String trouble) {
  /** What is compared at every place. */
  private static final List<Quantity> QUANTITIES =
      List.of(
          Quantity.DC_VOLTS,
          Quantity.AUDIO_RMS_VOLTS,
          Quantity.DISTORTION,
          Quantity.CARRIER_RMS_VOLTS,
          Quantity.SECOND_CARRIER_RMS_VOLTS,
          Quantity.THIRD_CARRIER_RMS_VOLTS);

  private static final String PATH = "path";

  /** Audio under this share of the carrier that stands at the same place is not heard. */
  private static final double HEARD = 1e-2;

  /** Audio that has any distortion worth a comparison, rms, in V. */
  private static final double DISTORTED_VOLTS = 1e-4;

  public WaveformProof {
    Objects.requireNonNull(caseName);
    Objects.requireNonNull(result);
    rows = List.copyOf(rows);
    Objects.requireNonNull(trouble);
  }

  /** The cases that can be proven: those that a modulated carrier drives. */
  public static List<CaseName> cases() {
    return List.of(
        CaseName.WEAK, CaseName.TEST, CaseName.STRONG, CaseName.DEEPEST, CaseName.FULL_VOLUME);
  }

  /** Whether all rows agree. */
  public boolean agrees() {
    return rows.stream().allMatch(ProofRow::agrees);
  }

  /** Whether the listener ended it. */
  public boolean cancelled() {
    return result.end() == WaveformResult.End.CANCELLED;
  }

  /**
   * Solves one case of a kit both ways. It takes seconds.
   *
   * @param assembly a complete one
   * @param caseName one of {@link #cases}
   * @param listener is told how it goes on and may end it
   * @throws CircuitException with a finding when the circuit makes no sense to the engine
   * @throws IllegalArgumentException when there is no such case, or no feed in the design
   */
  public static WaveformProof of(Assembly assembly, CaseName caseName, WaveformListener listener) {
    SolveCase asked = asked(assembly, caseName);
    double carrier = value(asked, Slot.CARRIER_HERTZ);
    double tone = value(asked, Slot.TONE_HERTZ);
    Map<String, Double> overrides = new HashMap<>(asked.overrides());
    overrides.put(Slot.TONE_HERTZ, carrier / Math.round(carrier / tone));
    SolveCase run = new SolveCase(caseName, Drive.SIGNAL, overrides);
    List<String> places = places(assembly);
    List<FigureName> wanted =
        places.stream()
            .flatMap(place -> QUANTITIES.stream().map(q -> new FigureName(place, q, caseName)))
            .toList();
    CompiledCircuit circuit = Engine.compile(assembly.circuit(), List.of(run), wanted);
    double[] row = new double[wanted.size()];
    SolveOutcome outcome = circuit.newSolver().solve(circuit.nominalValues(), row);
    WaveformResult result =
        circuit.fullWaveform(
            circuit.nominalValues(), caseName, WaveformSettings.of(places), listener);
    String trouble = "";
    if (!outcome.solved()) {
      trouble = outcome.findings().get(0).sentence();
    } else if (result.end() == WaveformResult.End.NOT_SOLVED) {
      trouble = "The full waveform could not be solved: " + result.trouble() + ".";
    }
    boolean both = trouble.isEmpty() && result.end() == WaveformResult.End.SOLVED;
    List<ProofRow> rows = both ? rows(circuit, row, result, caseName) : List.of();
    return new WaveformProof(caseName, tone, result, rows, trouble);
  }

  private static SolveCase asked(Assembly assembly, CaseName caseName) {
    KitCases cases = new KitCases(assembly);
    boolean deepest = caseName.equals(CaseName.DEEPEST);
    return cases.all(deepest ? TurnScan.deepest(assembly, cases) : Map.of(), Map.of()).stream()
        .filter(each -> each.name().equals(caseName) && each.drive() == Drive.SIGNAL)
        .findFirst()
        .orElseThrow(
            () ->
                new IllegalArgumentException(
                    "the case '" + caseName.text() + "' is not driven by a modulated carrier"));
  }

  private static double value(SolveCase solveCase, String slot) {
    return Objects.requireNonNull(solveCase.overrides().get(slot));
  }

  private static List<String> places(Assembly assembly) {
    List<String> places = new ArrayList<>();
    assembly.testPoints().forEach(point -> places.add(point.place()));
    if (assembly.circuit().probes().stream().anyMatch(probe -> probe.name().equals(PATH))) {
      places.add(PATH);
    }
    return places;
  }

  private static List<ProofRow> rows(
      CompiledCircuit circuit, double[] averaged, WaveformResult result, CaseName caseName) {
    List<ProofRow> rows = new ArrayList<>();
    for (WaveformFigures full : result.figures()) {
      for (Quantity quantity : QUANTITIES) {
        int index = circuit.figure(new FigureName(full.place(), quantity, caseName));
        ProofRow row = new ProofRow(full.place(), quantity, averaged[index], of(full, quantity));
        if (quantity != Quantity.DISTORTION || heard(full)) {
          rows.add(row);
        }
      }
    }
    return rows;
  }

  /** A ripple on a rail or what audio is left on a carrier-hot winding has no distortion. */
  private static boolean heard(WaveformFigures full) {
    return full.audioRmsVolts() > DISTORTED_VOLTS
        && full.audioRmsVolts() > HEARD * full.carrierRmsVolts()
        && full.distortion() < 1;
  }

  private static double of(WaveformFigures figures, Quantity quantity) {
    return switch (quantity) {
      case DC_VOLTS -> figures.dcVolts();
      case AUDIO_RMS_VOLTS -> figures.audioRmsVolts();
      case DISTORTION -> figures.distortion();
      case CARRIER_RMS_VOLTS -> figures.carrierRmsVolts();
      case SECOND_CARRIER_RMS_VOLTS -> figures.secondCarrierRmsVolts();
      default -> figures.thirdCarrierRmsVolts();
    };
  }
}
