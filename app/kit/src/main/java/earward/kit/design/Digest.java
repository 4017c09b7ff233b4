package earward.kit.design;

/**
 * The SHA-256 of a design's written form: two sheets with the same digest are of the same design.
 *
 * @param hex 64 lower case hexadecimal digits
 */
public record Digest(String hex) {
  private static final int SHORT_DIGITS = 8;

  public Digest {
    if (!hex.matches("[0-9a-f]{64}")) {
      throw new IllegalArgumentException("'" + hex + "' is no SHA-256");
    }
  }

  /** The first eight digits, as printed on the sheet. */
  public String shortForm() {
    return hex.substring(0, SHORT_DIGITS);
  }

  @Override
  public String toString() {
    return hex;
  }
}
