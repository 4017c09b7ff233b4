package earward.sheet.internal.section;

import earward.sheet.content.Amount;
import earward.sheet.content.HeatRow;
import earward.sheet.content.SeamRow;
import earward.sheet.internal.page.Cell;
import earward.sheet.internal.page.Column;
import earward.sheet.internal.page.Piece;
import earward.sheet.internal.page.Style;
import earward.sheet.internal.page.Table;
import java.util.ArrayList;
import java.util.List;

/** What happens where blocks meet, and how warm parts get: figures to know, not to measure. */
final class LevelsSection {
  private static final float ROW = 20;
  private static final float FIGURE = 52;

  private LevelsSection() {}

  static List<Piece> seams(List<SeamRow> seams, Words words) {
    List<Piece> pieces = new ArrayList<>();
    if (seams.isEmpty()) {
      return pieces;
    }
    pieces.add(new Heading(words.text("section.seams"), false));
    pieces.add(Paragraph.body(words.text("seams.how")).kept());
    pieces.add(new Gap(6));
    Table table =
        new Table(
            List.of(
                Column.rest(words.text("seams.between")),
                Column.numbers(words.text("seams.level"), FIGURE),
                Column.numbers(words.text("seams.distortion"), FIGURE),
                Column.numbers(words.text("seams.backward"), FIGURE),
                Column.numbers(words.text("seams.onward"), FIGURE),
                Column.numbers(words.text("seams.loss"), FIGURE),
                Column.numbers(words.text("seams.headroom"), FIGURE)),
            ROW);
    for (SeamRow row : seams) {
      String between = words.text("seams.from-to", "from", row.from(), "to", row.to());
      table.row(
          List.of(
              Cell.stacked(Cell.text(between, Style.BODY), Cell.text(row.note(), Style.LABEL)),
              amount(row.level(), words),
              amount(row.distortion(), words),
              amount(row.backward(), words),
              amount(row.onward(), words),
              amount(row.loss(), words),
              amount(row.headroom(), words)));
    }
    pieces.addAll(table.pieces());
    return pieces;
  }

  static List<Piece> heat(List<HeatRow> heat, Words words) {
    List<Piece> pieces = new ArrayList<>();
    if (heat.isEmpty()) {
      return pieces;
    }
    pieces.add(new Heading(words.text("section.heat"), false));
    pieces.add(Paragraph.body(words.text("heat.how")).kept());
    pieces.add(new Gap(6));
    Table table =
        new Table(
            List.of(
                Column.rest(words.text("heat.part")),
                Column.numbers(words.text("heat.sink"), FIGURE),
                Column.numbers(words.text("heat.test"), FIGURE),
                Column.numbers(words.text("heat.worst"), FIGURE),
                Column.numbers(words.text("heat.surface"), FIGURE),
                Column.numbers(words.text("heat.junction"), FIGURE),
                Column.numbers(words.text("heat.limit"), 40),
                Column.words(words.text("heat.margin"), 62)),
            ROW);
    for (HeatRow row : heat) {
      table.row(
          List.of(
              Cell.text(row.part(), Style.STRONG),
              sink(row.heatSink(), words),
              amount(row.atTest(), words),
              amount(row.dissipation(), words),
              amount(row.surface(), words),
              amount(row.junction(), words),
              amount(row.limit(), words),
              new BarCell(row.junction().si(), row.limit().si())));
    }
    pieces.addAll(table.pieces());
    return pieces;
  }

  private static Cell sink(Amount heatSink, Words words) {
    return Double.isInfinite(heatSink.si())
        ? Cell.textToRight(words.text("heat.no-sink"), Style.BODY)
        : amount(heatSink, words);
  }

  private static Cell amount(Amount amount, Words words) {
    return new AmountCell(amount, words.numbers(), Style.BODY);
  }
}
