package earward.sheet.internal.section;

import earward.sheet.content.Amount;
import earward.sheet.content.Building;
import earward.sheet.content.CautionRow;
import earward.sheet.content.ShoppingRow;
import earward.sheet.content.StageRow;
import earward.sheet.content.WireRow;
import earward.sheet.internal.page.Cell;
import earward.sheet.internal.page.Column;
import earward.sheet.internal.page.Piece;
import earward.sheet.internal.page.Style;
import earward.sheet.internal.page.Table;
import java.util.ArrayList;
import java.util.List;

/** How the kit is built, stage by stage, what is wired to it, and what is bought for it. */
final class StagesSection {
  private static final float PEN_ROW = 23;
  private static final float LIST_ROW = 16;

  /** A drawing of this width or more, in points, takes the whole page. */
  private static final double MOST_BESIDE = 300;

  private StagesSection() {}

  /** The pieces of each stage. */
  static List<List<Piece>> stages(Building building, Words words) {
    List<List<Piece>> stages = new ArrayList<>();
    for (StageRow stage : building.stages()) {
      stages.add(stage(stage, words));
    }
    return stages;
  }

  private static List<Piece> stage(StageRow stage, Words words) {
    List<Piece> pieces = new ArrayList<>();
    String number = Integer.toString(stage.number());
    String title = words.text("stage.title", "number", number, "blocks", stage.title());
    pieces.add(new Heading(title, false));
    if (stage.number() == 1) {
      pieces.add(Paragraph.body(words.text("stage.how")).kept());
      pieces.add(new Gap(6));
    }
    parts(stage, words, pieces);
    cautions(stage.cautions(), words, pieces);
    steps("stage.connect", stage.connect(), words, pieces);
    steps("stage.unpowered", stage.unpowered(), words, pieces);
    steps("stage.power", stage.power(), words, pieces);
    points(stage, words, pieces);
    steps("stage.listen", stage.listen(), words, pieces);
    return pieces;
  }

  /** Drawing and parts, beside each other where the drawing is no wider than half the page. */
  private static void parts(StageRow stage, Words words, List<Piece> into) {
    List<Piece> drawn = new ArrayList<>();
    stage.drawing().rows().forEach(row -> drawn.add(new DrawingPiece(row)));
    List<Piece> listed = new ArrayList<>();
    if (!stage.parts().isEmpty()) {
      listed.add(new Label(words.text("stage.fit")));
    }
    if (drawn.size() == 1 && stage.drawing().rows().get(0).widthPoints() < MOST_BESIDE) {
      if (!stage.parts().isEmpty()) {
        listed.add(new StagePartsPiece(stage.parts(), 1));
      }
      into.add(new SideBySide(new Stack(drawn), new Stack(listed), 0));
      return;
    }
    into.addAll(drawn);
    into.addAll(listed);
    if (!stage.parts().isEmpty()) {
      into.add(new StagePartsPiece(stage.parts(), 2));
    }
  }

  private static void cautions(List<CautionRow> cautions, Words words, List<Piece> into) {
    for (int i = 0; i < cautions.size(); i += 2) {
      Piece right =
          i + 1 < cautions.size() ? new CautionPiece(cautions.get(i + 1), words) : new Gap(0);
      into.add(new SideBySide(new CautionPiece(cautions.get(i), words), right, 5));
    }
  }

  private static void steps(String key, List<String> steps, Words words, List<Piece> into) {
    if (!steps.isEmpty()) {
      into.add(new Label(words.text(key)));
      steps.forEach(step -> into.add(new StepPiece(step)));
    }
  }

  private static void points(StageRow stage, Words words, List<Piece> into) {
    if (stage.points().isEmpty()) {
      return;
    }
    into.add(new Label(words.text("stage.readings")));
    into.add(new Paragraph(stage.method(), Style.BODY, 1, 0, true));
    List<Column> columns = new ArrayList<>();
    columns.add(Column.words(words.text("readings.point"), 30));
    columns.add(Column.rest(words.text("readings.where")));
    columns.add(Column.numbers(words.text("stage.rest"), 62));
    columns.add(Column.words(words.text("readings.yours"), 62));
    boolean cell = stage.usesCell();
    if (cell) {
      columns.add(Column.numbers(words.text("stage.injected"), 62));
      columns.add(Column.words(words.text("readings.yours"), 62));
    }
    Table table = new Table(columns, PEN_ROW);
    for (StageRow.Point point : stage.points()) {
      List<Cell> cells = new ArrayList<>();
      cells.add(Cell.text(point.flag(), Style.STRONG));
      cells.add(Cell.text(point.where(), Style.BODY));
      cells.add(new AmountCell(point.atRest(), words.numbers(), Style.STRONG));
      cells.add(reading(point.atRest(), words));
      if (cell) {
        boolean moves = point.injected().known();
        cells.add(
            moves
                ? new AmountCell(point.injected(), words.numbers(), Style.STRONG)
                : Cell.textToRight(words.text("stage.same"), Style.NOTE));
        cells.add(moves ? reading(point.injected(), words) : Cell.empty());
      }
      table.row(cells);
    }
    into.addAll(table.pieces());
  }

  private static Cell reading(Amount expected, Words words) {
    if (!expected.known()) {
      return Cell.empty();
    }
    String unit = words.numbers().write(expected).unit();
    return new ReadingCell(unit.equals("µV") ? "mV" : unit);
  }

  /** The wires off the board. */
  static List<Piece> wires(List<WireRow> wires, Words words) {
    List<Piece> pieces = new ArrayList<>();
    if (wires.isEmpty()) {
      return pieces;
    }
    pieces.add(new Heading(words.text("section.wires"), false));
    pieces.add(Paragraph.body(words.text("wires.how")).kept());
    pieces.add(new Gap(4));
    Table table =
        new Table(
            List.of(
                Column.words(words.text("parts.fitted"), 34),
                Column.words(words.text("wires.from"), 150),
                Column.rest(words.text("wires.to"))),
            LIST_ROW);
    for (WireRow wire : wires) {
      table.row(
          List.of(
              new TickCell(),
              Cell.text(wire.from(), Style.STRONG),
              Cell.text(wire.to(), Style.BODY)));
    }
    pieces.addAll(table.pieces());
    return pieces;
  }

  /** What is bought. */
  static List<Piece> shopping(Building building, Words words) {
    List<Piece> pieces = new ArrayList<>();
    if (building.shopping().isEmpty()) {
      return pieces;
    }
    pieces.add(new Heading(words.text("section.shopping"), false));
    boolean one = building.kits() == 1;
    String how = one ? "shopping.how-one" : "shopping.how";
    pieces.add(Paragraph.body(words.text(how)).kept());
    pieces.add(new Gap(4));
    List<Column> columns =
        new ArrayList<>(
            List.of(
                Column.words("", 16),
                Column.words(words.text("shopping.what"), 150),
                Column.words(words.text("shopping.rating"), 130),
                Column.rest(words.text("shopping.parts")),
                Column.numbers(words.text("shopping.one"), 40)));
    if (!one) {
      String kits = Integer.toString(building.kits());
      columns.add(Column.numbers(words.text("shopping.kits", "kits", kits), 64));
    }
    Table table = new Table(columns, LIST_ROW);
    for (ShoppingRow row : building.shopping()) {
      List<Cell> cells =
          new ArrayList<>(
              List.of(
                  new TickCell(),
                  Cell.text(row.what(), Style.STRONG),
                  Cell.text(row.rating(), Style.NOTE),
                  Cell.text(String.join(", ", row.references()), Style.NOTE),
                  Cell.textToRight(Integer.toString(row.perKit()), Style.STRONG)));
      if (!one) {
        String needed = Integer.toString(row.forKits(building.kits()));
        cells.add(Cell.textToRight(needed, Style.STRONG));
      }
      table.row(cells);
    }
    pieces.addAll(table.pieces());
    return pieces;
  }
}
