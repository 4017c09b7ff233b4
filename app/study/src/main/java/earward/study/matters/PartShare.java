package earward.study.matters;

import java.util.Objects;

/**
 * What one value of one part has to do with the spread of a figure.
 *
 * @param part its place
 * @param parameter which of its values
 * @param share of the figure's variance, from 0 to 1
 */
public record PartShare(String part, String parameter, double share) {
  public PartShare {
    Objects.requireNonNull(part);
    Objects.requireNonNull(parameter);
  }
}
