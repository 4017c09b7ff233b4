package earward.drawing.internal.form;

import earward.drawing.internal.element.Box;
import earward.drawing.internal.element.Stroke;
import earward.drawing.internal.element.Text;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/**
 * A symbol or mark with its text, around an origin of its own.
 *
 * @param strokes in points
 * @param body the box of the symbol without its leads
 * @param leads its ends
 * @param texts what is written at it
 */
public record Form(List<Stroke> strokes, Box body, List<Lead> leads, List<Text> texts) {
  private static final double BODY_GAP = 2.5;
  private static final double TEXT_GAP = 1.5;
  private static final double LEAD_GAP = 2;
  private static final double TIP = 0.5;

  public Form {
    strokes = List.copyOf(strokes);
    leads = List.copyOf(leads);
    texts = List.copyOf(texts);
  }

  /** The end of that name. */
  public Optional<Lead> lead(String name) {
    return leads.stream().filter(lead -> lead.name().equals(name)).findFirst();
  }

  /** The same form with more text. */
  public Form with(List<Text> more) {
    List<Text> all = new ArrayList<>(texts);
    all.addAll(more);
    return new Form(strokes, body, leads, all);
  }

  /**
   * The boxes that nothing else may enter.
   *
   * @param spacing points of air beyond the usual
   */
  public List<Box> footprint(double spacing) {
    List<Box> boxes = new ArrayList<>();
    boxes.add(body.grown(BODY_GAP + spacing));
    texts.forEach(text -> boxes.add(text.box().grown(TEXT_GAP + spacing)));
    leads.forEach(lead -> boxes.add(guarded(lead)));
    return boxes;
  }

  /** The line from an end to the body with air at its sides; its very end may be touched. */
  private Box guarded(Lead lead) {
    Box line = stem(lead);
    double across = lead.side().across() ? -Math.min(TIP, line.width()) : LEAD_GAP;
    double down = lead.side().across() ? LEAD_GAP : -Math.min(TIP, line.height());
    double left = line.left() - (lead.side() == Side.RIGHT ? 0 : across);
    double right = line.right() + (lead.side() == Side.LEFT ? 0 : across);
    double top = line.top() - (lead.side() == Side.DOWN ? 0 : down);
    double bottom = line.bottom() + (lead.side() == Side.UP ? 0 : down);
    return new Box(left, top, right, bottom);
  }

  /** The line from an end to the body. */
  public Box stem(Lead lead) {
    double x = Grid.points(lead.x());
    double y = Grid.points(lead.y());
    return Box.between(x, y, body.nearestX(x), body.nearestY(y));
  }
}
