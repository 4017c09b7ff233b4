package earward.drawing;

import earward.drawing.internal.element.Box;
import earward.drawing.internal.element.Element;
import earward.drawing.internal.element.Mark;
import earward.drawing.internal.element.Symbol;
import earward.drawing.internal.element.Text;
import earward.drawing.internal.reading.NetReader;
import earward.drawing.internal.reading.OverlapReader;
import java.awt.Font;
import java.awt.Graphics2D;
import java.awt.geom.Rectangle2D;
import java.util.List;
import java.util.Map;
import java.util.SortedSet;
import java.util.TreeMap;
import java.util.TreeSet;

/** A circuit drawing: immutable vector geometry in points (1/72 inch), y growing downwards. */
public final class Schematic {
  private final double width;
  private final double height;
  private final double scale;
  private final Font font;
  private final List<Element> elements;
  private final List<Rectangle2D.Double> rows;

  Schematic(
      double width,
      double height,
      double scale,
      Font font,
      List<Element> elements,
      List<Rectangle2D.Double> rows) {
    this.width = width;
    this.height = height;
    this.scale = scale;
    this.font = font;
    this.elements = List.copyOf(elements);
    this.rows = List.copyOf(rows);
  }

  /** Width in points; more than was asked for where one block alone is wider. */
  public double width() {
    return width;
  }

  /** Height in points. */
  public double height() {
    return height;
  }

  /** The box of each row, from the top: where a page may break. */
  public List<Rectangle2D> rows() {
    return rows.stream().<Rectangle2D>map(row -> (Rectangle2D) row.clone()).toList();
  }

  /** Where each part's symbol stands, by {@code block.part}. */
  public Map<String, Rectangle2D> partBounds() {
    Map<String, Rectangle2D> found = new TreeMap<>();
    for (Element element : elements) {
      if (element instanceof Symbol symbol) {
        found.put(symbol.part(), rectangle(symbol.bounds()));
      }
    }
    return found;
  }

  /** Where each test point's flag stands, by {@code block#test-point}. */
  public Map<String, Rectangle2D> testPointBounds() {
    Map<String, Rectangle2D> found = new TreeMap<>();
    for (Element element : elements) {
      if (element instanceof Mark mark && mark.kind() == Mark.Kind.TEST_POINT) {
        found.put(mark.name(), rectangle(mark.bounds()));
      }
    }
    return found;
  }

  /**
   * The same drawing with other words on the flags of test points; where each stands is kept.
   *
   * @param texts by {@code block#test-point}; a flag that is not named keeps its words
   */
  public Schematic withFlagTexts(Map<String, String> texts) {
    List<Element> changed =
        elements.stream()
            .map(element -> element instanceof Text text ? flag(text, texts) : element)
            .toList();
    return new Schematic(width, height, scale, font, changed, rows);
  }

  private static Element flag(Text text, Map<String, String> texts) {
    String owner = Mark.Kind.TEST_POINT + " ";
    String words =
        text.inside().startsWith(owner) ? texts.get(text.inside().substring(owner.length())) : null;
    return words == null
        ? text
        : new Text(
            words,
            text.x(),
            text.baseline(),
            text.sizePoints(),
            text.role(),
            text.inside(),
            text.bounds());
  }

  private Rectangle2D rectangle(Box box) {
    return new Rectangle2D.Double(
        box.left() * scale, box.top() * scale, box.width() * scale, box.height() * scale);
  }

  /** Draws all of it with its upper left corner at the origin; the graphics' state is kept. */
  public void paint(Graphics2D graphics, Ink ink) {
    Graphics2D scaled = (Graphics2D) graphics.create();
    scaled.scale(scale, scale);
    new Painter(scaled, ink, font).paint(elements);
    scaled.dispose();
  }

  /**
   * Draws what stands between two heights, moved up so that the upper one is at the origin: one row
   * of a drawing that goes over several pages. Nothing is cut; what stands elsewhere is left out.
   *
   * @param top upper height in points
   * @param bottom lower height in points
   */
  public void paint(Graphics2D graphics, Ink ink, double top, double bottom) {
    List<Element> between =
        elements.stream()
            .filter(
                element -> {
                  Box box = element.bounds();
                  double middle = (box.top() + box.bottom()) / 2 * scale;
                  return middle >= top && middle < bottom;
                })
            .toList();
    Graphics2D moved = (Graphics2D) graphics.create();
    moved.translate(0, -top);
    moved.scale(scale, scale);
    new Painter(moved, ink, font).paint(between);
    moved.dispose();
  }

  /**
   * The netlist read from the geometry alone: what touches what, and what bears the same name.
   * Wires that cross without a dot are not connected.
   */
  public Netlist readBack() {
    return new Netlist(NetReader.read(elements));
  }

  /**
   * Whatever lies over something else, one sentence each: symbols, wires and text. Wires may cross
   * at right angles and touch symbols at their ends.
   */
  public List<String> overlaps() {
    return OverlapReader.read(elements);
  }

  /** The sizes of text that occur, in points. */
  public SortedSet<Double> textSizes() {
    SortedSet<Double> found = new TreeSet<>();
    for (Element element : elements) {
      if (element instanceof Text text) {
        found.add(text.sizePoints() * scale);
      }
    }
    return found;
  }

  /** The geometry, for tests. */
  List<Element> elements() {
    return elements;
  }

  /** The same drawing with other geometry, for tests. */
  Schematic withElements(List<Element> changed) {
    return new Schematic(width, height, scale, font, changed, rows);
  }
}
