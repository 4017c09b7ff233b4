package earward.command;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.ByteArrayOutputStream;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import org.junit.jupiter.api.Test;

class MainTest {
  private final ByteArrayOutputStream results = new ByteArrayOutputStream();
  private final ByteArrayOutputStream messages = new ByteArrayOutputStream();

  @Test
  void theVersionGoesToStandardOutput() {
    assertThat(run("--version")).isZero();
    assertThat(results.toString(StandardCharsets.UTF_8)).startsWith("earward ");
    assertThat(messages.size()).isZero();
  }

  @Test
  void anUnknownCommandIsTheCallsFault() {
    assertThat(run("fly")).isEqualTo(2);
    assertThat(results.size()).isZero();
    assertThat(messages.toString(StandardCharsets.UTF_8)).contains("usage");
  }

  private int run(String... arguments) {
    return Main.run(
        arguments,
        new PrintStream(results, true, StandardCharsets.UTF_8),
        new PrintStream(messages, true, StandardCharsets.UTF_8));
  }
}
