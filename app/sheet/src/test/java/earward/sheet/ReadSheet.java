package earward.sheet;

import earward.sheet.content.SheetContent;
import java.awt.geom.Rectangle2D;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.util.ArrayList;
import java.util.List;
import org.apache.pdfbox.Loader;
import org.apache.pdfbox.contentstream.PDFGraphicsStreamEngine;
import org.apache.pdfbox.cos.COSName;
import org.apache.pdfbox.pdmodel.PDDocument;
import org.apache.pdfbox.pdmodel.PDPage;
import org.apache.pdfbox.pdmodel.graphics.image.PDImage;
import org.apache.pdfbox.text.PDFTextStripper;
import org.apache.pdfbox.text.TextPosition;

/** A written sheet, read back by another library than the one that wrote it. */
final class ReadSheet implements AutoCloseable {
  private final PDDocument document;

  private ReadSheet(PDDocument document) {
    this.document = document;
  }

  static byte[] bytes(SheetContent content) throws IOException {
    ByteArrayOutputStream out = new ByteArrayOutputStream();
    SheetWriter.write(content, out);
    return out.toByteArray();
  }

  static ReadSheet of(SheetContent content) throws IOException {
    return new ReadSheet(Loader.loadPDF(bytes(content)));
  }

  PDDocument document() {
    return document;
  }

  int pages() {
    return document.getNumberOfPages();
  }

  /** The text of a page, counted from 1, no-break spaces as spaces. */
  String text(int page) throws IOException {
    PDFTextStripper stripper = new PDFTextStripper();
    stripper.setSortByPosition(true);
    stripper.setStartPage(page);
    stripper.setEndPage(page);
    return stripper.getText(document).replace('\u00a0', ' ');
  }

  String text() throws IOException {
    StringBuilder all = new StringBuilder();
    for (int page = 1; page <= pages(); page++) {
      all.append(text(page));
    }
    return all.toString();
  }

  /** Every letter of a page. */
  List<TextPosition> letters(int page) throws IOException {
    List<TextPosition> letters = new ArrayList<>();
    PDFTextStripper stripper =
        new PDFTextStripper() {
          @Override
          protected void processTextPosition(TextPosition letter) {
            if (!letter.getUnicode().isBlank()) {
              letters.add(letter);
            }
          }
        };
    stripper.setStartPage(page);
    stripper.setEndPage(page);
    String unused = stripper.getText(document);
    return letters;
  }

  /** Letters whose middle lies inside another letter: text printed over text. */
  List<String> overprinted(int page) throws IOException {
    List<TextPosition> letters = letters(page);
    List<String> over = new ArrayList<>();
    for (int i = 0; i < letters.size(); i++) {
      TextPosition a = letters.get(i);
      for (int j = i + 1; j < letters.size(); j++) {
        TextPosition b = letters.get(j);
        double apart = Math.abs(a.getX() + a.getWidth() / 2 - b.getX() - b.getWidth() / 2);
        double least = (a.getWidth() + b.getWidth()) / 4;
        boolean sameLine = Math.abs(a.getY() - b.getY()) < 0.5 * a.getFontSizeInPt();
        if (sameLine && apart < least) {
          over.add(a.getUnicode() + " and " + b.getUnicode() + " at " + a.getX() + ", " + a.getY());
        }
      }
    }
    return over;
  }

  /** The box of every corner of every path of a page, in the paper's points. */
  Rectangle2D paths(int page) throws IOException {
    Corners corners = new Corners(document.getPage(page - 1));
    corners.processPage(document.getPage(page - 1));
    return corners.box;
  }

  /** The names of fonts that a page uses, as COS names with whether each is embedded. */
  List<String> fontsNotEmbedded() throws IOException {
    List<String> bare = new ArrayList<>();
    for (PDPage page : document.getPages()) {
      for (COSName name : page.getResources().getFontNames()) {
        var font = page.getResources().getFont(name);
        if (!font.isEmbedded()) {
          bare.add(font.getName());
        }
      }
    }
    return bare;
  }

  @Override
  public void close() throws IOException {
    document.close();
  }

  /** Follows paths and keeps the box of their corners. */
  private static final class Corners extends PDFGraphicsStreamEngine {
    private final Rectangle2D box = new Rectangle2D.Double();
    private java.awt.geom.Point2D.Float at = new java.awt.geom.Point2D.Float();

    Corners(PDPage page) {
      super(page);
    }

    private void add(double x, double y) {
      at = new java.awt.geom.Point2D.Float((float) x, (float) y);
      if (box.isEmpty()) {
        box.setRect(x, y, 1e-3, 1e-3);
      } else {
        box.add(x, y);
      }
    }

    @Override
    public void appendRectangle(
        java.awt.geom.Point2D p0,
        java.awt.geom.Point2D p1,
        java.awt.geom.Point2D p2,
        java.awt.geom.Point2D p3) {
      add(p0.getX(), p0.getY());
      add(p2.getX(), p2.getY());
    }

    @Override
    public void drawImage(PDImage image) {
      throw new AssertionError("the sheet holds a picture of dots");
    }

    @Override
    public void clip(int windingRule) {
      // a clip paints nothing
    }

    @Override
    public void moveTo(float x, float y) {
      add(x, y);
    }

    @Override
    public void lineTo(float x, float y) {
      add(x, y);
    }

    @Override
    public void curveTo(float x1, float y1, float x2, float y2, float x3, float y3) {
      add(x1, y1);
      add(x2, y2);
      add(x3, y3);
    }

    @Override
    public java.awt.geom.Point2D getCurrentPoint() {
      return at;
    }

    @Override
    public void closePath() {
      // adds no corner
    }

    @Override
    public void endPath() {
      // adds no corner
    }

    @Override
    public void strokePath() {
      // its corners were seen
    }

    @Override
    public void fillPath(int windingRule) {
      // its corners were seen
    }

    @Override
    public void fillAndStrokePath(int windingRule) {
      // its corners were seen
    }

    @Override
    public void shadingFill(COSName shadingName) {
      throw new AssertionError("the sheet has a shading");
    }
  }
}
