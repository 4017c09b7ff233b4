package earward.kit.path;

import earward.block.Conditions;
import earward.block.figure.CaseName;
import earward.block.figure.FigureName;
import earward.block.figure.Quantity;
import earward.engine.CircuitException;
import earward.engine.CompiledCircuit;
import earward.engine.Engine;
import earward.engine.Response;
import earward.engine.Slot;
import earward.engine.SolveCase;
import earward.engine.SweptFigures;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.concurrent.CompletableFuture;

/**
 * The curves of a kit at the test signal: its response, and level, distortion and harmonics at the
 * path's end against depth, carrier, tone and each knob.
 *
 * @param response of the whole path with the front end, 200 points from 20 Hz to 20 kHz
 * @param depth 12 depths from 5 to 95 %
 * @param level 12 carriers from half the weakest to the strongest station
 * @param tone 8 tones from the lowest to the highest
 * @param knobs 9 positions of each knob, in the order of the path
 */
public record KitCurves(
    Response response,
    SweptFigures depth,
    SweptFigures level,
    SweptFigures tone,
    List<SweptFigures> knobs) {
  private static final int RESPONSE_POINTS = 200;
  private static final int DEPTHS = 12;
  private static final int LEVELS = 12;
  private static final int TONES = 8;
  private static final int POSITIONS = 9;

  public KitCurves {
    knobs = List.copyOf(knobs);
  }

  /**
   * Solves all curves of an assembly; empty where it is not complete or makes no sense.
   *
   * @param assembly of the nominal kit
   */
  public static Optional<KitCurves> of(Assembly assembly) {
    if (!assembly.complete()) {
      return Optional.empty();
    }
    try {
      return Optional.of(solved(assembly));
    } catch (CircuitException e) {
      return Optional.empty(); // whoever solves the kit sees the finding
    }
  }

  private static KitCurves solved(Assembly assembly) {
    KitCases cases = new KitCases(assembly);
    List<SolveCase> test =
        cases.all(Map.of(), Map.of()).stream()
            .filter(one -> one.name().equals(CaseName.TEST))
            .toList();
    List<FigureName> wanted = new ArrayList<>();
    for (Quantity quantity :
        List.of(
            Quantity.AUDIO_RMS_VOLTS,
            Quantity.DISTORTION,
            Quantity.SECOND_HARMONIC,
            Quantity.THIRD_HARMONIC)) {
      wanted.add(new FigureName(CircuitBuilder.PATH, quantity, CaseName.TEST));
    }
    CompiledCircuit circuit = Engine.compile(assembly.circuit(), test, wanted);
    double[] values = circuit.nominalValues();
    Conditions core = assembly.design().conditions().core();
    double[] hertz = alike(20, 20e3, RESPONSE_POINTS);
    double[] levels = alike(core.weakPeakVolts() / 2, core.strongPeakVolts(), LEVELS);
    double[] tones = alike(core.lowestToneHertz(), core.highestToneHertz(), TONES);
    // each starts from its own solve of the nominal kit, so they may as well go side by side
    var response =
        CompletableFuture.supplyAsync(
            () -> circuit.response(values, CaseName.TEST, CircuitBuilder.PATH, hertz));
    var depth = swept(circuit, values, Slot.DEPTH, even(0.05, 0.95, DEPTHS));
    var level = swept(circuit, values, Slot.CARRIER_PEAK_VOLTS, levels);
    var tone = swept(circuit, values, Slot.TONE_HERTZ, tones);
    List<CompletableFuture<SweptFigures>> knobs =
        cases.knobSlots().stream()
            .map(slot -> swept(circuit, values, slot, even(0, 1, POSITIONS)))
            .toList();
    return new KitCurves(
        response.join(),
        depth.join(),
        level.join(),
        tone.join(),
        knobs.stream().map(CompletableFuture::join).toList());
  }

  private static CompletableFuture<SweptFigures> swept(
      CompiledCircuit circuit, double[] values, String slot, double[] at) {
    return CompletableFuture.supplyAsync(() -> circuit.sweep(values, CaseName.TEST, slot, at));
  }

  /** Points at like distances. */
  private static double[] even(double from, double to, int points) {
    double[] at = new double[points];
    for (int i = 0; i < points; i++) {
      at[i] = from + (to - from) * i / (points - 1);
    }
    return at;
  }

  /** Points at like ratios. */
  private static double[] alike(double from, double to, int points) {
    double[] at = even(Math.log(from), Math.log(to), points);
    for (int i = 0; i < points; i++) {
      at[i] = Math.exp(at[i]);
    }
    return at;
  }
}
