package earward.sheet.internal.page;

import com.lowagie.text.pdf.BaseFont;
import com.lowagie.text.pdf.FontMapper;
import com.lowagie.text.pdf.PdfGraphics2D;
import com.lowagie.text.pdf.PdfTemplate;
import earward.sheet.internal.page.Style.Weight;
import java.awt.Font;
import java.awt.Graphics2D;

/** Java2D drawings on a PDF, with the sheet's own letters. */
final class Drawings {
  private Drawings() {}

  static Graphics2D graphics(PdfTemplate template, float width, float height) {
    return new PdfGraphics2D(template, width, height, new SheetFaces(), false, false, 0);
  }

  /** Every font of a drawing becomes the sheet's own face of the same weight. */
  private static final class SheetFaces implements FontMapper {
    @Override
    public BaseFont awtToPdf(Font font) {
      return Typeface.first(font.isBold() ? Weight.BOLD : Weight.REGULAR);
    }

    @Override
    public Font pdfToAwt(BaseFont font, int size) {
      return Typeface.forDrawings().deriveFont((float) size);
    }
  }
}
