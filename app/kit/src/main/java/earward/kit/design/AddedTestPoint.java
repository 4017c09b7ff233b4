package earward.kit.design;

import java.util.Objects;

/**
 * A test point that the designer put on a node, beside those that the blocks have.
 *
 * @param id unique in the design, lower case with hyphens; its place is {@code added.ID}
 * @param node a node of the kit, {@code detector.out}, or a rail
 * @param words what the sheet calls it
 * @param written how the file had it
 */
public record AddedTestPoint(String id, String node, String words, AsWritten written) {
  public AddedTestPoint {
    if (!id.matches("[a-z0-9]+(-[a-z0-9]+)*")) {
      throw new IllegalArgumentException(
          "a test point is named '"
              + id
              + "'; wanted lower case letters, digits and single hyphens");
    }
    if (node.isBlank()) {
      throw new IllegalArgumentException("test point '" + id + "' stands on no node");
    }
    Objects.requireNonNull(words);
    Objects.requireNonNull(written);
  }

  /** The place under which its reference is stored. */
  public String place() {
    return "added." + id;
  }
}
