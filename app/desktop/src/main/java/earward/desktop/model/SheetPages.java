package earward.desktop.model;

import earward.kit.review.ReviewedKit;
import earward.kit.stage.BuildStages;
import earward.sheet.SheetWriter;
import earward.sheet.Sheets;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.nio.file.AtomicMoveNotSupportedException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.util.UUID;

/** The build sheet of a reviewed kit as PDF. */
public final class SheetPages {
  private SheetPages() {}

  /** The whole file. */
  public static byte[] pdf(ReviewedKit kit) throws IOException {
    ByteArrayOutputStream out = new ByteArrayOutputStream();
    SheetWriter.write(Sheets.of(kit, BuildStages.solve(kit.solved().assembly())), out);
    return out.toByteArray();
  }

  /**
   * Writes it: first beside the file, then moved over it, so that no failure leaves half a file.
   */
  public static void write(ReviewedKit kit, Path to) throws IOException {
    write(pdf(kit), to);
  }

  /** Writes bytes the same way. */
  public static void write(byte[] bytes, Path to) throws IOException {
    if (Files.isDirectory(to)) {
      throw new IOException(Words.of("export.folder"));
    }
    Path beside = to.resolveSibling(".earward-" + UUID.randomUUID() + ".part");
    try {
      Files.write(beside, bytes);
      try {
        Files.move(beside, to, StandardCopyOption.ATOMIC_MOVE, StandardCopyOption.REPLACE_EXISTING);
      } catch (AtomicMoveNotSupportedException e) {
        Files.move(beside, to, StandardCopyOption.REPLACE_EXISTING);
      }
    } finally {
      Files.deleteIfExists(beside);
    }
  }
}
