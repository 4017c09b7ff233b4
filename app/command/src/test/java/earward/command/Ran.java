package earward.command;

import java.io.ByteArrayOutputStream;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;

/** What a command left behind. */
record Ran(int code, String results, String messages) {

  /** Runs a command in the program's folder of {@link TestHome}. */
  static Ran earward(Object... arguments) {
    System.setProperty(Program.HOME, TestHome.path().toString());
    ByteArrayOutputStream results = new ByteArrayOutputStream();
    ByteArrayOutputStream messages = new ByteArrayOutputStream();
    String[] words = new String[arguments.length];
    for (int i = 0; i < words.length; i++) {
      words[i] = arguments[i].toString();
    }
    int code =
        Main.run(
            words,
            new PrintStream(results, false, StandardCharsets.UTF_8),
            new PrintStream(messages, false, StandardCharsets.UTF_8));
    return new Ran(
        code, results.toString(StandardCharsets.UTF_8), messages.toString(StandardCharsets.UTF_8));
  }
}
