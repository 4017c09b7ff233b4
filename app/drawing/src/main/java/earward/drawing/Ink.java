package earward.drawing;

import java.awt.Color;
import java.util.Objects;

/**
 * The colours of a drawing.
 *
 * @param symbol of symbols
 * @param wire of wires, dots, grounds and rails
 * @param text of references, values and titles
 * @param quiet of seams, screens and pin numbers
 * @param testPoint of test point flags
 * @param paper behind all of it
 */
public record Ink(
    Color symbol, Color wire, Color text, Color quiet, Color testPoint, Color paper) {
  public Ink {
    Objects.requireNonNull(symbol);
    Objects.requireNonNull(wire);
    Objects.requireNonNull(text);
    Objects.requireNonNull(quiet);
    Objects.requireNonNull(testPoint);
    Objects.requireNonNull(paper);
  }

  /** Black on white, for print. */
  public static Ink print() {
    return new Ink(
        Color.BLACK, Color.BLACK, Color.BLACK, new Color(0x555555), Color.BLACK, Color.WHITE);
  }
}
