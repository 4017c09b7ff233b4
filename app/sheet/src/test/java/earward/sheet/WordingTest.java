package earward.sheet;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import earward.block.quantity.Unit;
import earward.kit.parts.BandColour;
import earward.sheet.content.Amount;
import earward.sheet.wording.Numbers;
import earward.sheet.wording.Wording;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Locale;
import java.util.Set;
import java.util.TreeSet;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;

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
  void everyColourHasAName() {
    Wording english = Wording.of("en");
    for (BandColour colour : BandColour.values()) {
      assertThat(english.text("colour." + colour.name().toLowerCase(Locale.ROOT))).isNotBlank();
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
    assertThat(numbers.text(-4e-5, Unit.VOLT)).isEqualTo("<\u00a0100\u00a0µV");
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
}
