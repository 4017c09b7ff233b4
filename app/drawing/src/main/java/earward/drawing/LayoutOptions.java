package earward.drawing;

import java.awt.Font;
import java.util.Objects;

/**
 * How a drawing is laid out.
 *
 * @param widthPoints width at which rows break (1/72 inch), at least 100
 * @param textPoints size of references and values, at least 7
 * @param font the typeface; its metrics decide the layout, so print with the same one
 * @param words the few words of the drawing itself
 */
public record LayoutOptions(double widthPoints, double textPoints, Font font, LayoutWords words) {
  /** Text is never smaller than this on paper. */
  public static final double LEAST_TEXT_POINTS = 7;

  private static final double LEAST_WIDTH_POINTS = 100;

  public LayoutOptions {
    Objects.requireNonNull(font);
    Objects.requireNonNull(words);
    if (!(widthPoints >= LEAST_WIDTH_POINTS)) {
      throw new IllegalArgumentException(
          "a drawing is at least 100 pt wide; found " + widthPoints + " pt");
    }
    if (!(textPoints >= LEAST_TEXT_POINTS)) {
      throw new IllegalArgumentException(
          "text on a drawing is at least 7 pt; found " + textPoints + " pt");
    }
  }

  /** The usual drawing on an upright A4 page: 510 pt wide, text of 7.5 pt, English words. */
  public static LayoutOptions usual(Font font) {
    return new LayoutOptions(510, 7.5, font, LayoutWords.english());
  }
}
