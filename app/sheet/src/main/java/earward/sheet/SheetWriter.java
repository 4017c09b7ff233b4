package earward.sheet;

import com.lowagie.text.Document;
import com.lowagie.text.DocumentException;
import com.lowagie.text.Rectangle;
import com.lowagie.text.pdf.PdfDestination;
import com.lowagie.text.pdf.PdfEncryption;
import com.lowagie.text.pdf.PdfName;
import com.lowagie.text.pdf.PdfOutline;
import com.lowagie.text.pdf.PdfString;
import com.lowagie.text.pdf.PdfWriter;
import earward.kit.design.SheetOptions.Paper;
import earward.sheet.content.SheetContent;
import earward.sheet.internal.page.Canvas;
import earward.sheet.internal.page.Flow;
import earward.sheet.internal.page.Flow.Placed;
import earward.sheet.internal.page.Sheet;
import earward.sheet.internal.page.Style;
import earward.sheet.internal.section.PageFrame;
import earward.sheet.internal.section.Sections;
import earward.sheet.internal.section.Words;
import earward.sheet.wording.Wording;
import java.awt.geom.Line2D;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.OutputStream;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.UUID;

/** Writes build sheets as PDF. The same content gives the same bytes. Safe for several threads. */
public final class SheetWriter {
  /** Enough to read the face for. */
  private static final String LETTERS = "Earward Ω";

  private SheetWriter() {}

  /**
   * Reads the faces and loads what writes PDF, so that the first sheet need not wait for them. May
   * run beside anything else.
   */
  public static void prepare() {
    Sheet sheet = Sheet.of(Paper.A4);
    try (Document document = new Document(new Rectangle(sheet.width(), sheet.height()))) {
      PdfWriter writer = PdfWriter.getInstance(document, OutputStream.nullOutputStream());
      writer.setFullCompression();
      document.open();
      Canvas canvas = new Canvas(writer.getDirectContent(), sheet.height());
      canvas.text(LETTERS, Sheet.SIDE, Sheet.TOP, Style.BODY);
      canvas.text(LETTERS, Sheet.SIDE, Sheet.TOP, Style.STRONG);
      canvas.drawing(0, 0, 10, 10, graphics -> graphics.draw(new Line2D.Float(0, 0, 10, 10)));
    } catch (DocumentException e) {
      throw new IllegalStateException("no sheet can be made", e);
    }
  }

  /**
   * Writes one sheet in the program's own wording. Nothing is written when it cannot be made.
   *
   * @param content all that it says
   * @param out is left open
   * @throws IOException when it cannot be written
   */
  public static void write(SheetContent content, OutputStream out) throws IOException {
    write(content, Wording.of(content.language()), out);
  }

  /**
   * Writes one sheet. Nothing is written when it cannot be made.
   *
   * @param content all that it says
   * @param wording in which it was made
   * @param out is left open
   * @throws IOException when it cannot be written
   */
  public static void write(SheetContent content, Wording wording, OutputStream out)
      throws IOException {
    ByteArrayOutputStream whole = new ByteArrayOutputStream();
    try {
      make(content, Words.of(wording), whole);
    } catch (DocumentException e) {
      throw new IllegalStateException("the sheet of " + content.title().name() + " failed", e);
    }
    whole.writeTo(out);
  }

  private static void make(SheetContent content, Words words, OutputStream out)
      throws DocumentException {
    Sheet sheet = Sheet.of(content.paper());
    List<List<Placed>> pages = Flow.over(sheet, Sections.of(content, words));
    Document document = new Document(new Rectangle(sheet.width(), sheet.height()), 0, 0, 0, 0);
    PdfWriter writer = PdfWriter.getInstance(document, out);
    writer.setFullCompression();
    describe(document, writer, content, words);
    document.open();
    pinWhatVaries(writer, content);
    String language = words.wording().locale().toLanguageTag();
    writer.getExtraCatalog().put(PdfName.LANG, new PdfString(language));
    PageFrame frame = new PageFrame(content, sheet, words);
    for (int i = 0; i < pages.size(); i++) {
      if (i > 0) {
        document.newPage();
      }
      writer.setPageEmpty(false);
      Canvas canvas = new Canvas(writer.getDirectContent(), sheet.height());
      for (Placed placed : pages.get(i)) {
        bookmark(writer, sheet, placed);
        placed.piece().draw(canvas, Sheet.SIDE, placed.y(), sheet.contentWidth());
      }
      frame.draw(canvas, i + 1, pages.size());
    }
    document.close();
  }

  private static void describe(
      Document document, PdfWriter writer, SheetContent content, Words words) {
    document.addTitle(words.text("document.title", "kit", content.title().name()));
    document.addSubject(
        words.text(
            "document.subject",
            "revision",
            content.title().revision(),
            "digest",
            content.title().digest()));
    if (!content.title().clubName().isEmpty()) {
      document.addAuthor(content.title().clubName());
    }
    document.addCreator("Earward");
    writer.setViewerPreferences(PdfWriter.PageModeUseOutlines | PdfWriter.DisplayDocTitle);
  }

  /** Dates are left out, and the file's identity follows from the design and the paper. */
  private static void pinWhatVaries(PdfWriter writer, SheetContent content) {
    writer.getInfo().remove(PdfName.CREATIONDATE);
    writer.getInfo().remove(PdfName.MODDATE);
    String identity = content.title() + content.paper().key() + content.language();
    String hex =
        UUID.nameUUIDFromBytes(identity.getBytes(StandardCharsets.UTF_8))
            .toString()
            .replace("-", "");
    byte[] id = new java.math.BigInteger(hex, 16).toByteArray();
    writer.getInfo().put(PdfName.FILEID, PdfEncryption.createInfoId(id, id));
  }

  private static void bookmark(PdfWriter writer, Sheet sheet, Placed placed) {
    placed
        .piece()
        .bookmark()
        .ifPresent(
            title -> {
              float top = sheet.height() - placed.y() + 6;
              PdfDestination there = new PdfDestination(PdfDestination.FITH, top);
              PdfOutline root = writer.getDirectContent().getRootOutline();
              var unused = new PdfOutline(root, there, title);
            });
  }
}
