package earward.kit.file;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.catchThrowableOfType;
import static org.assertj.core.api.Assertions.within;
import static org.junit.jupiter.params.provider.Arguments.arguments;

import earward.block.device.AmplifierModel;
import earward.block.device.BatteryModel;
import earward.block.device.DiodeModel;
import earward.block.device.PartKind;
import earward.block.device.Terminal;
import earward.kit.parts.PartEntry;
import earward.kit.parts.PartsLibrary;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.stream.Stream;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;

class PartsFilesTest {
  /** kT/q at 25 °C, in volts. */
  private static final double THERMAL_VOLTS = 0.025693;

  private static final String DIODES =
      """
      {
        "schema": 1,
        "kind": "diode",
        "parts": [
          { "name": "D", "source": "from memory", "saturation current": "1 nA", "emission coefficient": 1 }
        ]
      }
      """;

  private static PartsLibrary library = PartsLibrary.EMPTY;
  @TempDir private Path folder;

  @BeforeAll
  static void readTheShippedLibrary() throws Exception {
    library = PartsFiles.read(Path.of("..", "..", "templates", "parts"));
  }

  @Test
  void theShippedLibraryHasPartsOfEveryKindEachWithItsSource() {
    for (PartKind kind : PartKind.values()) {
      assertThat(library.names(kind)).as(kind.key()).isNotEmpty();
    }
    assertThat(library.all()).allMatch(entry -> entry.source().length() > 10);
    assertThat(library.all()).filteredOn(PartEntry::fromMemory).isNotEmpty();
  }

  /** Usual parts that block types name. */
  @ParameterizedTest
  @CsvSource({
    "DIODE, BAT46",
    "DIODE, 1N5817",
    "AMPLIFIER, TBA820M",
    "LOUDSPEAKER, 8 ohm 77 mm",
    "BATTERY, 9 V block",
    "ADAPTOR, 12 V 1 A regulated"
  })
  void whatABlockTypeNamesAsUsualIsThere(PartKind kind, String name) {
    assertThat(library.find(kind, name)).isPresent();
  }

  /**
   * Forward limits of data sheets: ST BAT46 rev. 4 (2006), Philips BAT85 (1996), ST BAR28 (1994)
   * for the 1N5711, Vishay 1N4148 as summarised.
   */
  @ParameterizedTest
  @CsvSource({
    "BAT46, 0.1e-3, 0.25",
    "BAT46, 10e-3, 0.45",
    "BAT85, 0.1e-3, 0.24",
    "BAT85, 1e-3, 0.32",
    "BAT85, 10e-3, 0.40",
    "BAT85, 30e-3, 0.50",
    "1N5711, 1e-3, 0.41",
    "1N5711, 15e-3, 1.0",
    "1N4148, 10e-3, 1.0"
  })
  void aDiodeLiesUnderTheLimitOfItsDataSheet(String name, double amperes, double limitVolts) {
    DiodeModel diode = (DiodeModel) library.find(PartKind.DIODE, name).orElseThrow().model();
    assertThat(forwardVolts(diode, diode.saturationAmperes(), amperes))
        .isBetween(limitVolts / 3, limitVolts);
    assertThat(forwardVolts(diode, diode.saturationLeastAmperes(), amperes))
        .isLessThan(limitVolts * 1.02);
  }

  private static double forwardVolts(DiodeModel diode, double saturation, double amperes) {
    return diode.emissionCoefficient() * THERMAL_VOLTS * Math.log1p(amperes / saturation)
        + amperes * diode.seriesOhms();
  }

  /**
   * Powers at 10 % distortion: ST TDA2822M (March 1995), ST TBA820M (June 1988), NXP TDA7056B
   * (1997), an LM386 clone's table; P10 = 1.288 · P at the edge of clipping (symmetrically clipped
   * sine).
   */
  @ParameterizedTest
  @CsvSource({
    "TDA2822M bridge, 6, 16, 0.8",
    "TDA2822M bridge, 6, 8, 1.35",
    "TDA2822M bridge, 4.5, 8, 0.7",
    "TDA2822M bridge, 3, 32, 0.065",
    "TDA2822M, 6, 8, 0.38",
    "TDA2822M, 9, 8, 1.0",
    "TBA820M, 9, 8, 1.2",
    "TBA820M, 12, 8, 2.0",
    "TBA820M, 6, 4, 0.75",
    "TDA7056B, 12, 16, 3.5",
    "TDA7056B, 12, 8, 5.5",
    "LM386, 6, 8, 0.325",
    "LM386, 9, 8, 0.7"
  })
  void anAmplifierGivesThePowerOfItsDataSheet(
      String name, double supplyVolts, double loadOhms, double tenPercentWatts) {
    AmplifierModel model =
        (AmplifierModel) library.find(PartKind.AMPLIFIER, name).orElseThrow().model();
    double lostVolts = model.swing().lostUpVolts() + model.swing().lostDownVolts();
    double lostOhms = model.swing().lostUpOhms() + model.swing().lostDownOhms();
    double peak =
        model.bridge()
            ? (supplyVolts - lostVolts) / (1 + lostOhms / loadOhms)
            : (supplyVolts - lostVolts) / (2 + lostOhms / loadOhms);
    double watts = 1.2878 * peak * peak / (2 * loadOhms);
    assertThat(watts / tenPercentWatts).isCloseTo(1, within(0.16));
  }

  /** ST TBA820M (June 1988): 33 Ω gives 45 dB, 120 Ω gives 34 dB; 680 pF gives 7 kHz. */
  @Test
  void theGainOfTheTba820mIsThatOfItsDataSheet() {
    AmplifierModel model =
        (AmplifierModel) library.find(PartKind.AMPLIFIER, "TBA820M").orElseThrow().model();
    double feedback = model.gain().feedbackOhms();
    assertThat(20 * Math.log10(1 + feedback / 33)).isCloseTo(45, within(0.5));
    assertThat(20 * Math.log10(1 + feedback / 120)).isCloseTo(34, within(0.5));
    assertThat(model.gain().compensationHertzFarad() / 680e-12).isCloseTo(7e3, within(1.0));
    assertThat(model.pins().get(0).terminal()).isEqualTo(Terminal.COMPENSATION);
  }

  /** IEC practice of 0.9 V a cell at the end, and 1.8 V of a new lithium iron disulphide cell. */
  @Test
  void aBatteryOfFourCellsIsFourTimesACell() {
    BatteryModel four =
        (BatteryModel) library.find(PartKind.BATTERY, "4 x AA").orElseThrow().model();
    assertThat(four.newVolts()).isEqualTo(6.4);
    assertThat(four.endVolts()).isEqualTo(3.6);
    assertThat(four.highestVolts()).isEqualTo(7.2);
  }

  static Stream<Arguments> faults() {
    return Stream.of(
        arguments("\"1 nA\"", "\"0 A\"", "impossible-value", "diode 'D'"),
        arguments("\"1 nA\"", "\"1 nV\"", "quantity", "'saturation current' of diode 'D'"),
        arguments("\"from memory\"", "\" \"", "impossible-value", "names no source"),
        arguments("\"source\": \"from memory\",", "", "missing-member", "no member 'source'"),
        arguments("\"name\": \"D\",", "", "missing-member", "no member 'name'"),
        arguments("\"emission coefficient\"", "\"n\"", "missing-member", "emission coefficient"),
        arguments("\"source\"", "\"colour\": 1, \"source\"", "unknown-member", "'colour'"),
        arguments("\"diode\"", "\"valve\"", "unknown-choice", "'valve'; it can be diode, "),
        arguments("\"schema\": 1", "\"schema\": 3", "schema-version", "schema 3"),
        arguments("\"parts\": [", "\"parts\": [ 1,", "wrong-form", "an entry of 'parts'"),
        arguments("\"source\"", "\"pins\": {\"0\": \"anode\"}, \"source\"", "wrong-form", "pin"),
        arguments("\"source\"", "\"pins\": {\"1\": \"leg\"}, \"source\"", "unknown-choice", "leg"));
  }

  @ParameterizedTest
  @MethodSource("faults")
  void aFaultNamesFileEntryAndWhatIsWrong(String found, String changed, String code, String words)
      throws Exception {
    assertThat(DIODES).contains(found);
    Files.writeString(folder.resolve("diodes.json"), DIODES.replace(found, changed));
    DesignFileException e = fault();
    assertThat(e.finding().code()).isEqualTo(code);
    assertThat(e.sentence()).contains("diodes.json, line ").contains(words);
    assertThat(e.sentence().lines()).hasSize(1);
  }

  @Test
  void aDiodeGivenByPointsIsFitted() throws Exception {
    Files.writeString(
        folder.resolve("diodes.json"),
        DIODES.replace(
            "\"saturation current\": \"1 nA\", \"emission coefficient\": 1",
            "\"points\": ["
                + point("10 µA", "0.163 V", "typical")
                + ","
                + point("0.1 mA", "0.230 V", "typical")
                + ","
                + point("1 mA", "0.321 V", "typical")
                + ","
                + point("10 mA", "0.655 V", "typical")
                + "]"));
    PartEntry entry = PartsFiles.read(folder).find(PartKind.DIODE, "D").orElseThrow();
    assertThat(((DiodeModel) entry.model()).seriesOhms()).isCloseTo(30, within(0.5));
    assertThat(entry.fit()).isPresent();
    assertThat(entry.notes()).anyMatch(note -> note.contains("extrapolated"));
  }

  private static final String GIVEN =
      "\"saturation current\": \"1 nA\", \"emission coefficient\": 1";

  @Test
  void aDiodeGivenByItsZeroBiasResistanceIsThatOfItsMaterial() throws Exception {
    Files.writeString(
        folder.resolve("diodes.json"),
        DIODES.replace(GIVEN, "\"material\": \"germanium\", \"zero-bias resistance\": \"60 kΩ\""));
    PartEntry entry = PartsFiles.read(folder).find(PartKind.DIODE, "D").orElseThrow();
    DiodeModel model = (DiodeModel) entry.model();
    assertThat(model.emissionCoefficient()).isEqualTo(1.2);
    assertThat(model.saturationAmperes()).isCloseTo(1.2 * THERMAL_VOLTS / 60e3, within(1e-10));
    assertThat(entry.notes()).anyMatch(note -> note.contains("zero-bias resistance"));
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "'zero-bias resistance': '0 Ω'|impossible-value|must be above 0",
        "'zero-bias resistance': '9 kΩ', 'saturation current': '1 nA'|given-and-fitted|wanted one",
        "'points': [{'current': '1 mA', 'voltage': '0.3 V'}]|impossible-value|at least 3",
        "'points': [{'current': '1 mA', 'voltage': '0.3 V', 'meaning': 'about'}]|unknown-choice|typ",
        "'points': [{'current': '1 mA'}]|missing-member|no member 'voltage'"
      })
  void aFitThatCannotBeIsSaid(String figures, String code, String words) throws Exception {
    Files.writeString(
        folder.resolve("diodes.json"), DIODES.replace(GIVEN, figures.replace('\'', '"')));
    assertThat(fault().finding().code()).isEqualTo(code);
    assertThat(fault().sentence()).contains("diodes.json, line ").contains(words);
  }

  /** ST TDA2822M (March 1995), one output: 0.38 W at 6 V and 1 W at 9 V, both into 8 Ω. */
  @Test
  void anAmplifierGivenByItsPowersIsFitted() throws Exception {
    Files.writeString(folder.resolve("a.json"), amplifier(""));
    PartEntry entry = PartsFiles.read(folder).find(PartKind.AMPLIFIER, "A").orElseThrow();
    AmplifierModel model = (AmplifierModel) entry.model();
    double lost = model.swing().lostUpVolts() + model.swing().lostDownVolts();
    double ohms = model.swing().lostUpOhms() + model.swing().lostDownOhms();
    assertThat(6 - lost - ohms * 0.272).isCloseTo(2 * 2.17, within(0.02));
    assertThat(9 - lost - ohms * 0.441).isCloseTo(2 * 3.53, within(0.02));
    assertThat(entry.fit()).isPresent();
    Files.writeString(folder.resolve("a.json"), amplifier("\"lost voltage down\": \"1 V\","));
    assertThat(fault().finding().code()).isEqualTo("given-and-fitted");
  }

  private static String amplifier(String more) {
    return """
    { "schema": 1, "kind": "amplifier", "parts": [ { "name": "A", "source": "ST TDA2822M",
      %s "gain": "39 dB", "open-loop gain": "70 dB", "bandwidth": "120 kHz",
      "output powers": [
        { "supply": "6 V", "load": "8 Ω", "power": "380 mW" },
        { "supply": "9 V", "load": "8 Ω", "power": "1 W", "distortion": "10 %%" },
        { "supply": "6 V", "load": "8 Ω", "power": "300 mW", "meaning": "limit" } ],
      "lowest supply": "1.8 V", "highest supply": "15 V", "least load": "4 Ω",
      "highest output current": "1 A", "junction to air": "100 K/W", "junction to case": "70 K/W",
      "quiescent current": "6 mA", "input resistance": "100 kΩ", "package": "DIP-8",
      "pins": { "1": "output", "2": "supply", "4": "ground", "7": "input" } } ] }
    """
        .formatted(more);
  }

  @Test
  void aDiodeAboveItsOwnLimitIsRefused() throws Exception {
    Files.writeString(
        folder.resolve("diodes.json"),
        DIODES.replace(
            "\"source\"", "\"points\": [" + point("1 mA", "0.3 V", "limit") + "], \"source\""));
    assertThat(fault().sentence()).contains("diode 'D'").contains("the limit given is 300");
  }

  private static String point(String current, String voltage, String meaning) {
    return "{ \"current\": \"%s\", \"voltage\": \"%s\", \"meaning\": \"%s\" }"
        .formatted(current, voltage, meaning);
  }

  @Test
  void aPartThatStandsInTwoFilesIsNamedWithBoth() throws Exception {
    Files.writeString(folder.resolve("a.json"), DIODES);
    Files.writeString(folder.resolve("b.json"), DIODES);
    DesignFileException e = fault();
    assertThat(e.finding().code()).isEqualTo("part-twice");
    assertThat(e.sentence()).contains("b.json, line 5").contains("a.json, line 5");
  }

  @Test
  void aFolderThatIsMissingOrEmptyIsNamed() {
    assertThat(fault().finding().code()).isEqualTo("empty-folder");
    DesignFileException missing =
        catchThrowableOfType(
            DesignFileException.class, () -> PartsFiles.read(folder.resolve("none")));
    assertThat(missing.finding().code()).isEqualTo("missing-folder");
  }

  private DesignFileException fault() {
    return catchThrowableOfType(DesignFileException.class, () -> PartsFiles.read(folder));
  }
}
