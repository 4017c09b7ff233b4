package earward.command;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Locale;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/**
 * Each fault of an input ends in exit code 2 and one sentence that names file, place and remedy.
 */
class FaultyDesignsTest {
  @TempDir Path folder;

  private static String lantern() throws IOException {
    return Files.readString(TestHome.starterKit("lantern"));
  }

  private Path write(String text) throws IOException {
    return Files.writeString(folder.resolve("kit.earward"), text);
  }

  private Path edited(String from, String to) throws IOException {
    String text = lantern();
    assertThat(text).contains(from);
    return write(text.replace(from, to));
  }

  private static void assertFault(Path file, String... words) {
    for (String command : List.of("sheet", "figures", "review")) {
      Ran ran = Ran.earward(command, file);
      assertThat(ran.code()).as(ran.messages()).isEqualTo(2);
      assertThat(ran.results()).isEmpty();
      assertThat(ran.messages()).hasLineCount(1).contains(file.toString());
      for (String word : words) {
        assertThat(ran.messages()).contains(word);
      }
      assertThat(ran.messages()).doesNotContain("Exception", "\tat ");
    }
  }

  @Test
  void aMissingFile() {
    assertFault(folder.resolve("nothing.earward"), "no such file");
  }

  @Test
  void aFolder() {
    assertFault(folder, "folder");
  }

  @Test
  void anEmptyFile() throws IOException {
    assertFault(write(""), "empty");
    assertFault(write(" \n\t"), "empty");
  }

  @Test
  void brokenJsonIsNamedByLineAndColumn() throws IOException {
    assertFault(write("{\n  \"schema\": 1,\n  \"title\": oops\n}\n"), "line 3", "column 12");
  }

  @Test
  void nestingOfAHundredThousand() throws IOException {
    assertFault(write("[".repeat(100_000)), "nest");
    assertFault(write("{\"schema\": 1, \"x\": " + "[".repeat(100_000) + "]".repeat(100_000) + "}"));
  }

  @Test
  void anotherKindOfFile() throws IOException {
    Path file = folder.resolve("photo.earward");
    Files.write(file, new byte[] {(byte) 0x89, 'P', 'N', 'G', 0, (byte) 0xff, (byte) 0xfe});
    assertFault(file);
  }

  @Test
  void anUnknownBlock() throws IOException {
    assertFault(
        edited("\"filter.carrier-rc\"", "\"filter.magic\""),
        "'filter'",
        "filter.magic",
        "filter.carrier-rc");
  }

  @Test
  void anImpossibleValue() throws IOException {
    assertFault(edited("\"1.5 nF\"", "\"-1.5 nF\""), "'detector'", "'c1'", "-1.5 nF");
    assertFault(edited("\"test depth\": \"30 %\"", "\"test depth\": \"130 %\""), "test depth");
    assertFault(edited("\"carrier\": \"455 kHz\"", "\"carrier\": \"0 Hz\""), "carrier");
    assertFault(edited("\"ambient\": \"25 °C\"", "\"ambient\": \"-300 °C\""), "ambient", "-40");
    assertFault(edited("\"c1\": \"1.5 nF\"", "\"c1\": null"), "'detector'", "'c1'");
  }

  @Test
  void anUnknownUnit() throws IOException {
    assertFault(edited("\"1.5 nF\"", "\"1.5 furlong\""), "'detector'", "'c1'", "'furlong'");
    assertFault(edited("\"1.5 nF\"", "\"1.5 nH\""), "'detector'", "'c1'");
  }

  @Test
  void aTakeOffThatJoinsNowhereIsToldByTheFilesOwnWord() throws IOException {
    assertFault(
        edited("\"joins at\": \"detector.out\"", "\"joins at\": \"moon.out\""),
        "'agc'",
        "'moon.out'",
        "'joins at'");
  }

  @Test
  void aMissingLibraryPart() throws IOException {
    assertFault(edited("\"BAT46\"", "\"BAT999\""), "'detector'", "BAT999", "BAT46");
  }

  @Test
  void aFrontEndOfWhichNobodySaysWhatPowersIt() throws IOException {
    assertFault(edited("\"front end powered by\": \"battery\",", ""), "front end");
    assertFault(
        edited("\"front end powered by\": \"battery\"", "\"front end powered by\": \"other\""));
  }

  @Test
  void aSupplyOverTheLimit() throws IOException {
    String text = Files.readString(TestHome.starterKit("boathouse"));
    String given = "\"adaptor\": \"12 V 1 A regulated\"";
    assertThat(text).contains(given);
    Path file =
        write(
            text.replace(
                given,
                """
                "adaptor": {"name": "old brick", "rated voltage": "24 V", "rated current": "1 A",
                  "unloaded voltage": "31 V", "internal resistance": "2 Ω"}"""));
    assertFault(file, "'adaptor'", "31 V", "26 V");
  }

  @Test
  void severalFaultsAreASentenceEach() throws IOException {
    Path file =
        write(
            lantern()
                .replace("\"filter.carrier-rc\"", "\"filter.magic\"")
                .replace("\"BAT46\"", "\"BAT999\""));
    Ran ran = Ran.earward("review", file);
    assertThat(ran.code()).isEqualTo(2);
    assertThat(ran.messages().lines()).hasSize(2).allMatch(line -> line.contains("kit.earward"));
  }

  @Test
  void sentencesAreTheSameInEveryLocale() throws IOException {
    Path file = edited("\"1.5 nF\"", "\"-1.5 nF\"");
    String expected = Ran.earward("review", file).messages();
    Locale former = Locale.getDefault();
    try {
      for (String tag : List.of("de-DE", "tr-TR", "ar-EG")) {
        Locale.setDefault(Locale.forLanguageTag(tag));
        assertThat(Ran.earward("review", file).messages()).isEqualTo(expected);
      }
    } finally {
      Locale.setDefault(former);
    }
  }
}
