package earward.study.batch;

import java.util.Objects;

/**
 * One value of a kit that is drawn.
 *
 * @param slot its index in a row of values
 * @param name of the slot, {@code volume.r1:ohms}
 * @param part the part's place, {@code volume.r1}
 * @param spread how it differs
 * @param stream of the kit's own draw
 * @param lotStream of the draw that it shares with all like parts of its lot
 */
public record DrawnValue(
    int slot, String name, String part, Spread spread, long stream, long lotStream) {
  public DrawnValue {
    Objects.requireNonNull(name);
    Objects.requireNonNull(part);
    Objects.requireNonNull(spread);
  }

  /** This value with another spread; its draws stay. */
  public DrawnValue with(Spread changed) {
    return new DrawnValue(slot, name, part, changed, stream, lotStream);
  }
}
