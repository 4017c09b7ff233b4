package earward.block.figure;

import java.util.Objects;

/**
 * The one name of a figure: place, quantity, case, written {@code volume.wiper:dc-volts@test}.
 *
 * <p>In a plug-in the place is local: a node or a part of the block, or empty for the block itself.
 * The host puts the block's id in front. Places of the whole path: {@code path}, {@code seam.ID}
 * (the seam by which block ID is entered).
 *
 * @param place where
 * @param quantity what
 * @param caseName in which state
 */
public record FigureName(String place, Quantity quantity, CaseName caseName) {
  public FigureName {
    Objects.requireNonNull(quantity);
    Objects.requireNonNull(caseName);
    if (!place.matches("[A-Za-z0-9_.-]*")) {
      throw new IllegalArgumentException(
          "'" + place + "' is no place; wanted letters, digits, points and hyphens");
    }
  }

  /** This figure with its place inside a block of the path. */
  public FigureName within(String blockId) {
    return new FigureName(place.isEmpty() ? blockId : blockId + "." + place, quantity, caseName);
  }

  /** This figure's place and quantity in another case. */
  public FigureName in(CaseName other) {
    return new FigureName(place, quantity, other);
  }

  /**
   * Reads the written form.
   *
   * @throws IllegalArgumentException with one sentence when the text is not a figure name
   */
  public static FigureName parse(String text) {
    int colon = text.indexOf(':');
    int at = text.indexOf('@', colon + 1);
    if (colon < 0 || at < 0) {
      throw new IllegalArgumentException(
          "'" + text + "' is no figure name; wanted place:quantity@case");
    }
    String key = text.substring(colon + 1, at);
    Quantity quantity =
        Quantity.ofKey(key)
            .orElseThrow(
                () -> new IllegalArgumentException("'" + key + "' is no quantity, in " + text));
    return new FigureName(text.substring(0, colon), quantity, new CaseName(text.substring(at + 1)));
  }

  @Override
  public String toString() {
    return place + ":" + quantity.key() + "@" + caseName.text();
  }
}
