package earward.sheet;

import earward.kit.stage.BuildStages;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;

/** Writes the sheets of the starter kits into a folder, to be looked at. */
final class Printed {
  private Printed() {}

  public static void main(String[] arguments) throws Exception {
    Path folder = Files.createDirectories(Path.of(arguments.length > 0 ? arguments[0] : "target"));
    List<String> names =
        arguments.length > 1 ? List.of(arguments).subList(1, arguments.length) : StarterKits.NAMES;
    for (String name : names) {
      boolean german = name.endsWith("-de");
      var design = StarterKits.design(german ? name.substring(0, name.length() - 3) : name);
      var kit = StarterKits.reviewed(german ? StarterKits.german(design) : design);
      Files.write(
          folder.resolve(name + ".pdf"),
          ReadSheet.bytes(Sheets.of(kit, BuildStages.solve(kit.solved().assembly()))));
    }
    Files.write(folder.resolve("stopped.pdf"), ReadSheet.bytes(SampleSheet.stopped()));
  }
}
