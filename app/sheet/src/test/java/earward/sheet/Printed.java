package earward.sheet;

import java.nio.file.Files;
import java.nio.file.Path;

/** Writes the sheets of the starter kits into a folder, to be looked at. */
final class Printed {
  private Printed() {}

  public static void main(String[] arguments) throws Exception {
    Path folder = Files.createDirectories(Path.of(arguments.length > 0 ? arguments[0] : "target"));
    for (String name : StarterKits.NAMES) {
      var kit = StarterKits.reviewed(StarterKits.design(name));
      Files.write(folder.resolve(name + ".pdf"), ReadSheet.bytes(Sheets.of(kit)));
    }
    Files.write(folder.resolve("stopped.pdf"), ReadSheet.bytes(SampleSheet.stopped()));
  }
}
