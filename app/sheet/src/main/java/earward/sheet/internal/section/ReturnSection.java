package earward.sheet.internal.section;

import earward.sheet.content.Amount;
import earward.sheet.content.SheetContent;
import earward.sheet.content.TestPointRow;
import earward.sheet.internal.page.Cell;
import earward.sheet.internal.page.Column;
import earward.sheet.internal.page.Piece;
import earward.sheet.internal.page.Style;
import earward.sheet.internal.page.Table;
import java.util.ArrayList;
import java.util.List;

/** The page that goes back to whoever made the kit: which kit it is, and what it reads. */
final class ReturnSection {
  private static final float PEN_ROW = 22;
  private static final float FIELD = 84;

  private ReturnSection() {}

  static List<Piece> of(SheetContent content, Words words) {
    List<Piece> pieces = new ArrayList<>();
    if (content.testPoints().isEmpty() || content.stopped()) {
      return pieces;
    }
    pieces.add(new Heading(words.text("section.return"), true));
    String how =
        words.text(
            "return.how",
            "kit",
            content.title().name(),
            "revision",
            content.title().revision(),
            "digest",
            content.title().digest());
    pieces.add(Paragraph.body(how).kept());
    pieces.add(new Gap(8));
    pieces.addAll(which(words));
    pieces.add(new Gap(8));
    pieces.addAll(readings(content, words));
    return pieces;
  }

  private static List<Piece> which(Words words) {
    Table table =
        new Table(
            List.of(
                Column.words("", 110),
                Column.words("", 140),
                Column.words("", 90),
                Column.rest("")),
            PEN_ROW);
    table.row(
        List.of(
            label("return.lot", words),
            field("lot", "return.lot", words),
            label("return.kit", words),
            field("kit", "return.kit", words)));
    table.row(
        List.of(
            label("fill-in.meter", words),
            field("meter", "fill-in.meter", words),
            label("fill-in.date", words),
            field("date", "fill-in.date", words)));
    return table.pieces();
  }

  private static Cell label(String key, Words words) {
    return Cell.text(words.text(key), Style.BODY);
  }

  private static Cell field(String name, String key, Words words) {
    return new FieldCell(name, words.text(key), "");
  }

  private static List<Piece> readings(SheetContent content, Words words) {
    Table table =
        new Table(
            List.of(
                Column.words(words.text("readings.point"), 30),
                Column.rest(words.text("readings.where")),
                Column.words(words.text("readings.dc-rest"), FIELD),
                Column.words(words.text("readings.dc-test"), FIELD),
                Column.words(words.text("readings.audio"), FIELD)),
            PEN_ROW);
    for (TestPointRow row : content.testPoints()) {
      table.row(
          List.of(
              Cell.text(row.flag(), Style.STRONG),
              Cell.text(row.where(), Style.BODY),
              reading(row.flag() + ".dc-rest", "readings.dc-rest", row, row.dcAtRest(), words),
              reading(row.flag() + ".dc-test", "readings.dc-test", row, row.dcAtTest(), words),
              reading(row.flag() + ".audio", "readings.audio", row, row.audio(), words)));
    }
    return table.pieces();
  }

  private static Cell reading(
      String name, String key, TestPointRow row, Amount expected, Words words) {
    if (!expected.known()) {
      return Cell.empty();
    }
    String unit = words.numbers().write(expected).unit();
    // a form field's name has no point in it: that would make it a child of another
    return new FieldCell(
        name.replace('.', '-'),
        row.flag() + ": " + words.text(key),
        unit.equals("µV") ? "mV" : unit);
  }
}
