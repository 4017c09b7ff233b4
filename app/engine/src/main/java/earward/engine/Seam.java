package earward.engine;

/**
 * Where two blocks meet: two nodes that are one, with the current across them known.
 *
 * @param name id of the block that is entered; {@code ID.plus} and {@code ID.minus} for a pair
 * @param before node of the block on the left
 * @param after node of the block on the right
 */
public record Seam(String name, String before, String after) {
  public Seam {
    if (name.isBlank() || before.equals(after)) {
      throw new IllegalArgumentException(
          "seam '" + name + "' needs a name and two nodes; found " + before + " and " + after);
    }
  }
}
