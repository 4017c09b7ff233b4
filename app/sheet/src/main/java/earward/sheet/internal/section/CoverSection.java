package earward.sheet.internal.section;

import earward.block.check.Severity;
import earward.sheet.content.CautionRow;
import earward.sheet.content.FindingRow;
import earward.sheet.content.SheetContent;
import earward.sheet.internal.page.Piece;
import java.util.ArrayList;
import java.util.List;

/** The first page: what the kit is and does, what would stop it, and what to beware of. */
final class CoverSection {
  private CoverSection() {}

  static List<Piece> of(SheetContent content, Words words) {
    List<Piece> pieces = new ArrayList<>();
    pieces.add(new TitlePiece(content.title(), content.introduction(), words));
    if (content.stopped()) {
      pieces.add(new Heading(words.text("section.stop"), false));
      content.findings().stream()
          .filter(finding -> finding.severity() == Severity.STOP)
          .map(finding -> (Piece) new FindingPiece(finding, words))
          .forEach(pieces::add);
    }
    pieces.add(
        new SideBySide(
            new KeyFigureList(words.text("cover.conditions"), content.conditions(), words),
            new KeyFigureList(words.text("cover.figures"), content.keyFigures(), words),
            10));
    pieces.add(
        new FillIn(
            List.of(
                words.text("fill-in.builder"),
                words.text("fill-in.serial"),
                words.text("fill-in.meter"),
                words.text("fill-in.date"))));
    pieces.addAll(cautions(content.cautions(), words));
    return pieces;
  }

  private static List<Piece> cautions(List<CautionRow> cautions, Words words) {
    List<Piece> pieces = new ArrayList<>();
    if (cautions.isEmpty()) {
      return pieces;
    }
    pieces.add(new Heading(words.text("section.cautions"), false));
    // first, where it cannot be left alone on the next page
    pieces.add(Paragraph.note(words.text("cautions.defer")));
    for (int i = 0; i < cautions.size(); i += 2) {
      Piece right =
          i + 1 < cautions.size() ? new CautionPiece(cautions.get(i + 1), words) : new Gap(0);
      pieces.add(new SideBySide(new CautionPiece(cautions.get(i), words), right, 3));
    }
    return pieces;
  }

  /** The findings at the end of the sheet, all of them. */
  static List<Piece> findings(List<FindingRow> findings, Words words) {
    List<Piece> pieces = new ArrayList<>();
    pieces.add(new Heading(words.text("section.findings"), false));
    String legend = findings.isEmpty() ? "findings.none" : "findings.legend";
    pieces.add(Paragraph.wide(words.text(legend)));
    findings.forEach(finding -> pieces.add(new FindingPiece(finding, words)));
    return pieces;
  }
}
