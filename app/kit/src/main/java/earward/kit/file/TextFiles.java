package earward.kit.file;

import java.io.IOException;
import java.io.InputStream;
import java.nio.ByteBuffer;
import java.nio.charset.CharacterCodingException;
import java.nio.charset.StandardCharsets;
import java.nio.file.AccessDeniedException;
import java.nio.file.AtomicMoveNotSupportedException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.nio.file.StandardOpenOption;
import java.nio.file.attribute.PosixFileAttributeView;
import java.util.UUID;
import org.jspecify.annotations.Nullable;

/** Whole text files, read and written with one sentence for each thing that can fail. */
final class TextFiles {
  private static final int LONGEST_BYTES = 40_000_000;

  private TextFiles() {}

  static String read(Path file) throws DesignFileException {
    if (Files.isDirectory(file)) {
      throw fault("is-folder", file, "this is a folder; name a file in it");
    }
    if (!Files.exists(file)) {
      throw fault("missing-file", file, "there is no such file; check the name and the folder");
    }
    try (InputStream in = Files.newInputStream(file)) {
      byte[] bytes = in.readNBytes(LONGEST_BYTES + 1);
      if (bytes.length > LONGEST_BYTES) {
        throw fault("too-long", file, "the file is longer than 40 MB; this is no kit design");
      }
      return StandardCharsets.UTF_8.newDecoder().decode(ByteBuffer.wrap(bytes)).toString();
    } catch (CharacterCodingException e) {
      throw fault("not-utf-8", file, "the file is no text in UTF-8; save it in that encoding");
    } catch (AccessDeniedException e) {
      throw fault("unreadable", file, "reading is not permitted; change the file's permissions");
    } catch (IOException e) {
      throw fault("unreadable", file, "it cannot be read (" + e.getMessage() + "); try a copy");
    }
  }

  static void write(String text, Path file) throws DesignFileException {
    if (Files.isDirectory(file)) {
      throw fault("is-folder", file, "this is a folder; name a file in it");
    }
    Path beside = null;
    try {
      Path target = Files.exists(file) ? file.toRealPath() : file.toAbsolutePath();
      Path folder = target.getParent();
      if (folder == null || !Files.isDirectory(folder)) {
        throw fault("missing-folder", file, "its folder does not exist; make it or name another");
      }
      beside = folder.resolve(".earward-" + UUID.randomUUID() + ".part");
      Files.writeString(beside, text, StandardCharsets.UTF_8, StandardOpenOption.CREATE_NEW);
      keepPermissions(target, beside);
      moveOver(beside, target);
    } catch (IOException e) {
      remove(beside);
      throw fault(
          "unwritable",
          file,
          "it cannot be written ("
              + e.getClass().getSimpleName()
              + "); check the folder's permissions and space, or name another");
    }
  }

  /** The new file may be read and written by whom the old one could. */
  private static void keepPermissions(Path old, Path fresh) throws IOException {
    if (Files.exists(old)
        && Files.getFileStore(fresh).supportsFileAttributeView(PosixFileAttributeView.class)) {
      Files.setPosixFilePermissions(fresh, Files.getPosixFilePermissions(old));
    }
  }

  private static void moveOver(Path from, Path to) throws IOException {
    try {
      Files.move(from, to, StandardCopyOption.ATOMIC_MOVE, StandardCopyOption.REPLACE_EXISTING);
    } catch (AtomicMoveNotSupportedException e) {
      Files.move(from, to, StandardCopyOption.REPLACE_EXISTING);
    }
  }

  private static void remove(@Nullable Path part) {
    if (part != null && !part.toFile().delete()) {
      part.toFile().deleteOnExit();
    }
  }

  static DesignFileException fault(String code, Path file, String what) {
    return DesignFileException.of(code, file.toString(), Json.Place.NOWHERE, what);
  }
}
