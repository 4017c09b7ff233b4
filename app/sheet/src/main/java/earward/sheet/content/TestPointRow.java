package earward.sheet.content;

import java.util.Objects;
import java.util.Optional;

/**
 * One line of the test points.
 *
 * @param flag for instance TP3
 * @param where in words
 * @param dcAtRest DC without a signal
 * @param dcAtTest DC with the test signal
 * @param audio rms of the test tone
 * @param carrier rms of the carrier
 * @param restLimits of the DC without a signal; empty where none were worked out
 */
public record TestPointRow(
    String flag,
    String where,
    Amount dcAtRest,
    Amount dcAtTest,
    Amount audio,
    Amount carrier,
    Optional<LimitRow> restLimits) {
  public TestPointRow {
    Objects.requireNonNull(where);
    Objects.requireNonNull(dcAtRest);
    Objects.requireNonNull(dcAtTest);
    Objects.requireNonNull(audio);
    Objects.requireNonNull(carrier);
    Objects.requireNonNull(restLimits);
    if (flag.isBlank()) {
      throw new IllegalArgumentException("a test point has a flag");
    }
  }

  /** A line without limits. */
  public TestPointRow(
      String flag, String where, Amount dcAtRest, Amount dcAtTest, Amount audio, Amount carrier) {
    this(flag, where, dcAtRest, dcAtTest, audio, carrier, Optional.empty());
  }
}
