package earward.command;

import java.io.IOException;
import java.io.OutputStream;
import java.nio.file.AccessDeniedException;
import java.nio.file.FileSystemException;
import java.nio.file.Files;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.nio.file.StandardOpenOption;
import java.util.UUID;
import org.jspecify.annotations.Nullable;

/** A file that a command writes: whole or not at all, and never over the design that was read. */
final class OutputFile {
  private final Path target;

  private OutputFile(Path target) {
    this.target = target;
  }

  /** What puts the bytes. */
  @FunctionalInterface
  interface Bytes {
    void to(OutputStream out) throws IOException;
  }

  /**
   * The file to be written.
   *
   * @param target its path
   * @param read the file that the command reads
   */
  static OutputFile at(Path target, Path read) throws CommandFault {
    if (target.toString().isEmpty()) {
      throw CommandFault.ofInput(
          "The name of the file to write is empty; name one, for instance lantern.pdf.");
    }
    if (Files.isDirectory(target)) {
      throw CommandFault.ofInput(target + ": this is a folder; name a file in it to write.");
    }
    try {
      if (Files.exists(target) && Files.isSameFile(target, read)) {
        throw CommandFault.ofInput(
            target + ": this is the design itself; name another file to write.");
      }
    } catch (IOException e) {
      throw fault(target, e);
    }
    return new OutputFile(target);
  }

  /** Writes beside the target first, then moves over it; what is no plain file is written to. */
  void write(Bytes bytes) throws IOException {
    if (Files.exists(target) && !Files.isRegularFile(target)) {
      try (OutputStream out = Files.newOutputStream(target)) {
        bytes.to(out);
      }
      return;
    }
    Path real = Files.isSymbolicLink(target) ? target.toRealPath() : target.toAbsolutePath();
    if (Files.exists(real) && !Files.isWritable(real)) {
      throw new AccessDeniedException(real.toString());
    }
    @Nullable Path folder = real.getParent();
    if (folder == null || !Files.isDirectory(folder)) {
      throw new NoSuchFileException(String.valueOf(folder));
    }
    // not a temporary file of the JDK's, which only its owner may read
    Path draft = folder.resolve(".earward-" + UUID.randomUUID() + ".part");
    try {
      try (OutputStream out = Files.newOutputStream(draft, StandardOpenOption.CREATE_NEW)) {
        bytes.to(out);
      }
      if (Files.exists(real) && Files.getFileStore(real).supportsFileAttributeView("posix")) {
        Files.setPosixFilePermissions(draft, Files.getPosixFilePermissions(real));
      }
      Files.move(draft, real, StandardCopyOption.REPLACE_EXISTING);
    } finally {
      Files.deleteIfExists(draft);
    }
  }

  /** Why it could not be written, in one sentence. */
  static CommandFault fault(Path target, Exception thrown) {
    String why;
    if (thrown instanceof AccessDeniedException) {
      why = "it may not be written; check its permissions and its folder's, or name another";
    } else if (thrown instanceof NoSuchFileException) {
      why = "its folder does not exist; make it, or name another";
    } else if (thrown instanceof FileSystemException system && system.getReason() != null) {
      why = "it cannot be written: " + system.getReason();
    } else {
      why = "it cannot be written: " + thrown.getMessage();
    }
    return CommandFault.ofInput(target + ": " + why + ".");
  }
}
