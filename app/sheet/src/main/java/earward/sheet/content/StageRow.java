package earward.sheet.content;

import java.util.List;
import java.util.Objects;

/**
 * One build stage.
 *
 * @param number from 1
 * @param title what is built
 * @param parts lowest first
 * @param cautions of its parts
 * @param drawing of this stage alone
 * @param connect what is joined to the cut path, one sentence each
 * @param unpowered what is tried without the supply
 * @param power the first switch-on
 * @param method how the points are read
 * @param points where the builder measures
 * @param listen what is heard, and what is not
 */
public record StageRow(
    int number,
    String title,
    List<Part> parts,
    List<CautionRow> cautions,
    PathDrawing drawing,
    List<String> connect,
    List<String> unpowered,
    List<String> power,
    String method,
    List<Point> points,
    List<String> listen) {

  /**
   * A part to fit.
   *
   * @param reference for instance R7
   * @param value as it is ordered
   * @param purpose what it is in its block
   */
  public record Part(String reference, String value, String purpose) {}

  /**
   * A point to read, in the partial kit.
   *
   * @param flag for instance TP3
   * @param where in words
   * @param atRest DC with the cut joined to ground
   * @param injected DC with the cell joined instead; none where no cell is used
   */
  public record Point(String flag, String where, Amount atRest, Amount injected) {}

  public StageRow {
    Objects.requireNonNull(title);
    parts = List.copyOf(parts);
    cautions = List.copyOf(cautions);
    Objects.requireNonNull(drawing);
    connect = List.copyOf(connect);
    unpowered = List.copyOf(unpowered);
    power = List.copyOf(power);
    Objects.requireNonNull(method);
    points = List.copyOf(points);
    listen = List.copyOf(listen);
  }

  /** Whether a cell is used. */
  public boolean usesCell() {
    return points.stream().anyMatch(point -> point.injected().known());
  }
}
