package earward.kit.path;

import earward.block.figure.CaseName;
import earward.block.figure.FigureName;
import earward.block.figure.Quantity;
import java.util.Collection;
import java.util.EnumMap;
import java.util.EnumSet;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;

/** What must be solved for some figures of a kit, those of {@link DerivedFigures} among them. */
final class FigureNeeds {
  /** Solved quantities from which a figure of the path follows, beside one of the same name. */
  private static final Map<Quantity, Set<Quantity>> BEHIND = new EnumMap<>(Quantity.class);

  static {
    behind(Quantity.OUTPUT_RMS_VOLTS, Quantity.AUDIO_RMS_VOLTS);
    behind(Quantity.OUTPUT_WATTS, Quantity.AUDIO_RMS_VOLTS, Quantity.CLIP_WATTS);
    behind(Quantity.SOUND_DECIBELS, Quantity.AUDIO_RMS_VOLTS, Quantity.CLIP_WATTS);
    behind(Quantity.LOAD_OHMS, Quantity.CLIP_WATTS);
    behind(Quantity.BATTERY_HOURS, Quantity.SUPPLY_AMPERES, Quantity.CLIP_WATTS);
    behind(Quantity.HEADROOM_DECIBELS, Quantity.AUDIO_RMS_VOLTS, Quantity.CLIP_WATTS);
    behind(Quantity.SIGNAL_TO_HUM_DECIBELS, Quantity.AUDIO_RMS_VOLTS, Quantity.HUM_RMS_VOLTS);
    behind(Quantity.KNOB_POSITION, Quantity.CLIPPING_DEPTH);
    behind(Quantity.POWER_STAGE_DEPTH, Quantity.OVERLOAD_DECIBELS);
    behind(Quantity.CLEAN_DEPTH, Quantity.OVERLOAD_DECIBELS);
    behind(Quantity.SIGNAL_TO_NOISE_DECIBELS, Quantity.AUDIO_RMS_VOLTS, Quantity.NOISE_RMS_VOLTS);
    behind(
        Quantity.A_WEIGHTED_SIGNAL_TO_NOISE_DECIBELS,
        Quantity.AUDIO_RMS_VOLTS,
        Quantity.A_WEIGHTED_NOISE_RMS_VOLTS);
  }

  /** Noise is a solve for each of its places. */
  private static final Set<Quantity> BY_PLACE =
      EnumSet.of(Quantity.NOISE_RMS_VOLTS, Quantity.A_WEIGHTED_NOISE_RMS_VOLTS);

  private final Places places;
  private final List<FigureName> standing;

  /**
   * Needs in one circuit.
   *
   * @param standing all figures that are ever asked of the engine for it
   */
  FigureNeeds(Places places, List<FigureName> standing) {
    this.places = places;
    this.standing = standing;
  }

  private static void behind(Quantity figure, Quantity... solved) {
    BEHIND.put(figure, Set.of(solved));
  }

  /** The figures to ask of the engine. */
  Set<FigureName> of(Collection<FigureName> names) {
    Set<FigureName> needed = new LinkedHashSet<>();
    for (FigureName name : names) {
      Optional<FigureName> inEngine = places.inEngine(name);
      if (inEngine.isPresent()) {
        needed.add(inEngine.get());
      } else {
        derived(name, needed);
      }
    }
    return needed;
  }

  private void derived(FigureName name, Set<FigureName> needed) {
    Quantity quantity = name.quantity();
    Set<Quantity> behind = BEHIND.getOrDefault(quantity, Set.of());
    Set<CaseName> cases = cases(name);
    for (FigureName each : standing) {
      boolean asked = each.quantity() == quantity || behind.contains(each.quantity());
      boolean here = !BY_PLACE.contains(each.quantity()) || each.place().equals(name.place());
      if (asked && here && cases.contains(each.caseName())) {
        needed.add(each);
      }
    }
  }

  /** The states whose figures one of the path follows from. */
  private static Set<CaseName> cases(FigureName name) {
    if (name.caseName().equals(DerivedFigures.LISTENING)) {
      return Set.of(CaseName.NO_SIGNAL, CaseName.FULL_OUTPUT);
    }
    if (name.caseName().equals(CaseName.WORST_TURN)) {
      return Set.of(CaseName.WORST_TURN, CaseName.TEST);
    }
    return name.quantity() == Quantity.HEADROOM_DECIBELS
        ? Set.of(name.caseName(), CaseName.FULL_OUTPUT)
        : Set.of(name.caseName());
  }
}
