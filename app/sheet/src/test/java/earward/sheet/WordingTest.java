package earward.sheet;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import earward.block.check.Severity;
import earward.block.device.Device;
import earward.block.device.Dielectric;
import earward.block.device.DiodeMaterial;
import earward.block.device.Taper;
import earward.block.device.Terminal;
import earward.block.quantity.Unit;
import earward.block.wiring.Caution;
import earward.kit.design.FrontEndSupply;
import earward.kit.parts.BandColour;
import earward.sheet.content.Amount;
import earward.sheet.content.CautionRow.Signal;
import earward.sheet.wording.Numbers;
import earward.sheet.wording.Wording;
import earward.sheet.wording.WordingException;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Locale;
import java.util.Properties;
import java.util.Set;
import java.util.TreeSet;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class WordingTest {
  private static final Pattern KEY = Pattern.compile("\"([a-z-]+(?:\\.[a-z0-9-]+)+)\"");

  @Test
  void everyKeyThatTheSourceNamesHasWords() throws IOException {
    Set<String> named = new TreeSet<>();
    try (Stream<Path> files = Files.walk(Path.of("src/main/java"))) {
      for (Path file : files.filter(f -> f.toString().endsWith(".java")).toList()) {
        Matcher matcher = KEY.matcher(Files.readString(file));
        while (matcher.find()) {
          named.add(matcher.group(1));
        }
      }
    }
    assertThat(named).hasSizeGreaterThan(60);
    assertThat(Wording.of("en").keys()).containsAll(named);
  }

  @Test
  void everyLanguageSaysAllThatEnglishSaysWithTheSamePlaceholders() throws IOException {
    Path folder = Path.of("../../templates/sheets");
    Properties english = read(folder.resolve("en.properties"));
    Set<String> languages = new TreeSet<>();
    try (Stream<Path> files = Files.list(folder)) {
      for (Path file : files.toList()) {
        Properties words = read(file);
        languages.add(String.valueOf(file.getFileName()));
        assertThat(words.keySet()).as(file.toString()).isEqualTo(english.keySet());
        for (String key : english.stringPropertyNames()) {
          assertThat(placeholders(words, key))
              .as(file + ": " + key)
              .isEqualTo(placeholders(english, key));
        }
      }
    }
    assertThat(languages).contains("en.properties", "de.properties");
  }

  private static Properties read(Path file) throws IOException {
    Properties words = new Properties();
    try (var reader = Files.newBufferedReader(file)) {
      words.load(reader);
    }
    return words;
  }

  private static Set<String> placeholders(Properties words, String key) {
    Set<String> names = new TreeSet<>();
    Matcher matcher = Pattern.compile("\\{([a-z]+)}").matcher(words.getProperty(key));
    while (matcher.find()) {
      names.add(matcher.group(1));
    }
    return names;
  }

  @Test
  void whateverAPartOrAFindingCanBeHasWords() {
    requireWords("colour.", BandColour.values());
    requireWords("terminal.", Terminal.values());
    requireWords("taper.", Taper.values());
    requireWords("dielectric.", Dielectric.values());
    requireWords("material.", DiodeMaterial.values());
    requireWords("severity.", Severity.values());
    requireWords("signal.", Signal.values());
    requireWords("front-end.", FrontEndSupply.values());
    requireWords("caution.", Caution.values());
    for (Class<?> device : Device.class.getPermittedSubclasses()) {
      String kind = device.getSimpleName().replaceAll("(?<=.)([A-Z])", "-$1");
      assertThat(Wording.of("en").text("kind." + kind.toLowerCase(Locale.ROOT))).isNotBlank();
    }
  }

  private static void requireWords(String prefix, Enum<?>... constants) {
    Wording english = Wording.of("en");
    assertThat(constants).isNotEmpty();
    for (Enum<?> constant : constants) {
      String key = prefix + constant.name().toLowerCase(Locale.ROOT).replace('_', '-');
      assertThat(english.text(key)).isNotBlank();
      if (prefix.equals("caution.")) {
        assertThat(english.text(key + ".do")).endsWith(".");
      }
    }
  }

  @Test
  void aLanguageThatIsNotThereIsEnglish() {
    Wording wording = Wording.of("sw");
    assertThat(wording.text("severity.stop")).isEqualTo("STOP");
    assertThat(wording.locale()).isEqualTo(Locale.ENGLISH);
  }

  @Test
  void aPlaceholderThatIsNotFilledIsRefusedByName() {
    assertThatThrownBy(() -> Wording.of("en").text("foot.page", "page", "1"))
        .isInstanceOf(IllegalArgumentException.class)
        .hasMessageContaining("foot.page")
        .hasMessageContaining("pages");
  }

  @Test
  void numbersHaveATrueMinusAndTheLanguagesDecimalSign() {
    assertThat(new Numbers(Locale.ENGLISH).text(-0.0412, Unit.VOLT)).isEqualTo("−41.2\u00a0mV");
    assertThat(new Numbers(Locale.GERMAN).text(4.7e3, Unit.OHM)).isEqualTo("4,7\u00a0kΩ");
  }

  @Test
  void voltagesThatNoMeterTellsFromNothingAreNotPrintedInNanovolts() {
    Numbers numbers = new Numbers(Locale.ENGLISH);
    assertThat(numbers.text(3e-17, Unit.VOLT)).isEqualTo("0\u00a0V");
    assertThat(numbers.text(-4e-5, Unit.VOLT)).isEqualTo("<\u00a00.1\u00a0mV");
    assertThat(numbers.text(1.3e-4, Unit.VOLT)).isEqualTo("130\u00a0µV");
  }

  @Test
  void noNumberIsADash() {
    assertThat(new Numbers(Locale.ENGLISH).write(Amount.none(Unit.OHM)).whole()).isEqualTo("–");
  }

  @Test
  void placeholdersOfAKeyAreKnown() {
    assertThat(Wording.of("en").placeholders("foot.page")).isEqualTo(Set.of("page", "pages"));
    assertThat(List.copyOf(Wording.of("en").placeholders("parts.how"))).isEmpty();
  }

  @Test
  void aFileInTheTemplatesFolderGoesOverTheProgramsOwnWords(@TempDir Path folder) throws Exception {
    Files.writeString(folder.resolve("en.properties"), "title.sheet = Bauzettel für Ω\n");
    Wording wording = Wording.of(folder, "en");
    assertThat(wording.text("title.sheet")).isEqualTo("Bauzettel für Ω");
    assertThat(wording.text("severity.weigh")).isEqualTo("WEIGH");
  }

  @Test
  void aNewLanguageNeedsNothingButItsFile(@TempDir Path folder) throws Exception {
    Files.writeString(folder.resolve("fr.properties"), "section.heat = Chaleur\n");
    Wording wording = Wording.of(folder, "fr");
    assertThat(wording.locale()).isEqualTo(Locale.FRENCH);
    assertThat(wording.text("section.heat")).isEqualTo("Chaleur");
    assertThat(Wording.of(folder, "sw").text("section.heat")).isEqualTo("Heat");
  }

  @Test
  void wordsThatWantWhatIsNotGivenAreRefusedInOneSentence(@TempDir Path folder) throws Exception {
    Files.writeString(folder.resolve("en.properties"), "foot.page = {seite} of {pages}\n");
    assertThatThrownBy(() -> Wording.of(folder, "en"))
        .isInstanceOf(WordingException.class)
        .hasMessageContaining("en.properties")
        .hasMessageContaining("foot.page")
        .hasMessageContaining("{seite}")
        .hasMessageContaining("{page}, {pages}");
  }

  @Test
  void aFileThatIsNoTextIsRefusedInOneSentence(@TempDir Path folder) throws Exception {
    Files.write(folder.resolve("en.properties"), new byte[] {'a', '=', (byte) 0xff, (byte) 0xfe});
    assertThatThrownBy(() -> Wording.of(folder, "en"))
        .isInstanceOf(WordingException.class)
        .hasMessageContaining("UTF-8");
    Files.writeString(folder.resolve("en.properties"), "a = \\u12\n");
    assertThatThrownBy(() -> Wording.of(folder, "en"))
        .isInstanceOf(WordingException.class)
        .hasMessageContaining("backslash");
  }
}
