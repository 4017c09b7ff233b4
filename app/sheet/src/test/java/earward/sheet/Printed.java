package earward.sheet;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;

/** Writes the sample sheets into the module's target folder, to be looked at. */
final class Printed {
  private Printed() {}

  public static void main(String[] arguments) throws IOException {
    Path folder = Files.createDirectories(Path.of(arguments.length > 0 ? arguments[0] : "target"));
    Files.write(folder.resolve("sample.pdf"), ReadSheet.bytes(SampleSheet.healthy()));
    Files.write(folder.resolve("sample-stopped.pdf"), ReadSheet.bytes(SampleSheet.stopped()));
  }
}
