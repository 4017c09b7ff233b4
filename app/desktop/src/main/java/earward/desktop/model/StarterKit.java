package earward.desktop.model;

import earward.kit.design.KitDesign;
import earward.kit.file.DesignFileException;
import earward.kit.file.Designs;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/**
 * A starter kit as the start page shows it.
 *
 * @param file where it is kept
 * @param design what it is
 * @param line one line on it
 */
public record StarterKit(Path file, KitDesign design, String line) {
  /** The starter kits of a workshop that can be read. */
  public static List<StarterKit> all(Workshop workshop) {
    List<StarterKit> kits = new ArrayList<>();
    for (Path file : workshop.starterKits()) {
      read(file).ifPresent(kits::add);
    }
    return kits;
  }

  /** A kit that was broken by hand is not offered; opening it says why. */
  private static Optional<StarterKit> read(Path file) {
    try {
      KitDesign design = Designs.read(file).design();
      return Optional.of(new StarterKit(file, design, line(file, design)));
    } catch (DesignFileException e) {
      return Optional.empty();
    }
  }

  private static String line(Path file, KitDesign design) {
    String key = "starter." + file.getFileName().toString().replace(".earward", "");
    return Words.has(key)
        ? Words.of(key)
        : Words.of("starter.any", design.path().size(), design.supplies().size());
  }
}
