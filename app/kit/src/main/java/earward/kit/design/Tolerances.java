package earward.kit.design;

import earward.block.device.ToleranceClass;
import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Objects;

/**
 * By how much the parts of one kit differ from those of the next: a share to both sides for each
 * class, and others for single parts.
 *
 * @param byClass classes that differ from their usual share
 * @param byPart parts that differ from their class, by place {@code block.part}
 * @param written how the file had it
 */
public record Tolerances(
    Map<ToleranceClass, Double> byClass, Map<String, Double> byPart, AsWritten written) {
  /** Every class at its usual share. */
  public static final Tolerances USUAL = new Tolerances(Map.of(), Map.of(), AsWritten.NEW);

  public Tolerances {
    byClass = Collections.unmodifiableMap(new LinkedHashMap<>(byClass));
    byPart = Collections.unmodifiableMap(new LinkedHashMap<>(byPart));
    Objects.requireNonNull(written);
    byClass.forEach((kind, share) -> requireShare(share, kind.name()));
    byPart.forEach((place, share) -> requireShare(share, place));
  }

  private static void requireShare(double share, String what) {
    if (!(share >= 0 && share < 1)) {
      throw new IllegalArgumentException(
          "the tolerance of " + what + " is " + share + "; it must be from 0 to below 1");
    }
  }

  /**
   * The share that applies.
   *
   * @param kind class of the parameter
   * @param partPlace {@code block.part}
   */
  public double fraction(ToleranceClass kind, String partPlace) {
    if (kind == ToleranceClass.FIXED) {
      return 0;
    }
    Double own = byPart.get(partPlace);
    return own != null ? own : fraction(kind);
  }

  /** The share of a class. */
  public double fraction(ToleranceClass kind) {
    return byClass.getOrDefault(kind, kind.usualFraction());
  }

  /** These tolerances with another share for a class. */
  public Tolerances with(ToleranceClass kind, double share) {
    Map<ToleranceClass, Double> copy = new LinkedHashMap<>(byClass);
    copy.put(kind, share);
    return new Tolerances(copy, byPart, written);
  }

  /** These tolerances with another share for one part. */
  public Tolerances with(String partPlace, double share) {
    Map<String, Double> copy = new LinkedHashMap<>(byPart);
    copy.put(partPlace, share);
    return new Tolerances(byClass, copy, written);
  }
}
