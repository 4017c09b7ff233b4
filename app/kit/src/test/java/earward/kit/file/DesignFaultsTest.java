package earward.kit.file;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatCode;
import static org.assertj.core.api.Assertions.catchThrowableOfType;
import static org.junit.jupiter.params.provider.Arguments.arguments;

import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Random;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;

class DesignFaultsTest {
  @TempDir private Path folder;

  /** What is changed in the least design, and the fault, its line and column, and its words. */
  static Stream<Arguments> faults() {
    return Stream.of(
        arguments("\"455 kHz\"", "\"455 kV\"", "quantity", 5, 16, "'455 kV' is in V; wanted a"),
        arguments("\"455 kHz\"", "\"455 kQ\"", "quantity", 5, 16, "unknown unit 'kQ'"),
        arguments("\"455 kHz\"", "\"often\"", "quantity", 5, 16, "'often' is no number"),
        arguments("\"455 kHz\"", "\"1,000,000\"", "quantity", 5, 16, "is no number"),
        arguments("\"455 kHz\"", "\"1e999\"", "quantity", 5, 16, "too large"),
        arguments("\"455 kHz\"", "1e999", "quantity", 5, 16, "too large"),
        arguments("\"455 kHz\"", "true", "quantity", 5, 16, "'true' is no number"),
        arguments("\"455 kHz\"", "null", "wrong-form", 5, 16, "is no text or number"),
        arguments("\"455 kHz\"", "[1]", "wrong-form", 5, 16, "is no text or number"),
        arguments("\"455 kHz\"", "1" + "0".repeat(200), "too-long", 5, 0, "unusual length"),
        arguments("\"455 kHz\"", "\"-455 kHz\"", "impossible-value", 4, 17, "carrier (Hz)"),
        arguments("\"0.25 V\"", "\"0 V\"", "impossible-value", 4, 17, "weak carrier (V peak)"),
        arguments("\"carrier\"", "\"carier\"", "missing-member", 4, 17, "no member 'carrier'"),
        arguments("\"title\": \"Least\",", "", "missing-member", 1, 1, "no member 'title'"),
        arguments("\"Least\"", "{}", "wrong-form", 3, 12, "'title' of the design"),
        arguments("\"schema\": 1", "\"schema\": 2", "schema-version", 2, 13, "schema 2"),
        arguments("\"schema\": 1,", "", "missing-member", 1, 1, "no member 'schema'"),
        arguments("\"title\"", "\"schema\"", "duplicate-key", 3, 3, "and in line 2"),
        arguments("\"id\": \"detector\"", "\"id\": \"De t\"", "impossible-value", 11, 5, "'De t'"),
        arguments("\"id\": \"detector\",", "", "missing-member", 11, 5, "no member 'id'"),
        arguments("\"type\": \"detector.envelope-diode\",", "", "missing-member", 11, 5, "'type'"),
        arguments(
            "\"carrier\"",
            "\"front end tuned circuits\": { \"number\": 1.5, \"quality\": 60 }, \"carrier\"",
            "impossible-value",
            0,
            0,
            "1.5 tuned circuits; wanted is a whole number"),
        arguments(
            "\"carrier\"",
            "\"front end tuned circuits\": { \"number\": 2, \"quality\": 60 },"
                + " \"front end sidebands\": [{ \"offset\": 4000, \"response\": -6 }], \"carrier\"",
            "impossible-value",
            0,
            0,
            "both by points and by its tuned circuits"),
        arguments(
            "\"carrier\"",
            "\"wanted\": { \"curve\": \"bent\" }, \"carrier\"",
            "unknown-choice",
            0,
            0,
            "bent"),
        arguments("[\n", "{\n", "broken-json", 0, 0, "the JSON is broken"),
        arguments("\"path\": [", "\"path\": [ 7,", "wrong-form", 10, 13, "no JSON object"),
        arguments("\"BAT46\"", "{ \"material\": \"tin\" }", "missing-member", 0, 0, "saturation"),
        arguments(
            "\"BAT46\"",
            "{ \"saturation current\": \"-1 nA\", \"emission coefficient\": 1 }",
            "impossible-value",
            0,
            0,
            "saturation current (A) is -1.0E-9; it must be above 0"));
  }

  @ParameterizedTest
  @MethodSource("faults")
  void everyFaultHasOneSentenceWithItsPlace(
      String found, String changed, String code, int line, int column, String words) {
    assertThat(Samples.LEAST).contains(found);
    DesignFileException e = fault(Samples.LEAST.replace(found, changed));
    assertThat(e.finding().code()).isEqualTo(code);
    assertThat(e.sentence()).contains(words).startsWith("sample.earward, line ");
    assertThat(e.sentence().lines()).hasSize(1);
    if (line > 0) {
      assertThat(e.line()).isEqualTo(line);
    }
    if (column > 0) {
      assertThat(e.column()).isEqualTo(column);
    }
  }

  @Test
  void aFileThatIsNotThereIsNamed() {
    Path missing = folder.resolve("absent.earward");
    assertThat(faultOf(missing).finding().code()).isEqualTo("missing-file");
    assertThat(faultOf(missing).sentence()).contains("absent.earward");
  }

  @Test
  void aFolderIsNoFile() {
    assertThat(faultOf(folder).finding().code()).isEqualTo("is-folder");
  }

  @Test
  void anEmptyFileIsSaidToBeEmpty() throws Exception {
    assertThat(faultOf(file(new byte[0])).finding().code()).isEqualTo("empty-file");
    assertThat(faultOf(file(" \n".getBytes(StandardCharsets.UTF_8))).finding().code())
        .isEqualTo("empty-file");
  }

  @Test
  void bytesThatAreNoUtf8AreSaidToBeSo() throws Exception {
    byte[] latin = "{ \"title\": \"4.7 \u00b5F\" }".getBytes(StandardCharsets.ISO_8859_1);
    assertThat(faultOf(file(latin)).finding().code()).isEqualTo("not-utf-8");
  }

  @Test
  void aByteOrderMarkIsNoFault() throws Exception {
    Path marked = file(("\ufeff" + Samples.LEAST).getBytes(StandardCharsets.UTF_8));
    assertThatCode(() -> Designs.read(marked)).doesNotThrowAnyException();
  }

  @Test
  void brokenJsonIsFoundAtItsLineAndColumn() {
    DesignFileException e = fault("{\n  \"schema\": 1,\n  \"title\" \"no colon\"\n}\n");
    assertThat(e.finding().code()).isEqualTo("broken-json");
    assertThat(e.line()).isEqualTo(3);
    assertThat(e.column()).isBetween(11, 12);
    assertThat(e.sentence().lines()).hasSize(1);
  }

  @Test
  void whatFollowsTheObjectIsAFault() {
    assertThat(fault(Samples.LEAST + "{}").finding().code()).isEqualTo("broken-json");
    assertThat(fault("[]").finding().code()).isEqualTo("wrong-form");
    assertThat(fault("7").finding().code()).isEqualTo("wrong-form");
  }

  @Test
  void nestingAHundredThousandDeepIsRefusedWithASentence() {
    DesignFileException lists = fault("{ \"schema\": " + "[".repeat(100_000));
    assertThat(lists.finding().code()).isEqualTo("nested-too-deep");
    DesignFileException objects = fault("{\"a\":".repeat(100_000));
    assertThat(objects.finding().code()).isEqualTo("nested-too-deep");
    assertThat(objects.sentence().lines()).hasSize(1);
  }

  @Test
  void aPlaceThatCannotBeWrittenIsNamed() throws Exception {
    var design = Designs.read(Samples.LEAST, Samples.NAME).design();
    DesignFileException intoFolder =
        catchThrowableOfType(DesignFileException.class, () -> Designs.write(design, folder));
    assertThat(intoFolder.finding().code()).isEqualTo("is-folder");
    Path nowhere = folder.resolve("no/such/kit.earward");
    DesignFileException intoNothing =
        catchThrowableOfType(DesignFileException.class, () -> Designs.write(design, nowhere));
    assertThat(intoNothing.finding().code()).isEqualTo("missing-folder");
    assertThat(intoNothing.sentence()).contains("kit.earward");
  }

  /** Whatever is done to a design's text, it is read or refused with one sentence. */
  @Test
  void aDamagedFileIsReadOrRefusedButNeverThrowsAnythingElse() {
    Random random = new Random(20_26);
    int refused = 0;
    for (int i = 0; i < 1500; i++) {
      StringBuilder text = new StringBuilder(Samples.FULL);
      for (int k = 0; k <= random.nextInt(3); k++) {
        damage(text, random);
      }
      try {
        Designs.text(Designs.read(text.toString(), Samples.NAME).design());
      } catch (DesignFileException e) {
        refused++;
        assertThat(e.sentence().lines()).hasSize(1);
      }
    }
    assertThat(refused).isBetween(400, 1450);
  }

  private static void damage(StringBuilder text, Random random) {
    int at = random.nextInt(text.length() - 20);
    switch (random.nextInt(4)) {
      case 0 -> text.deleteCharAt(at);
      case 1 -> text.insert(at, "{}[]\",:0 9e-nullé\u0000".charAt(random.nextInt(18)));
      case 2 -> text.delete(at, at + random.nextInt(20));
      default -> text.insert(at, text.substring(at, at + random.nextInt(20)));
    }
  }

  private Path file(byte[] bytes) throws Exception {
    return Files.write(folder.resolve("sample.earward"), bytes);
  }

  private static DesignFileException fault(String text) {
    return catchThrowableOfType(DesignFileException.class, () -> Designs.read(text, Samples.NAME));
  }

  private static DesignFileException faultOf(Path file) {
    return catchThrowableOfType(DesignFileException.class, () -> Designs.read(file));
  }
}
