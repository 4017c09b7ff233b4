package earward.kit.file;

import earward.kit.design.Digest;
import earward.kit.design.KitDesign;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.HexFormat;

/**
 * Kit designs as files: human-readable JSON in UTF-8, whatever the locale. What the program does
 * not know is kept at every level; values keep the words in which they were written.
 */
public final class Designs {
  private Designs() {}

  /**
   * Reads a design file.
   *
   * @throws DesignFileException when it is missing, a folder, empty, broken, nested too deeply, of
   *     another schema, or says something impossible
   */
  public static DesignReading read(Path file) throws DesignFileException {
    return read(TextFiles.read(file), file.toString());
  }

  /**
   * Reads the text of a design.
   *
   * @param fileName for the sentences
   * @throws DesignFileException as above
   */
  public static DesignReading read(String text, String fileName) throws DesignFileException {
    Json tree = JsonReading.read(text, fileName);
    FileSource source = new FileSource(fileName);
    KitDesign design = DesignForm.read(MembersReader.of(tree, source, "the design"));
    return new DesignReading(design, source.notes(), source.places());
  }

  /** The design's text, as it stands in a file: the same design gives the same text. */
  public static String text(KitDesign design) {
    return JsonWriting.file(DesignForm.write(design));
  }

  /**
   * Writes a design: first beside the file, then moved over it, so that no failure leaves half a
   * file.
   *
   * @throws DesignFileException when the place cannot be written
   */
  public static void write(KitDesign design, Path file) throws DesignFileException {
    TextFiles.write(text(design), file);
  }

  /** The SHA-256 of the design's text. */
  public static Digest digest(KitDesign design) {
    try {
      MessageDigest sha = MessageDigest.getInstance("SHA-256");
      return new Digest(
          HexFormat.of().formatHex(sha.digest(text(design).getBytes(StandardCharsets.UTF_8))));
    } catch (NoSuchAlgorithmException e) {
      throw new IllegalStateException("every Java has SHA-256", e);
    }
  }
}
