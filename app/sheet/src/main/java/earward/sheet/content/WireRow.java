package earward.sheet.content;

import java.util.Objects;

/**
 * One wire that leaves the board.
 *
 * @param from part and end
 * @param to where it leads
 */
public record WireRow(String from, String to) {
  public WireRow {
    Objects.requireNonNull(from);
    Objects.requireNonNull(to);
  }
}
