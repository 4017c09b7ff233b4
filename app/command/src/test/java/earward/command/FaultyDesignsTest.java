package earward.command;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Locale;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

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
    Path cut = write("{\n  \"schema\": 1");
    assertFault(cut, "line 2", "start marker at line 1, column 1");
    assertThat(Ran.earward("review", cut).messages()).doesNotContain("REDACTED", "Source");
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

  /** The place of a piece of the Lantern's file, as a sentence names it. */
  private static String place(String before) throws IOException {
    return placeOf(before, "");
  }

  private static String placeOf(String before, String what) throws IOException {
    String[] lines = lantern().split("\n", -1);
    for (int i = 0; i < lines.length; i++) {
      int at = lines[i].indexOf(before + what);
      if (at >= 0) {
        return "line " + (i + 1) + ", column " + (at + before.length() + 1) + ": ";
      }
    }
    throw new AssertionError("the Lantern has no " + before);
  }

  @Test
  void whatASettingOrABlockCannotBeIsNamedWithLineAndColumn() throws IOException {
    assertFault(edited("\"1.5 nF\"", "\"-1.5 nF\""), place("\"c1\": "), "'c1'");
    assertFault(edited("\"BAT46\"", "\"BAT999\""), place("\"diode\": "), "BAT999");
    assertFault(edited("\"audio-15\"", "\"audio-99\""), place("\"taper\": "), "audio-20");
    assertFault(edited("\"40 %\"", "\"140 %\""), place("\"knob\": "), "140 %");
    Path unknown = edited("\"filter.carrier-rc\"", "\"filter.magic\"");
    assertFault(unknown, "line 42, column 5: ", "filter.magic");
    assertThat(lantern().split("\n", -1)[41]).isEqualTo("    {");
  }

  @Test
  void aSecondBlockOfANameIsNamedWhereItStands() throws IOException {
    assertFault(
        edited("\"id\": \"agc\"", "\"id\": \"power\""),
        placeOf("\"id\": ", "\"agc\""),
        "a second block is named 'power'",
        "line ");
  }

  @Test
  void aToneOrACarrierThatNoReceiverHasIsRefused() throws IOException {
    assertFault(
        edited("\"test tone\": \"400 Hz\"", "\"test tone\": \"5 kHz\""), "test tone", "4500");
    assertFault(edited("\"carrier\": \"455 kHz\"", "\"carrier\": \"1e15 Hz\""), "carrier (Hz)");
    assertFault(
        edited("\"strong carrier peak\": \"4 V\"", "\"strong carrier peak\": \"1e9 V\""),
        "strong carrier");
    Path edge = edited("\"test tone\": \"400 Hz\"", "\"test tone\": \"4.5 kHz\"");
    assertThat(Ran.earward("figures", edge).code()).isNotEqualTo(2);
  }

  @Test
  void anEmptyNameIsNoFolder() {
    for (String command : List.of("sheet", "figures", "review")) {
      Ran ran = Ran.earward(command, "");
      assertThat(ran.code()).isEqualTo(2);
      assertThat(ran.messages()).hasLineCount(1).contains("is empty").doesNotContain("folder");
    }
  }

  @ParameterizedTest
  @ValueSource(
      strings = {
        "\"saturation current\": \"1e30 A\", \"emission coefficient\": 1",
        "\"saturation current\": \"50 nA\", \"emission coefficient\": 1,"
            + " \"junction capacitance\": \"1 F\"",
        "\"saturation current\": \"50 nA\", \"emission coefficient\": 1e6",
        "\"saturation current\": \"50 nA\", \"emission coefficient\": 1,"
            + " \"series resistance\": \"1e12 Ω\"",
        "\"saturation current\": \"50 nA\", \"emission coefficient\": 1,"
            + " \"leakage resistance\": \"0.001 Ω\"",
        "\"saturation current\": \"50 nA\", \"emission coefficient\": 1,"
            + " \"recovery time\": \"1 s\""
      })
  void aDiodeThatNobodyMakesIsRefused(String figures) throws IOException {
    assertFault(edited("\"BAT46\"", "{" + figures + "}"), "line 37, column 18: ", "'diode'");
  }

  @ParameterizedTest
  @ValueSource(
      strings = {
        "\"gain\": \"39 dB\" -> \"gain\": \"5000 dB\"",
        "\"open-loop gain\": \"70 dB\" -> \"open-loop gain\": \"5000 dB\"",
        "\"lowest supply\": \"1.8 V\" -> \"lowest supply\": \"1e9 V\"",
        "\"highest supply\": \"15 V\" -> \"highest supply\": \"1e30 V\"",
        "\"least load\": \"4 Ω\" -> \"least load\": \"1e30 Ω\"",
        "\"lost voltage up\": \"0.7 V\" -> \"lost voltage up\": \"1e30 V\"",
        "\"highest output current\": \"1 A\" -> \"highest output current\": \"1e30 A\""
      })
  void anAmplifierThatNobodyMakesIsRefused(String change) throws IOException {
    String[] parts = change.split(" -> ");
    String model = TestHome.libraryEntry("amplifiers", "TDA2822M bridge");
    assertThat(model).contains(parts[0]);
    String odd = model.replace(parts[0], parts[1]);
    assertFault(edited("\"TDA2822M bridge\"", odd), "line ", "'amplifier'");
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
