package earward.study.matters;

import java.util.Objects;

/**
 * What another tolerance of one part would do to the yield, over the same kits.
 *
 * @param part its place
 * @param factor by which all its tolerances are multiplied: below 1 tighter, above 1 looser
 * @param yieldBefore share of good kits as it is
 * @param yieldAfter share of good kits with it
 */
public record ToleranceTrial(String part, double factor, double yieldBefore, double yieldAfter) {
  public ToleranceTrial {
    Objects.requireNonNull(part);
  }
}
