package earward.kit.proposal;

import earward.block.check.Finding;
import earward.block.figure.FigureName;
import earward.kit.design.KitDesign;
import java.util.List;
import java.util.Objects;

/**
 * Something that could be done at a seam, solved before it is taken: one edit, and what it does.
 *
 * @param kind what is done
 * @param sentence what is put in or changed, with its values
 * @param edited the design with it
 * @param effects figures before and after, the level into what follows first
 * @param cleared findings of the kit as it is that are gone then
 * @param raised findings that it brings
 */
public record MatchingAction(
    Kind kind,
    String sentence,
    KitDesign edited,
    List<Effect> effects,
    List<Finding> cleared,
    List<Finding> raised) {
  /** What is done. */
  public enum Kind {
    PAD("pad"),
    COUPLING_CAPACITOR("coupling-capacitor"),
    SERIES_RESISTOR("series-resistor"),
    SHUNT_RESISTOR("shunt-resistor"),
    BUFFER("buffer"),
    OTHER_TRACK("other-track");

    private final String key;

    Kind(String key) {
      this.key = key;
    }

    /** The word on the command line. */
    public String key() {
      return key;
    }
  }

  /**
   * One figure.
   *
   * @param figure its name in the kit as it is
   * @param before as it is; NaN where it does not exist
   * @param after with the action taken
   */
  public record Effect(FigureName figure, double before, double after) {}

  public MatchingAction {
    Objects.requireNonNull(kind);
    Objects.requireNonNull(sentence);
    Objects.requireNonNull(edited);
    effects = List.copyOf(effects);
    cleared = List.copyOf(cleared);
    raised = List.copyOf(raised);
  }
}
