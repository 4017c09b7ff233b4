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
public record Ink(Color symbol, Color wire, Color text, Color quiet, Color testPoint, Color paper) {
  public Ink {
    Objects.requireNonNull(symbol);
    Objects.requireNonNull(wire);
    Objects.requireNonNull(text);
    Objects.requireNonNull(quiet);
    Objects.requireNonNull(testPoint);
    Objects.requireNonNull(paper);
  }

  /** Black on white, for print and a light screen. */
  public static Ink print() {
    return new Ink(
        Color.BLACK, Color.BLACK, Color.BLACK, new Color(0x555555), Color.BLACK, Color.WHITE);
  }

  /** Light lines on a dark ground, for the screen. */
  public static Ink dark() {
    return new Ink(
        new Color(0xE6E6E6),
        new Color(0xB9C4CF),
        new Color(0xF0F0F0),
        new Color(0x8A949E),
        new Color(0xF2C14E),
        new Color(0x1E2226));
  }
}
