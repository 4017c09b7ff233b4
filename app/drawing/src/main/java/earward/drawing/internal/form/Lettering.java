package earward.drawing.internal.form;

import earward.drawing.internal.element.Box;
import earward.drawing.internal.element.Text;
import earward.drawing.internal.element.Text.Role;
import java.awt.Font;
import java.awt.font.FontRenderContext;
import java.util.ArrayList;
import java.util.List;

/** Sets text in one typeface and knows how wide it is. Immutable. */
public final class Lettering {
  /** Size of all text but titles, in points before the drawing is scaled. */
  public static final double SIZE_POINTS = 7.5;

  /** Size of titles. */
  public static final double TITLE_POINTS = 8.5;

  /** From line to line. */
  public static final double LINE_POINTS = 8.6;

  private static final double ASCENT = 0.78;
  private static final double DESCENT = 0.22;
  private static final FontRenderContext EXACT = new FontRenderContext(null, true, true);

  private final Font plain;
  private final Font bold;

  /** Lettering in a typeface. */
  public Lettering(Font font) {
    this.plain = font.deriveFont(Font.PLAIN, (float) SIZE_POINTS);
    this.bold = font.deriveFont(Font.BOLD, (float) TITLE_POINTS);
  }

  /** Width in points. */
  public double width(String text, Role role) {
    return (role == Role.TITLE ? bold : plain).getStringBounds(text, EXACT).getWidth();
  }

  /** A line that starts at x. */
  public Text at(String text, double x, double baseline, Role role, String inside) {
    double size = role == Role.TITLE ? TITLE_POINTS : SIZE_POINTS;
    Box box =
        new Box(x, baseline - ASCENT * size, x + width(text, role), baseline + DESCENT * size);
    return new Text(text, x, baseline, size, role, inside, box);
  }

  /** A line with its middle at x. */
  public Text centred(String text, double x, double baseline, Role role, String inside) {
    return at(text, x - width(text, role) / 2, baseline, role, inside);
  }

  /** A line that ends at x. */
  public Text endingAt(String text, double x, double baseline, Role role, String inside) {
    return at(text, x - width(text, role), baseline, role, inside);
  }

  /** Lines one under the other, centred, the last one standing on a line. */
  public List<Text> above(List<String> lines, double x, double bottom, String inside) {
    List<Text> texts = new ArrayList<>();
    for (int i = 0; i < lines.size(); i++) {
      double baseline = bottom - DESCENT * SIZE_POINTS - (lines.size() - 1 - i) * LINE_POINTS;
      texts.add(centred(lines.get(i), x, baseline, role(i), inside));
    }
    return texts;
  }

  /** Lines one under the other that start at x, their middle at y. */
  public List<Text> beside(List<String> lines, double x, double middle, String inside) {
    List<Text> texts = new ArrayList<>();
    double first = firstBaseline(lines.size(), middle);
    for (int i = 0; i < lines.size(); i++) {
      texts.add(at(lines.get(i), x, first + i * LINE_POINTS, role(i), inside));
    }
    return texts;
  }

  /** Lines one under the other around a middle. */
  public List<Text> around(List<String> lines, double x, double middle, String inside) {
    List<Text> texts = new ArrayList<>();
    double first = firstBaseline(lines.size(), middle);
    for (int i = 0; i < lines.size(); i++) {
      texts.add(centred(lines.get(i), x, first + i * LINE_POINTS, role(i), inside));
    }
    return texts;
  }

  private static double firstBaseline(int lines, double middle) {
    double height = (lines - 1) * LINE_POINTS + (ASCENT + DESCENT) * SIZE_POINTS;
    return middle - height / 2 + ASCENT * SIZE_POINTS;
  }

  private static Role role(int line) {
    return line == 0 ? Role.REFERENCE : Role.VALUE;
  }

  /** The widest of the lines. */
  public double widest(List<String> lines) {
    return lines.stream().mapToDouble(line -> width(line, Role.VALUE)).max().orElse(0);
  }

  /** Words in lines no wider than a limit where a single word is not wider by itself. */
  public List<String> wrapped(String text, double limit, Role role) {
    List<String> lines = new ArrayList<>();
    StringBuilder line = new StringBuilder();
    for (String word : text.strip().split("\\s+")) {
      if (line.length() > 0 && width(line + " " + word, role) > limit) {
        lines.add(line.toString());
        line.setLength(0);
      }
      line.append(line.length() > 0 ? " " : "").append(word);
    }
    lines.add(line.toString());
    return lines;
  }
}
