package earward.desktop.view;

import com.formdev.flatlaf.util.UIScale;
import earward.block.check.Severity;
import earward.desktop.model.LevelCard;
import earward.desktop.model.Selection;
import earward.desktop.model.SideCard;
import earward.desktop.model.Standing;
import earward.desktop.model.Words;
import java.awt.BasicStroke;
import java.awt.Color;
import java.awt.Font;
import java.awt.Graphics2D;
import java.awt.Rectangle;
import java.awt.Shape;
import java.awt.geom.Path2D;
import java.awt.geom.RoundRectangle2D;
import java.util.List;
import java.util.function.ToDoubleFunction;

/** Paints the level diagram or its ribbon. */
final class PathPainter {
  private static final float[] DASH = {5f, 4f};
  private static final float[] DOTS = {1.5f, 3f};

  private final Graphics2D g;
  private final PathGeometry at;
  private final List<LevelCard> cards;
  private final List<SideCard> sides;
  private final String cursor;
  private final boolean focused;

  PathPainter(
      Graphics2D g,
      PathGeometry at,
      List<LevelCard> cards,
      List<SideCard> sides,
      String cursor,
      boolean focused) {
    this.g = g;
    this.at = at;
    this.cards = cards;
    this.sides = sides;
    this.cursor = cursor;
    this.focused = focused;
  }

  void paint() {
    if (!at.ribbon()) {
      hangings();
      line(card -> card.decibelsVolt() + card.headroomDecibels(), DASH, "path.clips");
      line(LevelCard::noiseDecibelsVolt, DOTS, "path.noise");
    }
    slopes();
    PathStop first = at.stops().get(0);
    card(
        first.box(),
        first.id(),
        LevelCard.Kind.BLOCK,
        Words.of("form.conditions"),
        Words.of("path.conditions"),
        Standing.SETTLED);
    for (int i = 0; i < cards.size(); i++) {
      LevelCard card = cards.get(i);
      card(
          at.cardBoxes().get(i),
          card.id(),
          card.kind(),
          card.title(),
          card.level(),
          card.standing());
    }
    for (int i = 0; i < sides.size(); i++) {
      SideCard side = sides.get(i);
      card(
          at.sideBoxes().get(i),
          side.id(),
          side.kind(),
          side.title(),
          side.says(),
          Standing.SETTLED);
    }
  }

  private static BasicStroke dashed(float width, float[] dash) {
    float[] scaled = {UIScale.scale(dash[0]), UIScale.scale(dash[1])};
    return new BasicStroke(
        UIScale.scale(width), BasicStroke.CAP_BUTT, BasicStroke.JOIN_ROUND, 1, scaled, 0);
  }

  /** From a take-off to the block it hangs on; from a supply a rail along the foot. */
  private void hangings() {
    g.setColor(Look.line());
    g.setStroke(new BasicStroke(UIScale.scale(1.2f)));
    for (int i = 0; i < sides.size(); i++) {
      Rectangle box = at.sideBoxes().get(i);
      int hung = at.hung(sides.get(i).joinsAt());
      if (hung >= 0) {
        Rectangle card = at.cardBoxes().get(hung);
        int x = Math.min(box.x + box.width / 2, card.x + card.width - UIScale.scale(6));
        g.drawLine(x, card.y + card.height, x, box.y);
      }
    }
  }

  private void slopes() {
    for (PathStop stop : at.stops()) {
      if (stop.seam()) {
        seam(stop);
      }
    }
  }

  private void seam(PathStop stop) {
    String blockId = Selection.seamOf(stop.id()).orElse("");
    int right = at.hung(blockId);
    if (right < 1) {
      return;
    }
    Rectangle from = at.cardBoxes().get(right - 1);
    Rectangle to = at.cardBoxes().get(right);
    boolean chosen = stop.id().equals(cursor);
    g.setColor(Look.copper());
    g.setStroke(
        new BasicStroke(
            UIScale.scale(chosen ? 4f : 2f), BasicStroke.CAP_ROUND, BasicStroke.JOIN_ROUND));
    int x1 = from.x + from.width;
    int y1 = from.y + from.height / 2;
    int y2 = to.y + to.height / 2;
    g.drawLine(x1, y1, to.x, y2);
    if (chosen) {
      int r = UIScale.scale(7);
      int mx = (x1 + to.x) / 2;
      int my = (y1 + y2) / 2;
      g.setColor(Look.card());
      g.fillOval(mx - r, my - r, 2 * r, 2 * r);
      g.setColor(Look.copper());
      g.setStroke(new BasicStroke(UIScale.scale(2f)));
      g.drawOval(mx - r, my - r, 2 * r, 2 * r);
      g.drawLine(mx - r / 2, my, mx + r / 2, my);
      g.drawLine(mx, my - r / 2, mx, my + r / 2);
    }
  }

  /** One of the ink lines over the cards that have it, named at its right end. */
  private void line(ToDoubleFunction<LevelCard> level, float[] dash, String key) {
    Path2D path = new Path2D.Double();
    Rectangle last = null;
    int lastY = 0;
    for (int i = 0; i < cards.size(); i++) {
      double value = level.applyAsDouble(cards.get(i));
      if (Double.isFinite(value)) {
        Rectangle box = at.cardBoxes().get(i);
        lastY = at.y(value);
        if (last == null) {
          path.moveTo(box.x, lastY);
        } else {
          path.lineTo(box.x, lastY);
        }
        path.lineTo(box.x + box.width, lastY);
        last = box;
      }
    }
    if (last != null) {
      g.setColor(Look.quiet());
      g.setStroke(dashed(1.3f, dash));
      g.draw(path);
      g.setFont(Look.small());
      String word = Words.of(key);
      int x = last.x + last.width + UIScale.scale(5);
      g.drawString(word, x, lastY + g.getFontMetrics().getAscent() / 2);
    }
  }

  private void card(
      Rectangle box, String id, LevelCard.Kind kind, String title, String says, Standing standing) {
    boolean chosen = id.equals(cursor);
    double arc = UIScale.scale(6f);
    Shape shape = new RoundRectangle2D.Double(box.x, box.y, box.width, box.height, arc, arc);
    boolean ghost = kind == LevelCard.Kind.GHOST;
    g.setColor(ghost ? Look.ground() : Look.card());
    g.fill(shape);
    if (kind == LevelCard.Kind.MISSING) {
      hatch(shape, box);
    }
    g.setColor(chosen ? Look.copper() : ghost ? Look.quiet() : Look.line());
    g.setStroke(ghost ? dashed(1.2f, DASH) : new BasicStroke(UIScale.scale(chosen ? 2f : 1f)));
    g.draw(shape);
    if (chosen && focused) {
      double by = UIScale.scale(3f);
      g.setStroke(new BasicStroke(UIScale.scale(1f)));
      g.draw(
          new RoundRectangle2D.Double(
              box.x - by, box.y - by, box.width + 2 * by, box.height + 2 * by, arc + by, arc + by));
    }
    Font base = g.getFont();
    int inset = UIScale.scale(7);
    int line = box.height / 2;
    text(title, box, inset, line - UIScale.scale(3), Look.ink(), base.deriveFont(Font.BOLD));
    boolean unsettled = standing == Standing.PROVISIONAL || standing == Standing.FORMER;
    Color quiet = ghost ? Look.copper() : Look.quiet();
    String shown = standing == Standing.FORMER ? "(" + says + ")" : says;
    text(
        shown,
        box,
        inset,
        box.height - UIScale.scale(6),
        quiet,
        Look.small().deriveFont(unsettled ? Font.ITALIC : Font.PLAIN));
    g.setFont(base);
  }

  private void hatch(Shape shape, Rectangle box) {
    Graphics2D h = (Graphics2D) g.create();
    h.clip(shape);
    h.setColor(Look.line());
    h.setStroke(new BasicStroke(UIScale.scale(1f)));
    for (int x = box.x - box.height; x < box.x + box.width; x += UIScale.scale(7)) {
      h.drawLine(x, box.y + box.height, x + box.height, box.y);
    }
    h.dispose();
    g.setColor(Look.severity(Severity.STOP));
  }

  private void text(String text, Rectangle box, int inset, int down, Color color, Font font) {
    g.setFont(font);
    g.setColor(color);
    String shown = text;
    int room = box.width - 2 * inset;
    while (shown.length() > 1 && g.getFontMetrics().stringWidth(shown) > room) {
      shown = shown.substring(0, shown.length() - 2).stripTrailing() + "…";
    }
    g.drawString(shown, box.x + inset, box.y + down);
  }
}
