package earward.desktop.model;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.attribute.FileTime;

/**
 * How a file was when it was last read or written here.
 *
 * @param there whether it was there
 * @param changed when it was last changed
 * @param bytes its length
 */
record FileStamp(boolean there, FileTime changed, long bytes) {
  private static final FileStamp MISSING = new FileStamp(false, FileTime.fromMillis(0), 0);

  static FileStamp of(Path file) {
    try {
      return new FileStamp(true, Files.getLastModifiedTime(file), Files.size(file));
    } catch (IOException e) {
      return MISSING;
    }
  }
}
