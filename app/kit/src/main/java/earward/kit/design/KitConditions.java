package earward.kit.design;

import earward.block.Conditions;
import java.util.List;
import java.util.Objects;
import java.util.Optional;

/**
 * What the kit must work under and what is wanted of it.
 *
 * @param core what blocks may know of it
 * @param frontEndSupply what powers the front end
 * @param sidebands the front end's response, by rising distance from the carrier; empty: flat
 * @param circuits the front end's tuned circuits, in place of a measured response
 * @param wanted what is wanted beyond safety
 * @param written how the file had it
 */
public record KitConditions(
    Conditions core,
    FrontEndSupply frontEndSupply,
    List<SidebandPoint> sidebands,
    Optional<FrontEndCircuits> circuits,
    WantedLimits wanted,
    AsWritten written) {
  /** Coldest and hottest air in which common parts are specified (common practice), °C. */
  private static final double LEAST_CELSIUS = -40;

  private static final double MOST_CELSIUS = 85;

  public KitConditions {
    Objects.requireNonNull(core);
    Objects.requireNonNull(frontEndSupply);
    Objects.requireNonNull(wanted);
    Objects.requireNonNull(written);
    sidebands = List.copyOf(sidebands);
    if (circuits.isPresent() && !sidebands.isEmpty()) {
      throw new IllegalArgumentException(
          "the front end is given both by points and by its tuned circuits; keep one of them");
    }
    requireTemperature(core.ambientCelsius(), "ambient");
    requireTemperature(core.highestAmbientCelsius(), "highest ambient");
    for (int i = 1; i < sidebands.size(); i++) {
      if (!(sidebands.get(i).offsetHertz() > sidebands.get(i - 1).offsetHertz())) {
        throw new IllegalArgumentException(
            "the sideband points do not rise: "
                + sidebands.get(i).offsetHertz()
                + " Hz after "
                + sidebands.get(i - 1).offsetHertz()
                + " Hz");
      }
    }
  }

  private static void requireTemperature(double celsius, String what) {
    if (!(celsius >= LEAST_CELSIUS && celsius <= MOST_CELSIUS)) {
      throw new IllegalArgumentException(
          what
              + " is "
              + celsius
              + " °C; it must be from "
              + LEAST_CELSIUS
              + " to "
              + MOST_CELSIUS
              + " °C");
    }
  }

  /** Conditions with a flat front end and usual wishes. */
  public static KitConditions of(Conditions core, FrontEndSupply frontEndSupply) {
    return new KitConditions(
        core, frontEndSupply, List.of(), Optional.empty(), WantedLimits.USUAL, AsWritten.NEW);
  }

  /** These conditions with others for the blocks. */
  public KitConditions withCore(Conditions changed) {
    return new KitConditions(changed, frontEndSupply, sidebands, circuits, wanted, written);
  }

  /** These conditions with another answer. */
  public KitConditions withFrontEndSupply(FrontEndSupply changed) {
    return new KitConditions(core, changed, sidebands, circuits, wanted, written);
  }

  /** These conditions with other wishes. */
  public KitConditions withWanted(WantedLimits changed) {
    return new KitConditions(core, frontEndSupply, sidebands, circuits, changed, written);
  }
}
