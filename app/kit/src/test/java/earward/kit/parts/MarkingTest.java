package earward.kit.parts;

import static earward.kit.parts.BandColour.BLACK;
import static earward.kit.parts.BandColour.BLUE;
import static earward.kit.parts.BandColour.BROWN;
import static earward.kit.parts.BandColour.GOLD;
import static earward.kit.parts.BandColour.GREEN;
import static earward.kit.parts.BandColour.GREY;
import static earward.kit.parts.BandColour.ORANGE;
import static earward.kit.parts.BandColour.PINK;
import static earward.kit.parts.BandColour.RED;
import static earward.kit.parts.BandColour.SILVER;
import static earward.kit.parts.BandColour.VIOLET;
import static earward.kit.parts.BandColour.WHITE;
import static earward.kit.parts.BandColour.YELLOW;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;
import static org.assertj.core.api.Assertions.within;

import earward.block.quantity.Unit;
import earward.kit.design.QuantityException;
import earward.kit.design.QuantityText;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** Colour bands and codes against IEC 60062:2016, whose tables stand here from memory. */
class MarkingTest {
  private static final List<BandColour> DIGITS =
      List.of(BLACK, BROWN, RED, ORANGE, YELLOW, GREEN, BLUE, VIOLET, GREY, WHITE);

  private static List<BandColour> bands(double ohms, double share) {
    return Marking.colourBands(ohms, share).orElseThrow();
  }

  @Test
  void everyDigitHasItsColour() {
    for (int tens = 1; tens <= 9; tens++) {
      for (int ones = 0; ones <= 9; ones++) {
        assertThat(bands(10 * tens + ones, 0.05))
            .containsExactly(DIGITS.get(tens), DIGITS.get(ones), BLACK, GOLD);
      }
    }
  }

  @Test
  void everyMultiplierHasItsColour() {
    List<BandColour> multipliers =
        List.of(
            PINK, SILVER, GOLD, BLACK, BROWN, RED, ORANGE, YELLOW, GREEN, BLUE, VIOLET, GREY,
            WHITE);
    for (int i = 0; i < multipliers.size(); i++) {
      double ohms = i < 3 ? 47 / Math.pow(10, 3 - i) : 47 * Math.pow(10, i - 3);
      assertThat(bands(ohms, 0.05)).containsExactly(YELLOW, VIOLET, multipliers.get(i), GOLD);
    }
  }

  @Test
  void everyToleranceOfAKitsPartsHasItsColour() {
    assertThat(bands(4700, 0.10)).endsWith(SILVER);
    assertThat(bands(4700, 0.05)).endsWith(GOLD);
    assertThat(bands(4700, 0.02)).endsWith(RED);
    assertThat(bands(4700, 0.01)).endsWith(BROWN);
    assertThat(bands(4700, 0.005)).endsWith(GREEN);
    assertThat(bands(4700, 0.20)).containsExactly(YELLOW, VIOLET, RED);
    // the other colours changed their meaning between editions of the standard: not printed
    assertThat(Marking.colourBands(4700, 0.0025)).isEmpty();
    assertThat(Marking.colourBands(4700, 0.0005)).isEmpty();
  }

  @Test
  void theUsualExamples() {
    assertThat(bands(4700, 0.05)).containsExactly(YELLOW, VIOLET, RED, GOLD);
    assertThat(bands(4700, 0.01)).containsExactly(YELLOW, VIOLET, BLACK, BROWN, BROWN);
    assertThat(bands(10e3, 0.05)).containsExactly(BROWN, BLACK, ORANGE, GOLD);
    assertThat(bands(1, 0.05)).containsExactly(BROWN, BLACK, GOLD, GOLD);
    assertThat(bands(0.47, 0.05)).containsExactly(YELLOW, VIOLET, SILVER, GOLD);
    assertThat(bands(2.2e6, 0.05)).containsExactly(RED, RED, GREEN, GOLD);
  }

  @Test
  void aValueWithMoreFiguresThanBandsHasNone() {
    assertThat(Marking.colourBands(4750, 0.05)).isEmpty();
    assertThat(bands(4750, 0.01)).containsExactly(YELLOW, VIOLET, GREEN, BROWN, BROWN);
    assertThat(Marking.colourBands(0, 0.05)).isEmpty();
    assertThat(Marking.colourBands(Double.NaN, 0.05)).isEmpty();
  }

  @ParameterizedTest
  @CsvSource({"R47, 0.47", "4R7, 4.7", "47R, 47", "4K7, 4700", "1M0, 1e6"})
  void resistorCodesAreWrittenAndRead(String code, double ohms) throws QuantityException {
    assertThat(Marking.resistorCode(ohms)).isEqualTo(code);
    assertThat(QuantityText.parse(code, Unit.OHM)).isEqualTo(ohms);
  }

  @ParameterizedTest
  @CsvSource({"4n7, 4.7e-9", "p33, 0.33e-12", "2µ2, 2.2e-6", "100n, 100e-9"})
  void capacitorLettersAreWrittenAndRead(String code, double farads) throws QuantityException {
    assertThat(Marking.capacitorLetters(farads)).isEqualTo(code);
    assertThat(QuantityText.parse(code, Unit.FARAD)).isEqualTo(farads);
  }

  @Test
  void aLatinLetterStandsForMicro() throws QuantityException {
    assertThat(QuantityText.parse("2u2", Unit.FARAD)).isEqualTo(2.2e-6);
  }

  @ParameterizedTest
  @CsvSource({
    "104, 100e-9",
    "102, 1e-9",
    "473, 47e-9",
    "221, 220e-12",
    "220, 22e-12",
    "159, 1.5e-12"
  })
  void threeDigitCodesAreWrittenAndRead(String code, double farads) {
    assertThat(Marking.capacitorCode(farads)).contains(code);
    assertThat(Marking.capacitorFarads(code)).isCloseTo(farads, within(1e-9 * farads));
  }

  @ParameterizedTest
  @ValueSource(strings = {"8R2", "8.2"})
  void smallCapacitorsAreMarkedInPicofaradsWithAPoint(String code) {
    assertThat(Marking.capacitorFarads(code)).isCloseTo(8.2e-12, within(1e-21));
  }

  @ParameterizedTest
  @ValueSource(strings = {"", "12", "1234", "R", ".", "4n7x", "-104", "٢٢٠"})
  void whatIsNoCapacitorCodeIsRefused(String code) {
    assertThatIllegalArgumentException().isThrownBy(() -> Marking.capacitorFarads(code));
  }

  @ParameterizedTest
  @CsvSource({"0.01, F", "0.02, G", "0.03, H", "0.05, J", "0.10, K", "0.20, M"})
  void everySymmetricalToleranceHasItsLetter(double share, String letter) {
    assertThat(Marking.toleranceLetter(share)).contains(letter);
  }

  @ParameterizedTest
  @CsvSource({"0.1e-12, B", "0.25e-12, C", "0.5e-12, D"})
  void everyToleranceInPicofaradsHasItsLetter(double farads, String letter) {
    assertThat(Marking.picofaradLetter(farads)).contains(letter);
  }

  @ParameterizedTest
  @CsvSource({"0.10, 0.30, Q", "0.20, 0.50, S", "0.10, 0.50, T", "0.20, 0.80, Z"})
  void everyUnevenToleranceHasItsLetter(double below, double above, String letter) {
    assertThat(Marking.unevenLetter(below, above)).contains(letter);
    assertThat(Marking.unevenLetter(below, above + 0.1)).isEmpty();
  }
}
