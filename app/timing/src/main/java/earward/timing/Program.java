package earward.timing;

import java.io.IOException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;

/** The runnable folder under test, named by {@code -Dearward.home}. */
final class Program {
  private Program() {}

  static Path home() {
    return Path.of(System.getProperty("earward.home", "app/dist/target/earward")).toAbsolutePath();
  }

  static Path plugins() {
    return home().resolve("plugins");
  }

  /** Starts the program as a user would and waits for its end. */
  static void start(String... arguments) throws IOException, InterruptedException {
    List<String> call = new ArrayList<>(List.of(home().resolve("bin/earward").toString()));
    call.addAll(List.of(arguments));
    int code =
        new ProcessBuilder(call)
            .redirectOutput(ProcessBuilder.Redirect.DISCARD)
            .redirectError(ProcessBuilder.Redirect.INHERIT)
            .start()
            .waitFor();
    if (code != 0) {
      throw new IOException(String.join(" ", call) + " ended with " + code);
    }
  }
}
