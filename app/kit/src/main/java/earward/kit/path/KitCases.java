package earward.kit.path;

import earward.block.Conditions;
import earward.block.device.Adaptor;
import earward.block.device.AdaptorModel;
import earward.block.device.Battery;
import earward.block.device.Loudspeaker;
import earward.block.figure.CaseName;
import earward.engine.CircuitPart;
import earward.engine.Drive;
import earward.engine.Slot;
import earward.engine.SolveCase;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;

/** The cases in which a kit is solved, as overrides of the compiled circuit's slots. */
final class KitCases {
  /** Rise of the mains above its rated voltage (EN 50160: ±10 %). */
  private static final double HIGHEST_MAINS = 1.1;

  /** What stands for no internal resistance when the highest voltage counts. */
  private static final double NO_LOAD_OHMS = 1e-3;

  /** The weakest station with every knob at its upper stop: what the kit can make of it. */
  static final CaseName WEAK_AT_FULL_VOLUME = new CaseName("weak-at-full-volume");

  private final Assembly assembly;
  private final Conditions conditions;
  private final Knobs knobs;

  KitCases(Assembly assembly) {
    this.assembly = assembly;
    this.conditions = assembly.design().conditions().core();
    this.knobs = new Knobs(assembly);
  }

  /**
   * All cases.
   *
   * @param deepestPosition where the knobs stand at the deepest modulation, by slot
   * @param worstPosition where they stand at the worst of their turn; empty: there is none
   */
  List<SolveCase> all(Map<String, Double> deepestPosition, Map<String, Double> worstPosition) {
    List<SolveCase> cases = new ArrayList<>();
    for (CaseName name : CaseName.ALL) {
      cases.add(named(name, deepestPosition));
    }
    if (!worstPosition.isEmpty()) {
      cases.add(new SolveCase(CaseName.WORST_TURN, Drive.SIGNAL, with(test(), worstPosition)));
    }
    cases.add(
        new SolveCase(
            WEAK_AT_FULL_VOLUME,
            Drive.SIGNAL,
            with(carrier(conditions.weakPeakVolts()), knobs.allFull())));
    return cases;
  }

  /** The test signal at each knob position of the scan, in its order. */
  List<SolveCase> testOverTheTurn() {
    List<SolveCase> cases = new ArrayList<>();
    for (Map<String, Double> position : knobs.scan()) {
      CaseName name = new CaseName("test-turn-" + cases.size());
      cases.add(new SolveCase(name, Drive.SIGNAL, with(test(), position)));
    }
    return cases;
  }

  /** The slots of the test signal's conditions, which hold where there is no signal too. */
  Map<String, Double> atTest() {
    return test();
  }

  /** Slots of the knobs. */
  List<String> knobSlots() {
    return knobs.slots();
  }

  /** The deepest modulation at each knob position of the scan, in its order. */
  List<SolveCase> deepestOverTheTurn() {
    List<SolveCase> cases = new ArrayList<>();
    for (Map<String, Double> position : knobs.scan()) {
      CaseName name = new CaseName("deepest-turn-" + cases.size());
      cases.add(new SolveCase(name, Drive.SIGNAL, with(deepest(), position)));
    }
    return cases;
  }

  /** The knob positions of a scan. */
  List<Map<String, Double>> scan() {
    return knobs.scan();
  }

  private SolveCase named(CaseName name, Map<String, Double> deepestPosition) {
    if (name.equals(CaseName.UNPOWERED)) {
      return new SolveCase(name, Drive.UNPOWERED, test());
    }
    if (name.equals(CaseName.NO_SIGNAL)) {
      return new SolveCase(name, Drive.NO_SIGNAL, test());
    }
    if (name.equals(CaseName.WEAK)) {
      return new SolveCase(name, Drive.SIGNAL, carrier(conditions.weakPeakVolts()));
    }
    if (name.equals(CaseName.STRONG)) {
      return new SolveCase(name, Drive.SIGNAL, carrier(conditions.strongPeakVolts()));
    }
    if (name.equals(CaseName.DEEPEST)) {
      return new SolveCase(name, Drive.SIGNAL, with(deepest(), deepestPosition));
    }
    if (name.equals(CaseName.FULL_VOLUME)) {
      return new SolveCase(name, Drive.SIGNAL, with(test(), knobs.allFull()));
    }
    if (name.equals(CaseName.FULL_OUTPUT)) {
      return new SolveCase(name, Drive.CLIPPING, test());
    }
    if (name.equals(CaseName.BATTERY_LOW)) {
      return new SolveCase(name, Drive.CLIPPING, with(test(), batteriesAtTheirEnd()));
    }
    if (name.equals(CaseName.HIGHEST_SUPPLY)) {
      return new SolveCase(name, Drive.NO_SIGNAL, with(test(), highestSupply()));
    }
    if (name.equals(CaseName.HOTTEST)) {
      return new SolveCase(name, Drive.ANY_DRIVE, with(test(), hottest()));
    }
    return new SolveCase(name, Drive.SIGNAL, test());
  }

  private Map<String, Double> test() {
    return carrier(conditions.testPeakVolts());
  }

  private Map<String, Double> carrier(double peakVolts) {
    return Map.of(
        Slot.CARRIER_HERTZ, conditions.carrierHertz(),
        Slot.CARRIER_PEAK_VOLTS, peakVolts,
        Slot.DEPTH, conditions.testDepth(),
        Slot.TONE_HERTZ, conditions.toneHertz(),
        Slot.HIGHEST_TONE_HERTZ, conditions.highestToneHertz(),
        Slot.LOWEST_TONE_HERTZ, conditions.lowestToneHertz(),
        Slot.AMBIENT_CELSIUS, conditions.ambientCelsius());
  }

  private Map<String, Double> deepest() {
    return with(
        carrier(conditions.strongPeakVolts()),
        Map.of(
            Slot.DEPTH, conditions.deepestDepth(),
            Slot.TONE_HERTZ, conditions.highestToneHertz()));
  }

  private Map<String, Double> batteriesAtTheirEnd() {
    Map<String, Double> slots = new HashMap<>();
    for (CircuitPart part : assembly.circuit().parts()) {
      if (part.device() instanceof Battery battery) {
        slots.put(part.name() + ":volts", battery.model().endVolts());
        slots.put(part.name() + ":internal-ohms", battery.model().endOhms());
      }
    }
    return slots;
  }

  private Map<String, Double> highestSupply() {
    Map<String, Double> slots = new HashMap<>();
    for (CircuitPart part : assembly.circuit().parts()) {
      SafetyRules.highestVolts(part.device())
          .ifPresent(
              volts -> {
                slots.put(part.name() + ":volts", volts);
                slots.put(part.name() + ":internal-ohms", NO_LOAD_OHMS);
              });
    }
    return slots;
  }

  private Map<String, Double> hottest() {
    Map<String, Double> slots = new HashMap<>();
    slots.put(Slot.AMBIENT_CELSIUS, conditions.highestAmbientCelsius());
    for (CircuitPart part : assembly.circuit().parts()) {
      if (part.device() instanceof Adaptor adaptor) {
        slots.put(part.name() + ":volts", atHighestMains(adaptor.model()));
      } else if (part.device() instanceof Loudspeaker loudspeaker) {
        slots.put(Slot.LOAD_TOLERANCE, loudspeaker.model().dcToleranceFraction());
      }
    }
    return slots;
  }

  /** E.m.f. at the highest mains; a regulated adaptor brings what it brings unloaded. */
  private static double atHighestMains(AdaptorModel model) {
    return model.regulated()
        ? model.unloadedVolts()
        : (model.ratedVolts() + model.ratedAmperes() * model.internalOhms()) * HIGHEST_MAINS;
  }

  private static Map<String, Double> with(Map<String, Double> base, Map<String, Double> over) {
    Map<String, Double> both = new HashMap<>(base);
    both.putAll(over);
    return both;
  }
}
