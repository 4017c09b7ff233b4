package earward.sheet.content;

import java.util.Objects;

/**
 * What one supply gives.
 *
 * @param supply its reference and type
 * @param atRest without a signal
 * @param atTest with the test signal
 * @param atFullOutput with the amplifier at the edge of clipping
 * @param hottest at the highest supply and ambient, any drive
 * @param life of a battery at the listening level; none for an adaptor
 */
public record CurrentRow(
    String supply, Amount atRest, Amount atTest, Amount atFullOutput, Amount hottest, Amount life) {
  public CurrentRow {
    Objects.requireNonNull(supply);
    Objects.requireNonNull(atRest);
    Objects.requireNonNull(atTest);
    Objects.requireNonNull(atFullOutput);
    Objects.requireNonNull(hottest);
    Objects.requireNonNull(life);
  }
}
