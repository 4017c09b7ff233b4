package earward.command;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import earward.block.Conditions;
import earward.block.check.Finding;
import earward.block.check.Severity;
import earward.block.device.AdaptorModel;
import earward.block.device.DiodeMaterial;
import earward.block.device.DiodeModel;
import earward.block.quantity.Unit;
import earward.kit.design.KitDesign;
import earward.kit.design.QuantityText;
import earward.kit.design.SettingEntry;
import earward.kit.path.Assembly;
import java.util.Optional;
import java.util.function.DoubleFunction;
import java.util.stream.Stream;
import org.junit.jupiter.api.Named;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/**
 * Each check is tripped by a design that goes beyond its limit by a hair and missed by one that
 * stays short of it by a hair. The two designs differ in one number, which is found by bisection
 * and differs by a thousandth at most.
 */
class CheckedByAHairTest {
  /** Share by which the two designs of a pair may differ. */
  private static final double HAIR = 1e-3;

  /**
   * A check and a number of a design that moves its figure, or its limit, across.
   *
   * @param code of the check
   * @param block whose check it is
   * @param severity that it must have
   * @param design by the number
   * @param well a number at which the check holds
   * @param amiss one at which it does not
   */
  private record Pair(
      String code,
      String block,
      Severity severity,
      DoubleFunction<KitDesign> design,
      double well,
      double amiss) {}

  static Stream<Named<Pair>> pairs() {
    return Stream.of(
            new Pair(
                "clipping-depth",
                "detector",
                Severity.WEIGH,
                farads -> with("lantern", "detector", "c1", farads, Unit.FARAD),
                0.2e-9,
                10e-9),
            new Pair(
                "little-drive",
                "detector",
                Severity.WEIGH,
                CheckedByAHairTest::weakStation,
                1,
                0.01),
            new Pair(
                "carrier-in-audio",
                "power",
                Severity.WEIGH,
                CheckedByAHairTest::strongStationThroughNoFilter,
                0.5,
                9),
            new Pair(
                "supply-above-maximum",
                "power",
                Severity.STOP,
                volts -> adaptor(volts, 1),
                12.5,
                25),
            new Pair(
                "junction-temperature",
                "power",
                Severity.STOP,
                CheckedByAHairTest::sinkInTheSun,
                5,
                100),
            new Pair(
                "supply-current",
                "adaptor",
                Severity.STOP,
                amperes -> adaptor(12.6, amperes),
                2,
                0.02),
            new Pair(
                "reverse-voltage",
                "detector",
                Severity.STOP,
                CheckedByAHairTest::diodeOfBreakdown,
                100,
                5.5),
            new Pair(
                "coupling-edge",
                "volume",
                Severity.WEIGH,
                farads -> with("lantern", "volume", "c-wiper", farads, Unit.FARAD),
                1e-6,
                1e-9))
        .map(pair -> Named.of(pair.code(), pair));
  }

  @ParameterizedTest
  @MethodSource("pairs")
  void aHairBeyondTheLimitIsFoundAndAHairShortOfItIsNot(Pair pair) {
    double well = pair.well();
    double amiss = pair.amiss();
    assertThat(holds(pair, well)).as("holds at %s", well).isTrue();
    assertThat(holds(pair, amiss)).as("holds at %s", amiss).isFalse();
    while (Math.abs(amiss / well - 1) > HAIR) {
      double middle = Math.sqrt(well * amiss);
      if (holds(pair, middle)) {
        well = middle;
      } else {
        amiss = middle;
      }
    }
    assertThat(found(pair, well)).isEmpty();
    Finding finding = found(pair, amiss).orElseThrow();
    assertThat(finding.severity()).isEqualTo(pair.severity());
    assertThat(finding.source()).isNotBlank();
    Finding.Measured measured = finding.measured().orElseThrow();
    assertThat(measured.value() / measured.limit()).isCloseTo(1, within(5 * HAIR));
    assertThat(TestKits.reviewed(pair.design().apply(amiss)).doNotBuild())
        .isEqualTo(pair.severity() == Severity.STOP);
  }

  private static boolean holds(Pair pair, double number) {
    return found(pair, number).isEmpty();
  }

  private static Optional<Finding> found(Pair pair, double number) {
    Assembly assembly = TestKits.assembled(pair.design().apply(number));
    assertThat(assembly.complete()).as("%s", assembly.findings()).isTrue();
    return TestKits.found(assembly, pair.code(), pair.block());
  }

  private static KitDesign with(
      String kit, String block, String setting, double number, Unit unit) {
    return TestKits.starter(kit).withSetting(block, setting, QuantityText.exact(number, unit));
  }

  private static KitDesign sinkInTheSun(double kelvinPerWatt) {
    KitDesign design = with("boathouse", "power", "heat-sink", kelvinPerWatt, Unit.KELVIN_PER_WATT);
    Conditions core = design.conditions().core();
    return conditions(
        design, core.weakPeakVolts(), core.testPeakVolts(), core.strongPeakVolts(), 60);
  }

  private static KitDesign carriers(KitDesign design, double weak, double test, double strong) {
    return conditions(
        design, weak, test, strong, design.conditions().core().highestAmbientCelsius());
  }

  private static KitDesign conditions(
      KitDesign design, double weak, double test, double strong, double highestAmbientCelsius) {
    Conditions core = design.conditions().core();
    return design.withConditions(
        design
            .conditions()
            .withCore(
                new Conditions(
                    core.carrierHertz(),
                    core.toneHertz(),
                    core.highestToneHertz(),
                    core.lowestToneHertz(),
                    core.testDepth(),
                    core.deepestDepth(),
                    weak,
                    test,
                    strong,
                    core.ambientCelsius(),
                    highestAmbientCelsius,
                    core.wantedWatts())));
  }

  private static KitDesign weakStation(double weakPeakVolts) {
    return carriers(TestKits.starter("lantern"), weakPeakVolts, 1.5, 4);
  }

  private static KitDesign strongStationThroughNoFilter(double strongPeakVolts) {
    return carriers(
        TestKits.starter("lantern")
            .withSetting("filter", "c2", "10 pF")
            .withSetting("detector", "c1", "470 pF")
            .withSetting("volume", "knob", "100 %"),
        0.2,
        0.4,
        strongPeakVolts);
  }

  private static KitDesign adaptor(double unloadedVolts, double ratedAmperes) {
    AdaptorModel model =
        new AdaptorModel("sample adaptor", true, 12, ratedAmperes, unloadedVolts, 0.15, 0.05, 100);
    return TestKits.starter("boathouse")
        .withSetting("adaptor", "adaptor", new SettingEntry.Inline(model, "{}"));
  }

  private static KitDesign diodeOfBreakdown(double breakdownVolts) {
    DiodeModel model =
        new DiodeModel(
            "sample diode",
            DiodeMaterial.SCHOTTKY,
            2e-7,
            2e-7,
            2e-7,
            1.05,
            20,
            2e-12,
            0.4,
            0.4,
            Double.POSITIVE_INFINITY,
            breakdownVolts,
            0);
    return TestKits.starter("lantern")
        .withSetting("detector", "diode", new SettingEntry.Inline(model, "{}"));
  }
}
