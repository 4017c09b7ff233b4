package earward.sheet.content;

import java.util.Objects;

/**
 * One line of the test points.
 *
 * @param flag for instance TP3
 * @param where in words
 * @param dcAtRest DC without a signal
 * @param dcAtTest DC with the test signal
 * @param audio rms of the test tone
 * @param carrier rms of the carrier
 */
public record TestPointRow(
    String flag, String where, Amount dcAtRest, Amount dcAtTest, Amount audio, Amount carrier) {
  public TestPointRow {
    Objects.requireNonNull(where);
    Objects.requireNonNull(dcAtRest);
    Objects.requireNonNull(dcAtTest);
    Objects.requireNonNull(audio);
    Objects.requireNonNull(carrier);
    if (flag.isBlank()) {
      throw new IllegalArgumentException("a test point has a flag");
    }
  }
}
