package earward.desktop.model;

import earward.kit.design.KitDesign;
import earward.kit.file.DesignFileException;
import earward.kit.file.DesignReading;
import earward.kit.file.Designs;
import java.nio.file.Path;
import java.util.Optional;
import org.jspecify.annotations.Nullable;

/** The file of one open design: what was last read from it or written to it. */
final class KitFile {
  private KitDesign saved;
  private @Nullable Path path;
  private @Nullable FileStamp stamp;

  /** A design that no file holds yet. */
  KitFile(KitDesign design) {
    saved = design;
  }

  Optional<Path> path() {
    return Optional.ofNullable(path);
  }

  boolean differs(KitDesign design) {
    return !saved.equals(design);
  }

  DesignReading read(Path from) throws DesignFileException {
    DesignReading reading = Designs.read(from);
    saved = reading.design();
    path = from;
    stamp = FileStamp.of(from);
    return reading;
  }

  void write(KitDesign design, Path to) throws DesignFileException {
    Designs.write(design, to);
    saved = design;
    path = to;
    stamp = FileStamp.of(to);
  }

  /** A design that came from a starter kit or from an autosave: it has no file of its own yet. */
  void detach(@Nullable Path original) {
    path = original;
    stamp = original == null ? null : FileStamp.of(original);
  }

  /** Takes a design for unsaved, whatever it is. */
  void forget(KitDesign different) {
    saved = different;
  }

  /** Whether somebody else changed the file since; says so once. */
  boolean changedOutside() {
    if (path == null || stamp == null) {
      return false;
    }
    FileStamp now = FileStamp.of(path);
    boolean changed = !now.equals(stamp);
    stamp = now;
    return changed;
  }
}
