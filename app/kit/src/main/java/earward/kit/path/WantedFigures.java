package earward.kit.path;

import static earward.block.figure.CaseName.BATTERY_LOW;
import static earward.block.figure.CaseName.DEEPEST;
import static earward.block.figure.CaseName.FULL_OUTPUT;
import static earward.block.figure.CaseName.FULL_VOLUME;
import static earward.block.figure.CaseName.HIGHEST_SUPPLY;
import static earward.block.figure.CaseName.HOTTEST;
import static earward.block.figure.CaseName.NO_SIGNAL;
import static earward.block.figure.CaseName.STRONG;
import static earward.block.figure.CaseName.TEST;
import static earward.block.figure.CaseName.WEAK;
import static earward.block.figure.CaseName.WORST_TURN;

import earward.block.check.Check;
import earward.block.device.Adaptor;
import earward.block.device.AudioAmplifier;
import earward.block.device.Battery;
import earward.block.device.Capacitor;
import earward.block.device.Diode;
import earward.block.device.Potentiometer;
import earward.block.device.Regulator;
import earward.block.device.Resistor;
import earward.block.device.Terminal;
import earward.block.figure.CaseName;
import earward.block.figure.FigureName;
import earward.block.figure.Quantity;
import earward.engine.CircuitPart;
import earward.engine.Probe;
import earward.engine.Seam;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Objects;
import java.util.Set;

/** All figures that are asked of the engine for a kit: the standing list, and what checks name. */
final class WantedFigures {
  private static final List<CaseName> POWERED = List.of(NO_SIGNAL, WEAK, TEST, STRONG);
  private static final List<CaseName> SIGNALS = List.of(WEAK, TEST, STRONG, FULL_VOLUME);
  private static final List<Quantity> AT_SEAMS =
      List.of(
          Quantity.ONWARD_OHMS,
          Quantity.LOWEST_TONE_ONWARD_OHMS,
          Quantity.HIGHEST_TONE_ONWARD_OHMS,
          Quantity.CARRIER_ONWARD_OHMS,
          Quantity.BACKWARD_OHMS,
          Quantity.LOWEST_TONE_BACKWARD_OHMS,
          Quantity.HIGHEST_TONE_BACKWARD_OHMS,
          Quantity.CARRIER_BACKWARD_OHMS,
          Quantity.LOADING_LOSS_DECIBELS,
          Quantity.LOWEST_TONE_LOADING_LOSS_DECIBELS,
          Quantity.HIGHEST_TONE_LOADING_LOSS_DECIBELS,
          Quantity.LOAD_RATIO_WITHOUT);
  private static final List<CaseName> OUTPUTS = List.of(FULL_OUTPUT, BATTERY_LOW);

  private final Set<FigureName> wanted = new LinkedHashSet<>();

  /** The cases in which the depths of a detector are searched. */
  private final List<CaseName> depths;

  private WantedFigures(boolean worstTurn) {
    depths = worstTurn ? List.of(TEST, WORST_TURN) : List.of(TEST);
  }

  static List<FigureName> of(Assembly assembly, Places places, boolean worstTurn) {
    WantedFigures figures = new WantedFigures(worstTurn);
    assembly.circuit().probes().forEach(figures::atProbe);
    assembly.circuit().seams().forEach(figures::atSeam);
    assembly.circuit().parts().forEach(figures::ofPart);
    figures.noise(assembly);
    for (PlacedBlock block : assembly.blocks()) {
      for (Check check : block.description().checks()) {
        places.inEngine(block.global(check).figure()).ifPresent(figures.wanted::add);
      }
    }
    return List.copyOf(figures.wanted);
  }

  private void add(String place, Quantity quantity, List<CaseName> cases) {
    cases.forEach(caseName -> wanted.add(new FigureName(place, quantity, caseName)));
  }

  private void atProbe(Probe probe) {
    add(probe.name(), Quantity.DC_VOLTS, POWERED);
    add(probe.name(), Quantity.AUDIO_RMS_VOLTS, SIGNALS);
    add(probe.name(), Quantity.DISTORTION, SIGNALS);
    add(probe.name(), Quantity.SECOND_HARMONIC, List.of(TEST));
    add(probe.name(), Quantity.THIRD_HARMONIC, List.of(TEST));
    if (probe.name().startsWith("seam.")) {
      add(probe.name(), Quantity.AUDIO_RMS_VOLTS, List.of(DEEPEST));
    }
    add(probe.name(), Quantity.CARRIER_RMS_VOLTS, List.of(TEST, STRONG));
    add(probe.name(), Quantity.SECOND_CARRIER_RMS_VOLTS, List.of(TEST));
    add(probe.name(), Quantity.THIRD_CARRIER_RMS_VOLTS, List.of(TEST));
    if (probe.name().equals(CircuitBuilder.PATH)) {
      add(probe.name(), Quantity.AUDIO_RMS_VOLTS, List.of(KitCases.WEAK_AT_FULL_VOLUME));
      add(probe.name(), Quantity.LOW_EDGE_HERTZ, List.of(TEST));
      add(probe.name(), Quantity.HIGH_EDGE_HERTZ, List.of(TEST));
      add(probe.name(), Quantity.RESPONSE_DEVIATION_DECIBELS, List.of(TEST));
      add(probe.name(), Quantity.RESPONSE_DEVIATION_HERTZ, List.of(TEST));
    }
  }

  /** Noise where it is heard, where it begins, and on the way between. */
  private void noise(Assembly assembly) {
    for (String place : NoisePlaces.of(assembly)) {
      boolean seam = place.startsWith("seam.");
      List<CaseName> cases = seam ? List.of(TEST) : List.of(NO_SIGNAL, WEAK, TEST);
      add(place, Quantity.NOISE_RMS_VOLTS, cases);
      add(place, Quantity.A_WEIGHTED_NOISE_RMS_VOLTS, cases);
    }
  }

  private void atSeam(Seam seam) {
    String place = "seam." + seam.name();
    AT_SEAMS.forEach(quantity -> add(place, quantity, List.of(TEST)));
  }

  private void ofPart(CircuitPart part) {
    if (part.device() instanceof Capacitor) {
      add(part.name(), Quantity.DROP_VOLTS, List.of(NO_SIGNAL, STRONG, HIGHEST_SUPPLY));
    } else if (part.device() instanceof Resistor || part.device() instanceof Potentiometer) {
      add(part.name(), Quantity.DISSIPATION_WATTS, List.of(STRONG, HIGHEST_SUPPLY));
    } else if (part.device() instanceof Diode) {
      ofDiode(part.name());
    } else if (part.device() instanceof AudioAmplifier) {
      ofAmplifier(part.name());
    } else if (part.device() instanceof Regulator) {
      ofHeated(part.name());
      String input = Objects.requireNonNull(part.nodes().get(Terminal.INPUT));
      add(input, Quantity.DC_VOLTS, List.of(BATTERY_LOW));
    } else if (part.device() instanceof Battery || part.device() instanceof Adaptor) {
      add(
          part.name(),
          Quantity.SUPPLY_AMPERES,
          List.of(NO_SIGNAL, TEST, STRONG, FULL_VOLUME, FULL_OUTPUT, BATTERY_LOW, HOTTEST));
      add(part.name(), Quantity.RIPPLE_REJECTION_DECIBELS, List.of(TEST));
      add(part.name(), Quantity.HUM_RMS_VOLTS, List.of(TEST));
      add(part.name(), Quantity.RAIL_LOOP_MARGIN_DECIBELS, List.of(BATTERY_LOW));
      add(part.name(), Quantity.RAIL_LOOP_HERTZ, List.of(BATTERY_LOW));
    }
  }

  private void ofDiode(String name) {
    add(name, Quantity.CLIPPING_DEPTH, List.of(TEST, DEEPEST));
    add(name, Quantity.CLIPPING_DEPTH_WITHOUT_CAPACITOR, List.of(TEST, DEEPEST));
    add(name, Quantity.CLIPPING_DEPTH_WITHOUT_COUPLING, List.of(TEST, DEEPEST));
    for (CaseName caseName : depths) {
      add(name, Quantity.CLEAN_DEPTH, List.of(caseName));
      add(name, Quantity.REVERSAL_DEPTH, List.of(caseName));
      add(name, Quantity.CLIPPING_DEPTH, List.of(caseName));
      add(name, Quantity.CLIPPING_DEPTH_WITHOUT_CAPACITOR, List.of(caseName));
      add(name, Quantity.CLIPPING_DEPTH_WITHOUT_COUPLING, List.of(caseName));
    }
    add(name, Quantity.REVERSE_PEAK_VOLTS, List.of(DEEPEST));
    add(name, Quantity.CARRIER_PEAK_VOLTS, List.of(WEAK, TEST, STRONG));
    add(name, Quantity.DETECTION_EFFICIENCY, List.of(TEST));
    add(name, Quantity.CARRIER_INPUT_OHMS, List.of(TEST));
    add(name, Quantity.LOAD_RATIO, List.of(TEST));
  }

  private void ofAmplifier(String name) {
    add(name, Quantity.CLIP_WATTS, OUTPUTS);
    add(name, Quantity.TEN_PERCENT_WATTS, OUTPUTS);
    add(
        name,
        Quantity.SUPPLY_VOLTS,
        List.of(NO_SIGNAL, TEST, FULL_OUTPUT, BATTERY_LOW, HIGHEST_SUPPLY));
    add(name, Quantity.PEAK_AMPERES, List.of(FULL_OUTPUT));
    add(name, Quantity.OVERLOAD_DECIBELS, List.of(STRONG));
    add(name, Quantity.OVERLOAD_DECIBELS, depths);
    ofHeated(name);
  }

  private void ofHeated(String name) {
    add(name, Quantity.DISSIPATION_WATTS, List.of(NO_SIGNAL, TEST, FULL_OUTPUT, HOTTEST));
    add(name, Quantity.JUNCTION_CELSIUS, List.of(HOTTEST));
    add(name, Quantity.SURFACE_CELSIUS, List.of(HOTTEST));
  }
}
