package earward.kit.file;

/**
 * A place in the text of a file.
 *
 * @param line from 1
 * @param column from 1
 */
public record FilePlace(int line, int column) {
  public FilePlace {
    if (line < 1 || column < 1) {
      throw new IllegalArgumentException(
          "line " + line + ", column " + column + " is no place; both count from 1");
    }
  }

  @Override
  public String toString() {
    return "line " + line + ", column " + column;
  }
}
