package earward.kit.path;

import earward.block.figure.FigureName;
import earward.block.figure.Quantity;
import earward.engine.Circuit;
import java.util.HashSet;
import java.util.Optional;
import java.util.Set;

/** The places of a circuit, and which quantities the engine gives at which of them. */
final class Places {
  private enum Kind {
    NODE,
    PART,
    SEAM,
    /** Worked out from other figures by {@link DerivedFigures}. */
    DERIVED
  }

  private static final String SEAM_PREFIX = "seam.";

  private final Set<String> nodes = new HashSet<>();
  private final Set<String> parts = new HashSet<>();
  private final Set<String> seams = new HashSet<>();

  Places(Circuit circuit) {
    circuit
        .parts()
        .forEach(
            part -> {
              parts.add(part.name());
              nodes.addAll(part.nodes().values());
            });
    circuit.probes().forEach(probe -> nodes.add(probe.name()));
    circuit.seams().forEach(seam -> seams.add(SEAM_PREFIX + seam.name()));
  }

  /** Under which name the engine knows the figure; empty where it does not. */
  Optional<FigureName> inEngine(FigureName name) {
    return switch (kind(name.quantity())) {
      case NODE -> nodes.contains(name.place()) ? Optional.of(name) : Optional.empty();
      case PART -> parts.contains(name.place()) ? Optional.of(name) : Optional.empty();
      case SEAM -> seam(name);
      case DERIVED -> Optional.empty();
    };
  }

  /** A block's own place stands for the seam by which it is entered. */
  private Optional<FigureName> seam(FigureName name) {
    if (seams.contains(name.place())) {
      return Optional.of(name);
    }
    String entered = SEAM_PREFIX + name.place();
    return seams.contains(entered)
        ? Optional.of(new FigureName(entered, name.quantity(), name.caseName()))
        : Optional.empty();
  }

  private static Kind kind(Quantity quantity) {
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
          Kind.NODE;
      case DC_AMPERES,
          DROP_VOLTS,
          DISSIPATION_WATTS,
          JUNCTION_CELSIUS,
          SURFACE_CELSIUS,
          REVERSE_PEAK_VOLTS,
          CARRIER_PEAK_VOLTS,
          DETECTION_EFFICIENCY,
          CARRIER_INPUT_OHMS,
          LOAD_RATIO,
          CLIPPING_DEPTH,
          CLIPPING_DEPTH_WITHOUT_CAPACITOR,
          CLIPPING_DEPTH_WITHOUT_COUPLING,
          REVERSAL_DEPTH,
          CLEAN_DEPTH,
          SUPPLY_VOLTS,
          PEAK_AMPERES,
          CLIP_WATTS,
          TEN_PERCENT_WATTS,
          SUPPLY_AMPERES,
          RIPPLE_REJECTION_DECIBELS,
          HUM_RMS_VOLTS,
          RAIL_LOOP_MARGIN_DECIBELS,
          RAIL_LOOP_HERTZ,
          OVERLOAD_DECIBELS ->
          Kind.PART;
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
          LOAD_RATIO_WITHOUT ->
          Kind.SEAM;
      case HEADROOM_DECIBELS,
          LOAD_OHMS,
          OUTPUT_RMS_VOLTS,
          OUTPUT_WATTS,
          SIGNAL_TO_NOISE_DECIBELS,
          A_WEIGHTED_SIGNAL_TO_NOISE_DECIBELS,
          BATTERY_HOURS,
          SOUND_DECIBELS,
          SIGNAL_TO_HUM_DECIBELS,
          POWER_STAGE_DEPTH,
          KNOB_POSITION ->
          Kind.DERIVED;
    };
  }
}
