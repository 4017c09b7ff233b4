package earward.sheet.internal.section;

import earward.sheet.content.PathDrawing;
import earward.sheet.content.SheetContent;
import earward.sheet.internal.page.Piece;
import java.util.ArrayList;
import java.util.List;

/** All that the sheet says, as pieces in the order of the pages. */
public final class Sections {
  private Sections() {}

  /** The pieces of a sheet. */
  public static List<Piece> of(SheetContent content, Words words) {
    List<Piece> pieces = new ArrayList<>(CoverSection.of(content, words));
    pieces.addAll(drawing(content.drawing(), words));
    pieces.addAll(PartsSection.pinOuts(content.pinOuts(), words));
    pieces.addAll(PartsSection.parts(content.parts(), words));
    pieces.addAll(ReadingsSection.firstPower(content, words));
    pieces.addAll(ReadingsSection.testPoints(content, words));
    pieces.addAll(LevelsSection.seams(content.seams(), words));
    pieces.addAll(LevelsSection.heat(content.heat(), words));
    pieces.addAll(CoverSection.findings(content.findings(), words));
    return pieces;
  }

  private static List<Piece> drawing(PathDrawing drawing, Words words) {
    List<Piece> pieces = new ArrayList<>();
    if (drawing.rows().isEmpty()) {
      return pieces;
    }
    pieces.add(new Heading(words.text("section.drawing"), true));
    drawing.rows().forEach(row -> pieces.add(new DrawingPiece(row)));
    pieces.add(Paragraph.note(words.text("drawing.note")));
    return pieces;
  }
}
