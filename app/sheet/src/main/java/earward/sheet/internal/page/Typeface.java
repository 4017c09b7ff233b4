package earward.sheet.internal.page;

import com.lowagie.text.DocumentException;
import com.lowagie.text.pdf.BaseFont;
import earward.sheet.internal.page.Style.Weight;
import java.awt.GraphicsEnvironment;
import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.security.SecureRandom;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;

/**
 * The letters of the sheet: Liberation Sans, and DejaVu Sans for what it lacks. A character that
 * neither has is shown as the replacement character, never dropped.
 *
 * <p>The faces are read once and shared by all documents and threads: a face is not changed by its
 * use, each document keeps its own list of used letters.
 */
public final class Typeface {
  private static final char REPLACEMENT = '\ufffd';
  private static final char NO_BREAK_SPACE = '\u00a0';
  private static final char NARROW_NO_BREAK_SPACE = '\u202f';
  private static final int THOUSANDTHS = 1000;

  /**
   * One stretch of text that a single face can set.
   *
   * @param face with which
   * @param text what
   */
  public record Run(BaseFont face, String text) {}

  private static final class Regular {
    static final BaseFont FIRST = face("/liberation/LiberationSans-Regular.ttf");
    static final BaseFont SECOND = face("/net/sf/jasperreports/fonts/dejavu/DejaVuSans.ttf");
  }

  private static final class Bold {
    static final BaseFont FIRST = face("/liberation/LiberationSans-Bold.ttf");
    static final BaseFont SECOND = face("/net/sf/jasperreports/fonts/dejavu/DejaVuSans-Bold.ttf");
  }

  private Typeface() {}

  /** The text in stretches, each in the first face that has its letters. */
  public static List<Run> runs(String text, Weight weight) {
    List<Run> runs = new ArrayList<>();
    StringBuilder pending = new StringBuilder();
    BaseFont current = first(weight);
    String clean = clean(text);
    for (int i = 0; i < clean.length(); ) {
      int letter = clean.codePointAt(i);
      i += Character.charCount(letter);
      BaseFont face = faceOf(letter, weight);
      if (!face.equals(current) && pending.length() > 0) {
        runs.add(new Run(current, pending.toString()));
        pending.setLength(0);
      }
      current = face;
      pending.appendCodePoint(face.charExists(letter) ? letter : REPLACEMENT);
    }
    if (pending.length() > 0) {
      runs.add(new Run(current, pending.toString()));
    }
    return runs;
  }

  /** Width in points. */
  public static float width(String text, Style style) {
    float width = 0;
    for (Run run : runs(text, style.weight())) {
      width += run.face().getWidth(run.text()) * style.size() / THOUSANDTHS;
    }
    return width;
  }

  /** The face in which most of a text is set. */
  public static BaseFont first(Weight weight) {
    return weight == Weight.BOLD ? Bold.FIRST : Regular.FIRST;
  }

  /**
   * The face of what is typed into a form field: Helvetica, which every reader of PDF brings itself
   * (ISO 32000-1, 9.6.2.2) and which no sheet can hold letters of before they are typed.
   */
  static BaseFont forFields() {
    return Fields.FACE;
  }

  private static final class Fields {
    static final BaseFont FACE = standard();

    private static BaseFont standard() {
      try {
        return BaseFont.createFont(BaseFont.HELVETICA, BaseFont.WINANSI, BaseFont.NOT_EMBEDDED);
      } catch (IOException | DocumentException e) {
        throw new IllegalStateException("the font of form fields cannot be used", e);
      }
    }
  }

  private static BaseFont faceOf(int letter, Weight weight) {
    BaseFont first = first(weight);
    if (first.charExists(letter)) {
      return first;
    }
    return weight == Weight.BOLD ? Bold.SECOND : Regular.SECOND;
  }

  /** Control characters become spaces, and the narrow space the one that all faces have. */
  private static String clean(String text) {
    StringBuilder clean = new StringBuilder(text.length());
    text.codePoints()
        .map(c -> c == NARROW_NO_BREAK_SPACE ? NO_BREAK_SPACE : c)
        .map(c -> Character.isISOControl(c) ? ' ' : c)
        .forEach(clean::appendCodePoint);
    return clean.toString();
  }

  /** The bytes of one of the shipped fonts. */
  static byte[] bytes(String resource) {
    try (InputStream in = Typeface.class.getResourceAsStream(resource)) {
      if (in == null) {
        throw new IllegalStateException("the font " + resource + " is not in the program");
      }
      return in.readAllBytes();
    } catch (IOException e) {
      throw new UncheckedIOException("the font " + resource + " cannot be read", e);
    }
  }

  private static BaseFont face(String resource) {
    String name = resource.substring(resource.lastIndexOf('/') + 1);
    try {
      BaseFont face =
          BaseFont.createFont(
              name, BaseFont.IDENTITY_H, BaseFont.EMBEDDED, false, bytes(resource), null);
      face.setSecureRandom(new Constant());
      return face;
    } catch (IOException | DocumentException e) {
      throw new IllegalStateException("the font " + name + " cannot be used", e);
    }
  }

  /**
   * The face for drawings, whose metrics are those of the faces in the PDF, the bold one among
   * them: made bold, it becomes the shipped bold face and not a thickened regular one.
   */
  public static java.awt.Font forDrawings() {
    return Drawn.REGULAR;
  }

  private static final class Drawn {
    static final java.awt.Font REGULAR = registered();

    private static java.awt.Font registered() {
      java.awt.Font regular = drawn("/liberation/LiberationSans-Regular.ttf");
      java.awt.Font bold = drawn("/liberation/LiberationSans-Bold.ttf");
      GraphicsEnvironment known = GraphicsEnvironment.getLocalGraphicsEnvironment();
      // where the machine has the family itself, its own faces hold; their widths are the same
      known.registerFont(regular);
      known.registerFont(bold);
      return new java.awt.Font(regular.getFamily(Locale.ROOT), java.awt.Font.PLAIN, 1);
    }

    private static java.awt.Font drawn(String resource) {
      try (InputStream in = new ByteArrayInputStream(bytes(resource))) {
        return java.awt.Font.createFont(java.awt.Font.TRUETYPE_FONT, in);
      } catch (IOException | java.awt.FontFormatException e) {
        throw new IllegalStateException("the font " + resource + " cannot be used", e);
      }
    }
  }

  /**
   * Gives the same number always: the prefix of an embedded face is then the same in every
   * document, whatever was made before or beside it.
   */
  private static final class Constant extends SecureRandom {
    private static final long serialVersionUID = 1;

    @Override
    public double nextDouble() {
      return 0.1;
    }
  }
}
