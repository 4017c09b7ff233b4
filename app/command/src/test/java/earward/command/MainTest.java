package earward.command;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.OutputStream;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import org.junit.jupiter.api.Test;

class MainTest {
  @Test
  void theVersionGoesToStandardOutput() {
    Ran ran = Ran.earward("--version");
    assertThat(ran.code()).isZero();
    assertThat(ran.results()).startsWith("earward ");
    assertThat(ran.messages()).isEmpty();
  }

  @Test
  void helpGoesToStandardOutputAndNamesEveryCommandAndExitCode() {
    Ran ran = Ran.earward("--help");
    assertThat(ran.code()).isZero();
    assertThat(ran.results())
        .contains("sheet", "figures", "review", "prove", "propose", "blocks", "desktop")
        .contains("Exit code: 0");
    assertThat(ran.results()).doesNotContain("picocli", "${");
    assertThat(ran.messages()).isEmpty();
    for (String command :
        new String[] {"sheet", "figures", "review", "prove", "propose", "blocks", "desktop"}) {
      Ran help = Ran.earward(command, "--help");
      assertThat(help.code()).isZero();
      assertThat(help.results()).startsWith("Usage: earward " + command);
    }
  }

  @Test
  void anUnknownCommandIsTheCallsFaultAndTheOthersAreNamed() {
    assertFault(Ran.earward("fly"), "'fly'", "figures", "review");
  }

  @Test
  void anUnknownOptionIsTheCallsFault() {
    assertFault(Ran.earward("figures", "--jsn", "kit.earward"), "'--jsn'", "--help");
    assertFault(Ran.earward("--fly"), "'--fly'");
    assertFault(Ran.earward("blocks", "-x"), "'-x'");
  }

  @Test
  void aMissingOrASecondDesignIsTheCallsFault() {
    assertFault(Ran.earward("figures"), "DESIGN");
    assertFault(Ran.earward("review", "one.earward", "two.earward"), "'two.earward'");
  }

  @Test
  void aNameThatNoFileCanHaveIsTheCallsFault() {
    assertFault(Ran.earward("figures", "kit\0.earward"), "no name that a file can have");
  }

  @Test
  void aReaderThatClosesThePipeIsToldAndAFullDiskToo() {
    assertThat(unwritten("Broken pipe"))
        .contains("closed it before their end")
        .doesNotContain("full");
    assertThat(unwritten("No space left on device")).contains("No space left on device");
  }

  private static String unwritten(String reason) {
    OutputStream broken =
        new OutputStream() {
          @Override
          public void write(int octet) throws IOException {
            throw new IOException(reason);
          }
        };
    ByteArrayOutputStream messages = new ByteArrayOutputStream();
    int code =
        Main.run(
            new String[] {"--help"},
            broken,
            new PrintStream(messages, false, StandardCharsets.UTF_8));
    assertThat(code).isEqualTo(2);
    String said = messages.toString(StandardCharsets.UTF_8);
    assertThat(said).hasLineCount(1).startsWith("earward: ");
    return said;
  }

  private static void assertFault(Ran ran, String... words) {
    assertThat(ran.code()).isEqualTo(2);
    assertThat(ran.results()).isEmpty();
    assertThat(ran.messages()).hasLineCount(1).contains(words).doesNotContain("\tat ");
  }
}
