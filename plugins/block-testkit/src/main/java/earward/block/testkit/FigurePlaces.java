package earward.block.testkit;

import earward.block.device.Adaptor;
import earward.block.device.AudioAmplifier;
import earward.block.device.Battery;
import earward.block.device.BipolarTransistor;
import earward.block.device.Device;
import earward.block.device.Diode;
import earward.block.device.FieldEffectTransistor;
import earward.block.device.Regulator;
import earward.block.figure.CaseName;
import earward.block.figure.FigureName;
import earward.block.figure.Quantity;
import earward.block.wiring.Nodes;
import earward.block.wiring.Port;
import earward.block.wiring.WiredPart;
import earward.block.wiring.Wiring;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.TreeSet;

/** Which figures a block has: for each quantity the places where it is found. */
final class FigurePlaces {
  private final Set<String> nodes = new TreeSet<>();
  private final Wiring wiring;

  FigurePlaces(Wiring wiring) {
    this.wiring = wiring;
    for (Optional<Port> port : List.of(wiring.entry(), wiring.exit())) {
      port.ifPresent(p -> nodes.addAll(p.nodes()));
    }
    wiring.parts().forEach(part -> nodes.addAll(part.nodes().values()));
    wiring.testPoints().forEach(point -> nodes.add(point.id()));
    nodes.remove(Nodes.GROUND);
  }

  /** Why the block has no such figure, as the end of a sentence; empty where it has. */
  Optional<String> whyNot(FigureName figure) {
    CaseName caseName = figure.caseName();
    if (!CaseName.ALL.contains(caseName) && !caseName.text().matches("stage-[0-9]+")) {
      return Optional.of("in the case '" + caseName + "'; there are " + CaseName.ALL);
    }
    return whyNot(figure.place(), figure.quantity());
  }

  private Optional<String> whyNot(String place, Quantity quantity) {
    return switch (quantity) {
      case DC_VOLTS,
          AUDIO_RMS_VOLTS,
          DISTORTION,
          SECOND_HARMONIC,
          THIRD_HARMONIC,
          CARRIER_RMS_VOLTS,
          SECOND_CARRIER_RMS_VOLTS,
          THIRD_CARRIER_RMS_VOLTS,
          NOISE_RMS_VOLTS,
          A_WEIGHTED_NOISE_RMS_VOLTS,
          LOW_EDGE_HERTZ,
          HIGH_EDGE_HERTZ,
          RESPONSE_DEVIATION_DECIBELS,
          RESPONSE_DEVIATION_HERTZ ->
          unless(nodes.contains(place), place, "a node or test point; there are " + nodes);
      case DC_AMPERES, DROP_VOLTS, DISSIPATION_WATTS -> ofPart(place, Device.class);
      case JUNCTION_CELSIUS ->
          ofPart(
              place,
              List.of(
                  AudioAmplifier.class,
                  Regulator.class,
                  BipolarTransistor.class,
                  FieldEffectTransistor.class));
      case REVERSE_PEAK_VOLTS -> ofPart(place, Diode.class);
      case CARRIER_PEAK_VOLTS,
          DETECTION_EFFICIENCY,
          CARRIER_INPUT_OHMS,
          LOAD_RATIO,
          CLIPPING_DEPTH,
          CLIPPING_DEPTH_WITHOUT_CAPACITOR,
          CLIPPING_DEPTH_WITHOUT_COUPLING,
          REVERSAL_DEPTH,
          CLEAN_DEPTH ->
          ofPart(place, List.of(Diode.class, BipolarTransistor.class, FieldEffectTransistor.class));
      case SURFACE_CELSIUS,
          SUPPLY_VOLTS,
          PEAK_AMPERES,
          CLIP_WATTS,
          TEN_PERCENT_WATTS,
          LOAD_OHMS,
          OVERLOAD_DECIBELS ->
          ofPart(place, AudioAmplifier.class);
      case SUPPLY_AMPERES ->
          place.isEmpty() && hasSource()
              ? Optional.empty()
              : ofPart(place, List.of(Battery.class, Adaptor.class));
      case RIPPLE_REJECTION_DECIBELS, HUM_RMS_VOLTS, RAIL_LOOP_MARGIN_DECIBELS, RAIL_LOOP_HERTZ ->
          ofPart(place, List.of(Battery.class, Adaptor.class));
      case BATTERY_HOURS -> ofPart(place, Battery.class);
      case ONWARD_OHMS,
          BACKWARD_OHMS,
          LOADING_LOSS_DECIBELS,
          LOWEST_TONE_ONWARD_OHMS,
          HIGHEST_TONE_ONWARD_OHMS,
          LOWEST_TONE_BACKWARD_OHMS,
          HIGHEST_TONE_BACKWARD_OHMS,
          LOWEST_TONE_LOADING_LOSS_DECIBELS,
          HIGHEST_TONE_LOADING_LOSS_DECIBELS,
          CARRIER_ONWARD_OHMS,
          CARRIER_BACKWARD_OHMS,
          LOAD_RATIO_WITHOUT,
          HEADROOM_DECIBELS ->
          unless(
              place.isEmpty() && wiring.entry().isPresent(),
              place,
              "the seam by which a block is entered: write the empty place");
      case OUTPUT_RMS_VOLTS,
          OUTPUT_WATTS,
          SIGNAL_TO_NOISE_DECIBELS,
          A_WEIGHTED_SIGNAL_TO_NOISE_DECIBELS,
          SOUND_DECIBELS,
          SIGNAL_TO_HUM_DECIBELS,
          POWER_STAGE_DEPTH,
          KNOB_POSITION ->
          Optional.of(
              "at '" + place + "'; it is of the whole path, which is not a block's to check");
    };
  }

  private Optional<String> ofPart(String place, Class<? extends Device> kind) {
    return ofPart(place, List.of(kind));
  }

  private Optional<String> ofPart(String place, List<Class<? extends Device>> kinds) {
    Set<String> there = new TreeSet<>();
    for (Class<? extends Device> kind : kinds) {
      wiring.partsOf(kind).stream().map(WiredPart::id).forEach(there::add);
    }
    String words = String.join(" or ", kinds.stream().map(FigurePlaces::withArticle).toList());
    return unless(
        there.contains(place),
        place,
        kinds.contains(Device.class)
            ? "a part; there are " + there
            : "a part that is "
                + words
                + (there.isEmpty() ? "; this variation has none" : "; there are " + there));
  }

  private static String withArticle(Class<? extends Device> kind) {
    String word = kind.getSimpleName();
    return ("AEIO".indexOf(word.charAt(0)) < 0 ? "a " : "an ") + word;
  }

  private boolean hasSource() {
    return !wiring.partsOf(Battery.class).isEmpty() || !wiring.partsOf(Adaptor.class).isEmpty();
  }

  private static Optional<String> unless(boolean sound, String place, String wanted) {
    return sound ? Optional.empty() : Optional.of("at '" + place + "'; wanted " + wanted);
  }
}
