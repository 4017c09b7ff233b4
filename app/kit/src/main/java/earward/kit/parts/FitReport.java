package earward.kit.parts;

import java.util.Objects;
import java.util.OptionalDouble;

/**
 * How well figures of a part were fitted, for the designer.
 *
 * @param points how many points were used; 0 where the figures follow from one figure alone
 * @param residualFraction root mean square of the relative misfit; empty where there are too few
 *     points to tell
 * @param suspect whether one point stands against all others
 * @param sentence what was fitted to what, how well, and where it is extrapolated
 */
public record FitReport(
    int points, OptionalDouble residualFraction, boolean suspect, String sentence) {
  public FitReport {
    Objects.requireNonNull(residualFraction);
    if (sentence.isBlank()) {
      throw new IllegalArgumentException("a fit says what it was fitted to");
    }
  }
}
