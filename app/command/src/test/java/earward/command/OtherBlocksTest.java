package earward.command;

import static org.assertj.core.api.Assertions.assertThat;

import earward.block.check.Finding;
import earward.block.check.Severity;
import earward.block.figure.CaseName;
import earward.block.figure.FigureName;
import earward.block.figure.Quantity;
import earward.kit.design.BlockEntry;
import earward.kit.design.KitDesign;
import earward.kit.review.ReviewedKit;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** The Hayloft with blocks that no starter kit has: solved whole, and without a STOP. */
class OtherBlocksTest {
  private static final int DETECTOR = 1;

  private static KitDesign hayloft() {
    return TestKits.starter("hayloft");
  }

  private static ReviewedKit solved(KitDesign design) {
    ReviewedKit reviewed = TestKits.reviewed(design);
    List<String> stops =
        TestKits.findings(reviewed).stream()
            .filter(finding -> finding.severity() == Severity.STOP)
            .map(Finding::sentence)
            .toList();
    assertThat(stops).isEmpty();
    return reviewed;
  }

  private static double figure(ReviewedKit kit, String place, Quantity quantity) {
    return kit.solved().figures().orNaN(new FigureName(place, quantity, CaseName.TEST));
  }

  @ParameterizedTest
  @CsvSource({
    "detector.voltage-doubler, plain",
    "detector.full-wave, centre-tapped",
    "detector.biased-diode, plain",
    "detector.transistor-follower, plain",
    "detector.field-effect-follower, plain"
  })
  void everyDetectorRecoversTheTone(String type, String winding) {
    KitDesign design =
        hayloft()
            .withoutBlock("detector")
            .addBlock(DETECTOR, BlockEntry.of("detector", type))
            .withSetting("feed", "winding", winding);
    ReviewedKit kit = solved(design);
    // 0.9 V of carrier at the winding, 30 % of it: 0.19 V rms of tone for an ideal detector
    assertThat(figure(kit, "detector.out", Quantity.AUDIO_RMS_VOLTS)).isBetween(0.03, 0.4);
    assertThat(figure(kit, "detector.out", Quantity.DISTORTION)).isLessThan(0.15);
    assertThat(figure(kit, "loudspeaker.hot", Quantity.AUDIO_RMS_VOLTS)).isGreaterThan(0.01);
  }

  @ParameterizedTest
  @CsvSource({
    "filter.butterworth",
    "filter.whistle-notch",
    "filter.de-emphasis",
    "preamplifier.common-emitter",
    "preamplifier.op-amp"
  })
  void everyFilterAndPreamplifierPassesTheTone(String type) {
    KitDesign design = hayloft().addBlock(DETECTOR + 2, BlockEntry.of("extra", type));
    ReviewedKit kit = solved(design);
    double before = figure(kit, "filter.out", Quantity.AUDIO_RMS_VOLTS);
    double after = figure(kit, "extra.out", Quantity.AUDIO_RMS_VOLTS);
    assertThat(after / before).isBetween(0.5, 25.0);
  }

  @Test
  void headphonesEndAPath() {
    KitDesign design =
        hayloft()
            .withoutBlock("loudspeaker")
            .addBlock(5, BlockEntry.of("phones", "load.headphones").with("earpieces", "in-series"));
    ReviewedKit kit = solved(design);
    assertThat(figure(kit, "phones.jack", Quantity.AUDIO_RMS_VOLTS)).isGreaterThan(1e-3);
  }

  @Test
  void theLoudnessControlStandsForTheVolumeControl() {
    KitDesign design =
        hayloft()
            .withSetting("detector", "load", "resistor")
            .withoutBlock("volume")
            .addBlock(DETECTOR + 2, BlockEntry.of("volume", "volume.loudness"));
    ReviewedKit kit = solved(design);
    assertThat(figure(kit, "volume.wiper", Quantity.AUDIO_RMS_VOLTS)).isGreaterThan(1e-3);
  }
}
