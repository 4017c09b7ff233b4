package earward.sheet.internal.section;

import earward.sheet.content.PathDrawing;
import earward.sheet.content.SheetContent;
import earward.sheet.internal.page.Piece;
import java.util.ArrayList;
import java.util.List;

/** All that the sheet says, as pieces in the order of the pages. */
public final class Sections {
  private static final int NOTE_LINES = 8;

  private Sections() {}

  /** The pieces of a sheet. */
  public static List<Piece> of(SheetContent content, Words words) {
    List<Piece> pieces = new ArrayList<>(CoverSection.of(content, words));
    pieces.addAll(drawing(content.drawing(), words));
    pieces.addAll(together(PartsSection.pinOuts(content.pinOuts(), words)));
    pieces.addAll(PartsSection.parts(content.parts(), words));
    pieces.addAll(together(StagesSection.wires(content.building().wires(), words)));
    StagesSection.stages(content.building(), words).forEach(s -> pieces.addAll(together(s)));
    pieces.addAll(together(ReadingsSection.firstPower(content, words)));
    pieces.addAll(together(ReadingsSection.testPoints(content, words)));
    pieces.addAll(together(LevelsSection.heat(content.heat(), words)));
    pieces.addAll(together(LevelsSection.seams(content.seams(), words)));
    pieces.addAll(together(StagesSection.shopping(content.building(), words)));
    pieces.addAll(CoverSection.findings(content.findings(), words));
    pieces.addAll(
        together(
            List.of(new Heading(words.text("section.notes"), false), new NotesPiece(NOTE_LINES))));
    pieces.addAll(ReturnSection.of(content, words));
    return pieces;
  }

  /** The pieces of a section that stands on one page where one page can hold it. */
  private static List<Piece> together(List<Piece> section) {
    List<Piece> kept = new ArrayList<>(section);
    if (!kept.isEmpty() && kept.get(0) instanceof Heading heading) {
      kept.set(0, heading.keepingTogether(kept.size() - 1));
    }
    return kept;
  }

  private static List<Piece> drawing(PathDrawing drawing, Words words) {
    List<Piece> pieces = new ArrayList<>();
    if (drawing.rows().isEmpty()) {
      return pieces;
    }
    pieces.add(new Heading(words.text("section.drawing"), false));
    pieces.add(new Gap(5));
    drawing.rows().forEach(row -> pieces.add(new DrawingPiece(row)));
    pieces.add(Paragraph.note(words.text("drawing.note")));
    return together(pieces);
  }
}
