package earward.sheet.internal.section;

import earward.sheet.content.PartRow;
import earward.sheet.content.PinOut;
import earward.sheet.internal.page.Cell;
import earward.sheet.internal.page.Column;
import earward.sheet.internal.page.Piece;
import earward.sheet.internal.page.Style;
import earward.sheet.internal.page.Table;
import java.util.ArrayList;
import java.util.List;

/** The parts list, to be ticked off, and the pins of what has many. */
final class PartsSection {
  private static final float LEAST_ROW = 22;

  /** A list that begins low on a page begins with more than a row or two. */
  private static final int LEAST_TOGETHER = 14;

  private PartsSection() {}

  static List<Piece> parts(List<PartRow> parts, Words words) {
    List<Piece> pieces = new ArrayList<>();
    if (parts.isEmpty()) {
      return pieces;
    }
    pieces.add(new Heading(words.text("section.parts"), false).keepingTogether(LEAST_TOGETHER));
    pieces.add(Paragraph.body(words.text("parts.how")).kept());
    pieces.add(new Gap(6));
    Table table =
        new Table(
            List.of(
                Column.words(words.text("parts.fitted"), 28),
                Column.words(words.text("parts.reference"), 30),
                Column.words(words.text("parts.value"), 92),
                Column.words(words.text("parts.marking"), 148),
                Column.rest(words.text("parts.purpose"))),
            LEAST_ROW);
    String group = "";
    for (PartRow part : parts) {
      if (!part.group().equals(group)) {
        group = part.group();
        table.group(group);
      }
      table.row(row(part, words));
    }
    pieces.addAll(table.pieces());
    return pieces;
  }

  private static List<Cell> row(PartRow part, Words words) {
    return List.of(
        new TickCell(),
        Cell.text(part.reference(), Style.STRONG),
        Cell.stacked(Cell.text(part.value(), Style.STRONG), Cell.text(part.rating(), Style.NOTE)),
        new MarkingCell(part.marking(), words),
        Cell.stacked(Cell.text(part.purpose(), Style.BODY), Cell.text(part.fitting(), Style.NOTE)));
  }

  static List<Piece> pinOuts(List<PinOut> pinOuts, Words words) {
    List<Piece> pieces = new ArrayList<>();
    if (pinOuts.isEmpty()) {
      return pieces;
    }
    pieces.add(new Heading(words.text("section.pin-outs"), false));
    pinOuts.forEach(pinOut -> pieces.add(new PinOutPiece(pinOut, words)));
    return pieces;
  }
}
