package earward.kit.review;

import earward.kit.design.KitDesign;
import java.util.Objects;

/**
 * An edit that was solved and found to clear a finding without raising a new STOP.
 *
 * @param sentence what it changes and what comes of it
 * @param edited the design with the edit
 */
public record Remedy(String sentence, KitDesign edited) {
  public Remedy {
    Objects.requireNonNull(sentence);
    Objects.requireNonNull(edited);
  }
}
