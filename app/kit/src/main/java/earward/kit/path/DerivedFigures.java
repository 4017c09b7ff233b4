package earward.kit.path;

import static earward.block.figure.CaseName.BATTERY_LOW;
import static earward.block.figure.CaseName.DEEPEST;
import static earward.block.figure.CaseName.FULL_OUTPUT;
import static earward.block.figure.CaseName.FULL_VOLUME;
import static earward.block.figure.CaseName.HOTTEST;
import static earward.block.figure.CaseName.NO_SIGNAL;
import static earward.block.figure.CaseName.STRONG;
import static earward.block.figure.CaseName.TEST;
import static earward.block.figure.CaseName.WEAK;
import static earward.block.figure.CaseName.WORST_TURN;
import static earward.block.figure.Quantity.CLIPPING_DEPTH;

import earward.block.Role;
import earward.block.device.Adaptor;
import earward.block.device.AudioAmplifier;
import earward.block.device.Battery;
import earward.block.device.BatteryModel;
import earward.block.device.Diode;
import earward.block.device.Loudspeaker;
import earward.block.device.LoudspeakerModel;
import earward.block.device.Resistor;
import earward.block.figure.CaseName;
import earward.block.figure.FigureName;
import earward.block.figure.Quantity;
import earward.block.wiring.WiredPart;
import earward.engine.CircuitPart;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.ToDoubleFunction;

/**
 * The figures of the whole path, worked out from those that the engine solved. Pure: the same
 * figures in give the same out, for the nominal kit and for any kit of a batch.
 */
final class DerivedFigures {
  /** The state in which people usually listen: the conditions' listening level. */
  static final CaseName LISTENING = new CaseName("listening");

  private final Assembly assembly;
  private final ToDoubleFunction<FigureName> solved;
  private final Map<FigureName, Double> derived = new LinkedHashMap<>();

  private DerivedFigures(Assembly assembly, ToDoubleFunction<FigureName> solved) {
    this.assembly = assembly;
    this.solved = solved;
  }

  /**
   * What follows from the solved figures; NaN where something it needs does not exist.
   *
   * @param assembly of the kit
   * @param solved gives a solved figure, NaN where there is none
   */
  static Map<FigureName, Double> of(Assembly assembly, ToDoubleFunction<FigureName> solved) {
    DerivedFigures figures = new DerivedFigures(assembly, solved);
    figures.leastDepths();
    figures.output();
    figures.supplyCurrents();
    figures.batteryLives();
    figures.headroom();
    figures.signalToNoise();
    figures.rails();
    return figures.derived;
  }

  private double get(String place, Quantity quantity, CaseName caseName) {
    FigureName name = new FigureName(place, quantity, caseName);
    Double own = derived.get(name);
    return own != null ? own : solved.applyAsDouble(name);
  }

  private void put(String place, Quantity quantity, CaseName caseName, double value) {
    derived.put(new FigureName(place, quantity, caseName), value);
  }

  private List<CircuitPart> parts() {
    return assembly.circuit().parts();
  }

  /** The path lets go where the first of its diodes does, or its power stage. */
  private void leastDepths() {
    put(CircuitBuilder.PATH, CLIPPING_DEPTH, DEEPEST, least(CLIPPING_DEPTH, DEEPEST));
    double depth = assembly.design().conditions().core().testDepth();
    boolean turned = !Double.isNaN(least(Quantity.CLEAN_DEPTH, WORST_TURN));
    for (CaseName caseName : List.of(TEST, WORST_TURN)) {
      CaseName solvedIn = turned ? caseName : TEST;
      double power = Double.NaN;
      for (CircuitPart part : parts()) {
        if (part.device() instanceof AudioAmplifier) {
          double overload = get(part.name(), Quantity.OVERLOAD_DECIBELS, solvedIn);
          power = lesser(power, PowerStageDepth.of(depth, overload));
        }
      }
      double detector = least(Quantity.CLEAN_DEPTH, solvedIn);
      double clean = Double.isNaN(detector) ? Double.NaN : lesser(detector, power);
      put(CircuitBuilder.PATH, Quantity.POWER_STAGE_DEPTH, caseName, power);
      put(CircuitBuilder.PATH, Quantity.CLEAN_DEPTH, caseName, clean);
      double reversal = least(Quantity.REVERSAL_DEPTH, solvedIn);
      put(CircuitBuilder.PATH, Quantity.REVERSAL_DEPTH, caseName, reversal);
      double rule = least(CLIPPING_DEPTH, solvedIn);
      put(CircuitBuilder.PATH, CLIPPING_DEPTH, caseName, rule);
    }
  }

  private double least(Quantity quantity, CaseName caseName) {
    double least = Double.NaN;
    for (CircuitPart part : parts()) {
      if (part.device() instanceof Diode) {
        least = lesser(least, get(part.name(), quantity, caseName));
      }
    }
    return least;
  }

  private static double lesser(double one, double other) {
    return Double.isNaN(one) ? other : Double.isNaN(other) ? one : Math.min(one, other);
  }

  private void output() {
    double ohms = ratedLoadOhms();
    for (CaseName caseName :
        List.of(WEAK, TEST, STRONG, FULL_VOLUME, KitCases.WEAK_AT_FULL_VOLUME)) {
      double volts = get(CircuitBuilder.PATH, Quantity.AUDIO_RMS_VOLTS, caseName);
      put(CircuitBuilder.PATH, Quantity.OUTPUT_RMS_VOLTS, caseName, volts);
      outputWatts(caseName, volts * volts / ohms);
    }
    for (CircuitPart part : parts()) {
      if (part.device() instanceof AudioAmplifier) {
        put(part.name(), Quantity.LOAD_OHMS, FULL_OUTPUT, ohms);
        for (CaseName caseName : List.of(FULL_OUTPUT, BATTERY_LOW)) {
          double clipWatts = get(part.name(), Quantity.CLIP_WATTS, caseName);
          put(CircuitBuilder.PATH, Quantity.CLIP_WATTS, caseName, clipWatts);
          put(
              CircuitBuilder.PATH,
              Quantity.TEN_PERCENT_WATTS,
              caseName,
              get(part.name(), Quantity.TEN_PERCENT_WATTS, caseName));
          outputWatts(caseName, clipWatts);
        }
      }
    }
  }

  private void outputWatts(CaseName caseName, double watts) {
    put(CircuitBuilder.PATH, Quantity.OUTPUT_WATTS, caseName, watts);
    loudspeaker()
        .ifPresent(
            model ->
                put(
                    CircuitBuilder.PATH,
                    Quantity.SOUND_DECIBELS,
                    caseName,
                    model.sensitivityDecibels()
                        + 10 * Math.log10(watts)
                        - 20 * Math.log10(metres())));
  }

  /** How far people sit from the loudspeaker. */
  private double metres() {
    return assembly.design().conditions().wanted().listeningMetres();
  }

  private Optional<LoudspeakerModel> loudspeaker() {
    return parts().stream()
        .map(CircuitPart::device)
        .filter(Loudspeaker.class::isInstance)
        .map(device -> ((Loudspeaker) device).model())
        .findFirst();
  }

  /** Rated resistance of what ends the path; NaN where it ends without a load. */
  private double ratedLoadOhms() {
    if (loudspeaker().isPresent()) {
      return loudspeaker().get().ratedOhms();
    }
    if (assembly.path().isEmpty()) {
      return Double.NaN;
    }
    PlacedBlock last = assembly.path().get(assembly.path().size() - 1);
    List<WiredPart> resistors = last.description().wiring().partsOf(Resistor.class);
    boolean ends = last.description().wiring().exit().isEmpty() && resistors.size() == 1;
    return ends ? ((Resistor) resistors.get(0).device()).ohms() : Double.NaN;
  }

  private void supplyCurrents() {
    for (CaseName caseName :
        List.of(NO_SIGNAL, TEST, STRONG, FULL_VOLUME, FULL_OUTPUT, BATTERY_LOW, HOTTEST)) {
      double whole = 0;
      boolean any = false;
      for (PlacedBlock block : assembly.beside()) {
        double ofBlock = 0;
        boolean source = false;
        for (WiredPart part : block.description().wiring().parts()) {
          if (part.device() instanceof Battery || part.device() instanceof Adaptor) {
            source = true;
            ofBlock += get(block.partName(part), Quantity.SUPPLY_AMPERES, caseName);
          }
        }
        if (source) {
          put(block.id(), Quantity.SUPPLY_AMPERES, caseName, ofBlock);
          any = true;
          whole += ofBlock;
        }
      }
      put(CircuitBuilder.PATH, Quantity.SUPPLY_AMPERES, caseName, any ? whole : Double.NaN);
    }
  }

  private void batteryLives() {
    for (CaseName caseName : List.of(NO_SIGNAL, TEST, FULL_VOLUME, FULL_OUTPUT, LISTENING)) {
      double least = Double.NaN;
      for (CircuitPart part : parts()) {
        if (part.device() instanceof Battery battery) {
          double hours = hours(part.name(), battery.model(), caseName);
          put(part.name(), Quantity.BATTERY_HOURS, caseName, hours);
          least = Double.isNaN(least) ? hours : Math.min(least, hours);
        }
      }
      put(CircuitBuilder.PATH, Quantity.BATTERY_HOURS, caseName, least);
    }
  }

  private double hours(String battery, BatteryModel model, CaseName caseName) {
    if (!caseName.equals(LISTENING)) {
      return BatteryLife.hours(model, get(battery, Quantity.SUPPLY_AMPERES, caseName));
    }
    double amperes = listeningAmperes(battery);
    put(battery, Quantity.SUPPLY_AMPERES, LISTENING, amperes);
    return BatteryLife.hours(model, amperes);
  }

  /**
   * Current at the listening level: what is drawn beyond the rest grows with the output voltage, so
   * with the root of the power, up to what is drawn at full output (class B: Vp/(πRL), PHYSICS 5).
   */
  private double listeningAmperes(String battery) {
    double rest = get(battery, Quantity.SUPPLY_AMPERES, NO_SIGNAL);
    double full = get(battery, Quantity.SUPPLY_AMPERES, FULL_OUTPUT);
    double clipWatts = get(CircuitBuilder.PATH, Quantity.CLIP_WATTS, FULL_OUTPUT);
    double wanted = assembly.design().conditions().wanted().listeningWatts();
    return rest + (full - rest) * Math.sqrt(Math.min(1, wanted / clipWatts));
  }

  /** The worst of all sources of supply: least rejection, least margin; hum by power. */
  private void rails() {
    double rejection = Double.NaN;
    double margin = Double.NaN;
    double hertz = Double.NaN;
    double hum = 0;
    for (CircuitPart part : parts()) {
      if (part.device() instanceof Battery || part.device() instanceof Adaptor) {
        double here = get(part.name(), Quantity.RIPPLE_REJECTION_DECIBELS, TEST);
        rejection = Double.isNaN(here) || here > rejection ? rejection : here;
        double volts = get(part.name(), Quantity.HUM_RMS_VOLTS, TEST);
        hum += Double.isNaN(volts) ? 0 : volts * volts;
        double loop = get(part.name(), Quantity.RAIL_LOOP_MARGIN_DECIBELS, BATTERY_LOW);
        if (!Double.isNaN(loop) && !(loop > margin)) {
          margin = loop;
          hertz = get(part.name(), Quantity.RAIL_LOOP_HERTZ, BATTERY_LOW);
        }
      }
    }
    put(CircuitBuilder.PATH, Quantity.RIPPLE_REJECTION_DECIBELS, TEST, rejection);
    put(CircuitBuilder.PATH, Quantity.RAIL_LOOP_MARGIN_DECIBELS, BATTERY_LOW, margin);
    put(CircuitBuilder.PATH, Quantity.RAIL_LOOP_HERTZ, BATTERY_LOW, hertz);
    double humVolts = hum > 0 ? Math.sqrt(hum) : Double.NaN;
    put(CircuitBuilder.PATH, Quantity.HUM_RMS_VOLTS, TEST, humVolts);
    double volts = get(CircuitBuilder.PATH, Quantity.AUDIO_RMS_VOLTS, TEST);
    put(
        CircuitBuilder.PATH,
        Quantity.SIGNAL_TO_HUM_DECIBELS,
        TEST,
        20 * Math.log10(volts / humVolts));
  }

  /** Test tone over noise, both rms, at every place where noise is given. */
  private void signalToNoise() {
    for (String place : NoisePlaces.of(assembly)) {
      for (CaseName caseName : List.of(WEAK, TEST)) {
        double volts = get(place, Quantity.AUDIO_RMS_VOLTS, caseName);
        double noise = get(place, Quantity.NOISE_RMS_VOLTS, caseName);
        double weighted = get(place, Quantity.A_WEIGHTED_NOISE_RMS_VOLTS, caseName);
        put(place, Quantity.SIGNAL_TO_NOISE_DECIBELS, caseName, 20 * Math.log10(volts / noise));
        put(
            place,
            Quantity.A_WEIGHTED_SIGNAL_TO_NOISE_DECIBELS,
            caseName,
            20 * Math.log10(volts / weighted));
      }
    }
  }

  /**
   * By how much the level at a seam may rise until the amplifier clips, its knobs where they are:
   * 20·log(Vclip/Vout), Vclip = √(Pclip·Rrated). The path after the detector is linear up to there,
   * so this is one figure for all seams that carry audio.
   */
  private void headroom() {
    double clipVolts =
        Math.sqrt(get(CircuitBuilder.PATH, Quantity.CLIP_WATTS, FULL_OUTPUT) * ratedLoadOhms());
    for (CaseName caseName : List.of(TEST, STRONG)) {
      double volts = get(CircuitBuilder.PATH, Quantity.AUDIO_RMS_VOLTS, caseName);
      double decibels = 20 * Math.log10(clipVolts / volts);
      put(CircuitBuilder.PATH, Quantity.HEADROOM_DECIBELS, caseName, decibels);
      boolean audio = false;
      for (PlacedBlock block : assembly.path()) {
        if (audio) {
          put("seam." + block.id(), Quantity.HEADROOM_DECIBELS, caseName, decibels);
        }
        audio |= block.type().role() == Role.DETECTOR;
      }
    }
  }
}
