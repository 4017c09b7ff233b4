package earward.drawing.curve;

import java.awt.Color;
import java.awt.Font;
import java.util.Objects;

/**
 * Colours and type of a picture of curves.
 *
 * @param line of the main curve
 * @param second of the curves beside it
 * @param quiet of ghosts, grid and axes
 * @param text of all words
 * @param limit of limit lines
 * @param paper behind all of it
 * @param font of all words
 */
public record CurveInk(
    Color line, Color second, Color quiet, Color text, Color limit, Color paper, Font font) {
  public CurveInk {
    Objects.requireNonNull(line);
    Objects.requireNonNull(second);
    Objects.requireNonNull(quiet);
    Objects.requireNonNull(text);
    Objects.requireNonNull(limit);
    Objects.requireNonNull(paper);
    Objects.requireNonNull(font);
  }
}
