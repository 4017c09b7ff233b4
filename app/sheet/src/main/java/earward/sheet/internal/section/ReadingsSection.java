package earward.sheet.internal.section;

import earward.sheet.content.Amount;
import earward.sheet.content.CurrentRow;
import earward.sheet.content.LimitRow;
import earward.sheet.content.SheetContent;
import earward.sheet.content.TestPointRow;
import earward.sheet.internal.page.Cell;
import earward.sheet.internal.page.Column;
import earward.sheet.internal.page.Piece;
import earward.sheet.internal.page.Style;
import earward.sheet.internal.page.Table;
import java.util.ArrayList;
import java.util.List;

/** What the builder measures: first the supply's current, then every test point. */
final class ReadingsSection {
  private static final float PEN_ROW = 23;
  private static final float EXPECTED = 50;
  private static final float WRITTEN = 50;

  private ReadingsSection() {}

  static List<Piece> firstPower(SheetContent content, Words words) {
    List<Piece> pieces = new ArrayList<>();
    // stages have their own first power; what is left then is the last check
    boolean staged = !content.building().stages().isEmpty();
    String section = staged ? "last-check" : "first-power";
    pieces.add(new Heading(words.text("section." + section), false));
    for (int step = 1; step <= (staged ? 3 : 5); step++) {
      pieces.add(new StepPiece(words.text(section + "." + step)));
    }
    if (content.currents().isEmpty()) {
      return pieces;
    }
    pieces.add(new Gap(8));
    Table table =
        new Table(
            List.of(
                Column.rest(words.text("currents.supply")),
                Column.numbers(words.text("currents.rest"), EXPECTED),
                Column.words(words.text("readings.yours"), WRITTEN),
                Column.numbers(words.text("currents.test"), EXPECTED),
                Column.words(words.text("readings.yours"), WRITTEN),
                Column.numbers(words.text("currents.full"), EXPECTED),
                Column.numbers(words.text("currents.hottest"), EXPECTED),
                Column.numbers(words.text("currents.life"), 46)),
            PEN_ROW);
    for (CurrentRow row : content.currents()) {
      table.row(
          List.of(
              Cell.text(row.supply(), Style.STRONG),
              amount(row.atRest(), words),
              reading(row.atRest(), words),
              amount(row.atTest(), words),
              reading(row.atTest(), words),
              amount(row.atFullOutput(), words),
              amount(row.hottest(), words),
              amount(row.life(), words)));
    }
    pieces.addAll(table.pieces());
    return pieces;
  }

  static List<Piece> testPoints(SheetContent content, Words words) {
    List<Piece> pieces = new ArrayList<>();
    if (content.testPoints().isEmpty()) {
      return pieces;
    }
    pieces.add(new Heading(words.text("section.test-points"), false));
    content.method().forEach(text -> pieces.add(Paragraph.body(text).kept()));
    pieces.add(new Gap(6));
    Table table =
        new Table(
            List.of(
                Column.words(words.text("readings.point"), 26),
                Column.rest(words.text("readings.where")),
                Column.numbers(words.text("readings.dc-rest"), EXPECTED),
                Column.words(words.text("readings.yours"), WRITTEN),
                Column.numbers(words.text("readings.dc-test"), EXPECTED),
                Column.words(words.text("readings.yours"), WRITTEN),
                Column.numbers(words.text("readings.audio"), EXPECTED),
                Column.words(words.text("readings.yours"), WRITTEN)),
            PEN_ROW);
    for (TestPointRow row : content.testPoints()) {
      table.row(
          List.of(
              Cell.text(row.flag(), Style.STRONG),
              where(row, words),
              atRest(row, words),
              reading(row.dcAtRest(), words),
              amount(row.dcAtTest(), words),
              reading(row.dcAtTest(), words),
              amount(row.audio(), words),
              reading(row.audio(), words)));
    }
    pieces.addAll(table.pieces());
    pieces.add(Paragraph.note(words.text("readings.note")));
    return pieces;
  }

  private static Cell where(TestPointRow row, Words words) {
    Cell where = Cell.text(row.where(), Style.BODY);
    if (!row.carrier().known() || row.carrier().si() < 1e-3) {
      return where;
    }
    String carrier = words.numbers().write(row.carrier()).whole();
    String text = words.text("readings.carrier", "carrier", carrier);
    return Cell.stacked(where, Cell.text(text, Style.LABEL));
  }

  /** The expected value, its limits below it, and how these move with the supply. */
  private static Cell atRest(TestPointRow row, Words words) {
    Cell expected = amount(row.dcAtRest(), words);
    if (row.restLimits().isEmpty()) {
      return expected;
    }
    LimitRow limits = row.restLimits().get();
    Cell between =
        Cell.textToRight(
            words
                .numbers()
                .between(
                    limits.low().si(),
                    limits.high().si(),
                    words.text("readings.limits", "low", "{low}", "high", "{high}")),
            Style.LABEL);
    if (!limits.perSupplyVolt().known()) {
      return Cell.stacked(expected, between);
    }
    String move = words.numbers().text(limits.perSupplyVolt().si(), limits.perSupplyVolt().unit());
    return Cell.stacked(
        expected,
        Cell.stacked(
            between, Cell.textToRight(words.text("readings.per-volt", "move", move), Style.LABEL)));
  }

  private static Cell amount(Amount amount, Words words) {
    return new AmountCell(amount, words.numbers(), Style.STRONG);
  }

  /** Where there is nothing to expect there is nothing to write. */
  private static Cell reading(Amount expected, Words words) {
    return expected.known() ? new ReadingCell(unitToWrite(expected, words)) : Cell.empty();
  }

  /** No meter of a builder reads microvolts. */
  private static String unitToWrite(Amount expected, Words words) {
    String unit = words.numbers().write(expected).unit();
    return unit.equals("µV") ? "mV" : unit;
  }
}
