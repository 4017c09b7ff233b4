package earward.drawing.internal.form;

import earward.block.device.Terminal;
import earward.drawing.internal.element.Box;
import earward.drawing.internal.element.Stroke.Style;
import earward.drawing.internal.element.Text;
import earward.drawing.internal.element.Text.Role;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;

/** An integrated circuit as a box with labelled pins. Its origin is the main input. */
public final class Boxed {
  private static final int LEAD = 2;
  private static final double INSET = 3;
  private static final double CAP = 5.6;

  private Boxed() {}

  /**
   * A pin in its place.
   *
   * @param terminal what it is
   * @param numbers as printed in the data sheet; empty where unknown
   * @param offset cells from the origin down (left and right), or from the box's left (top, bottom)
   */
  public record PinPlace(Terminal terminal, String numbers, int offset) {}

  /**
   * The symbol.
   *
   * @param pins by side
   * @param innerCells width of the box
   * @param topCells upper edge from the origin
   * @param bottomCells lower edge from the origin
   * @param amplifier whether it bears the amplifier's triangle
   */
  public static Form of(
      Map<Side, List<PinPlace>> pins,
      int innerCells,
      int topCells,
      int bottomCells,
      boolean amplifier,
      List<String> label,
      String owner,
      Lettering lettering) {
    double left = Grid.points(LEAD);
    double right = left + Grid.points(innerCells);
    double top = Grid.points(topCells);
    double bottom = Grid.points(bottomCells);
    Pen pen = new Pen();
    pen.rectangle(left, top, right, bottom, Style.LINE);
    List<Lead> leads = new ArrayList<>();
    List<Text> texts = new ArrayList<>();
    Box body = new Box(left, top, right, bottom);
    for (Side side : Side.values()) {
      for (PinPlace pin : pins.getOrDefault(side, List.of())) {
        Lead lead = lead(pin, side, innerCells, topCells, bottomCells);
        leads.add(lead);
        pen.lead(
            Grid.points(lead.x()),
            Grid.points(lead.y()),
            body.nearestX(Grid.points(lead.x())),
            body.nearestY(Grid.points(lead.y())));
        pinTexts(pin, lead, body, owner, lettering).stream()
            .filter(text -> !text.text().isEmpty())
            .forEach(texts::add);
      }
    }
    double middleX = (left + right) / 2;
    double middleY = (top + bottom) / 2 + (amplifier ? 6 : 0);
    texts.addAll(lettering.around(label, middleX, middleY, owner));
    if (amplifier) {
      double foot = middleY - label.size() * Lettering.LINE_POINTS / 2 - 2;
      pen.closed(Style.LINE, middleX - 4.5, foot - 10, middleX + 5, foot - 5, middleX - 4.5, foot);
    }
    return new Form(pen.strokes(), body, leads, texts);
  }

  private static Lead lead(PinPlace pin, Side side, int inner, int top, int bottom) {
    String name = pin.terminal().name();
    return switch (side) {
      case LEFT -> new Lead(name, 0, pin.offset(), side);
      case RIGHT -> new Lead(name, inner + 2 * LEAD, pin.offset(), side);
      case UP -> new Lead(name, LEAD + pin.offset(), top - LEAD, side);
      case DOWN -> new Lead(name, LEAD + pin.offset(), bottom + LEAD, side);
    };
  }

  private static List<Text> pinTexts(
      PinPlace pin, Lead lead, Box body, String owner, Lettering letters) {
    String name = name(pin.terminal());
    double x = Grid.points(lead.x());
    double y = Grid.points(lead.y());
    String numbers = pin.numbers();
    return switch (lead.side()) {
      case LEFT ->
          List.of(
              letters.at(name, body.left() + INSET, y + CAP / 2, Role.PIN, owner),
              letters.endingAt(numbers, body.left() - 1.5, y - 2.6, Role.PIN, owner));
      case RIGHT ->
          List.of(
              letters.endingAt(name, body.right() - INSET, y + CAP / 2, Role.PIN, owner),
              letters.at(numbers, body.right() + 2, y - 2.6, Role.PIN, owner));
      case UP ->
          List.of(
              letters.centred(name, x, body.top() + INSET + CAP, Role.PIN, owner),
              letters.at(numbers, x + 3.6, body.top() - 2.6, Role.PIN, owner));
      case DOWN ->
          List.of(
              letters.centred(name, x, body.bottom() - INSET, Role.PIN, owner),
              letters.at(numbers, x + 3.6, body.bottom() + 7.8, Role.PIN, owner));
    };
  }

  /** What is written inside at a pin: the usual short name. */
  public static String name(Terminal terminal) {
    return switch (terminal) {
      case INPUT -> "IN";
      case INVERTING -> "IN\u2212";
      case INVERTING_TWO -> "IN2\u2212";
      case OUTPUT -> "OUT";
      case OUTPUT_TWO -> "OUT2";
      case SUPPLY -> "V+";
      case GROUND -> "GND";
      case GAIN -> "GAIN";
      case RIPPLE -> "RIPPLE";
      case BOOTSTRAP -> "BOOT";
      case COMPENSATION -> "COMP";
      case CONTROL -> "CTRL";
      case A,
          B,
          ANODE,
          CATHODE,
          TOP,
          WIPER,
          TAP,
          BOTTOM,
          PRIMARY_START,
          PRIMARY_END,
          BASE,
          COLLECTOR,
          EMITTER,
          GATE,
          DRAIN,
          SOURCE,
          PLUS,
          MINUS ->
          terminal.name();
    };
  }
}
