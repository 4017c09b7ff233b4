package earward.desktop.model;

import earward.kit.design.KitDesign;
import earward.kit.file.DesignFileException;
import earward.kit.file.Designs;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.DirectoryStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.UUID;

/**
 * Autosaves: each open design that differs from its file is kept in a folder of its own until it is
 * saved or closed. What is found there at the next start was left by a program that was ended.
 */
public final class Recovery {
  private static final String ENDING = ".earward";
  private static final String ORIGINAL = ".of";

  private final Path folder;
  private final String id = ProcessHandle.current().pid() + "-" + UUID.randomUUID();

  /** The autosave of one document in a folder. */
  public Recovery(Path folder) {
    this.folder = folder;
  }

  /**
   * One design that was left behind.
   *
   * @param file the autosave
   * @param design what it holds
   * @param original the file that it was of
   */
  public record Left(Path file, KitDesign design, Optional<Path> original) {
    /** Removes the autosave: it was taken over, or is not wanted. */
    public void discard() {
      remove(file);
    }
  }

  /** Keeps a design; the sentence of a failure, empty where it went well. */
  public String keep(KitDesign design, Optional<Path> original) {
    try {
      Files.createDirectories(folder);
      Designs.write(design, folder.resolve(id + ENDING));
      Files.writeString(
          folder.resolve(id + ENDING + ORIGINAL),
          original.map(path -> path.toAbsolutePath().toString()).orElse(""),
          StandardCharsets.UTF_8);
      return "";
    } catch (DesignFileException e) {
      return Words.of("autosave.failed", e.sentence());
    } catch (IOException e) {
      return Words.of("autosave.failed", String.valueOf(e.getMessage()));
    }
  }

  /** Nothing needs to be kept any more. */
  public void clear() {
    remove(folder.resolve(id + ENDING));
  }

  private static void remove(Path autosave) {
    try {
      Files.deleteIfExists(autosave);
      Files.deleteIfExists(autosave.resolveSibling(autosave.getFileName() + ORIGINAL));
    } catch (IOException e) {
      autosave.toFile().deleteOnExit(); // it is offered once more at worst
    }
  }

  /** What was left in a folder; an autosave that cannot be read is left where it is. */
  public static List<Left> left(Path folder) {
    List<Left> left = new ArrayList<>();
    try (DirectoryStream<Path> files = Files.newDirectoryStream(folder, "*" + ENDING)) {
      for (Path file : files) {
        if (!ofRunningProgram(file)) {
          read(file).ifPresent(left::add);
        }
      }
    } catch (IOException e) {
      return List.of(); // the folder is not there: nothing was left
    }
    return left;
  }

  /** Half a file of a full disk: nothing can be made of it, and nothing is deleted. */
  private static Optional<Left> read(Path file) {
    try {
      return Optional.of(new Left(file, Designs.read(file).design(), original(file)));
    } catch (DesignFileException e) {
      return Optional.empty();
    }
  }

  /** Whether the program that keeps it still runs, this one or another. */
  private static boolean ofRunningProgram(Path autosave) {
    String pid = autosave.getFileName().toString().replaceAll("-.*", "");
    return pid.matches("[0-9]{1,18}")
        && ProcessHandle.of(Long.parseLong(pid)).filter(ProcessHandle::isAlive).isPresent();
  }

  private static Optional<Path> original(Path autosave) {
    try {
      String of =
          Files.readString(
              autosave.resolveSibling(autosave.getFileName() + ORIGINAL), StandardCharsets.UTF_8);
      return of.isBlank() ? Optional.empty() : Optional.of(Path.of(of.strip()));
    } catch (IOException e) {
      return Optional.empty();
    }
  }
}
