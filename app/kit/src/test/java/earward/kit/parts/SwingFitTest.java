package earward.kit.parts;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import earward.block.device.OutputSwing;
import earward.block.law.ClippedSine;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class SwingFitTest {

  /**
   * Powers at 10 % distortion of makers' data sheets (National LM386, ST TBA820M and TDA2822M, ST
   * TDA2003, NXP TDA7056B) and what they leave of the supply at the edge of clipping, computed
   * separately with P10 = 1.2878·Pclip.
   */
  @ParameterizedTest
  @CsvSource({
    "6, 8, 0.325, false, 2.01, 1.98",
    "9, 8, 0.7, false, 2.95, 3.10",
    "16, 32, 1, false, 7.05, 1.90",
    "12, 8, 2, false, 4.99, 2.03",
    "9, 8, 1.2, false, 3.86, 1.28",
    "9, 32, 0.3, false, 3.86, 1.28",
    "3, 4, 0.11, false, 0.83, 1.35",
    "14.4, 4, 6, false, 6.11, 2.19",
    "6, 8, 1.35, true, 4.10, 1.90",
    "12, 16, 3.5, true, 9.33, 2.67"
  })
  void aPowerLeavesThisOfTheSupply(
      double supply, double load, double watts, boolean bridge, double clip, double lost) {
    OutputPower power = new OutputPower(supply, load, watts, 0.1, true);
    assertThat(power.clipVolts()).isCloseTo(clip, within(0.0051));
    assertThat(supply - (bridge ? 1 : 2) * power.clipVolts()).isCloseTo(lost, within(0.011));
  }

  @Test
  void aKnownLossComesBackFromItsPowers() {
    for (boolean bridge : new boolean[] {false, true}) {
      List<OutputPower> powers = new ArrayList<>();
      for (double[] at : new double[][] {{6, 8}, {9, 8}, {9, 16}, {12, 8}, {12, 32}}) {
        powers.add(power(at[0], at[1], 0.9, 1.7, bridge));
      }
      SwingFit fit = SwingFit.of(powers, bridge);
      assertThat(fit.lostVolts()).isCloseTo(0.9, within(1e-9));
      assertThat(fit.lostOhms()).isCloseTo(1.7, within(1e-9));
      assertThat(fit.report().residualFraction().orElseThrow()).isLessThan(1e-9);
      assertThat(fit.report().sentence()).contains("5 typical output powers", "extrapolated above");
    }
  }

  /** The power at 10 % distortion of an amplifier that loses so much. */
  private static OutputPower power(
      double supply, double load, double lost, double ohms, boolean bridge) {
    double clip = (supply - lost) / ((bridge ? 1 : 2) + ohms / load);
    return new OutputPower(
        supply, load, ClippedSine.tenPercentRatio() * clip * clip / (2 * load), 0.1, true);
  }

  @Test
  void thePowerThatStandsAgainstTheOthersIsNamed() {
    List<OutputPower> powers = new ArrayList<>();
    for (double[] at : new double[][] {{6, 8}, {9, 8}, {9, 16}, {12, 8}, {12, 32}}) {
      powers.add(power(at[0], at[1], 0.9, 1.7, false));
    }
    OutputPower good = powers.get(1);
    powers.set(1, new OutputPower(9, 8, good.watts() / 2, 0.1, true));
    FitReport report = SwingFit.of(powers, false).report();
    assertThat(report.suspect()).isTrue();
    assertThat(report.sentence())
        .contains("into 8\u202fΩ from 9\u202fV again, it lies 50 % below what the others say");
  }

  @Test
  void limitsHaveNoSayAndTwoPowersLeaveNoResidual() {
    OutputPower limit = new OutputPower(6, 8, 0.25, 0.1, false);
    OutputPower one = power(6, 8, 0.9, 1.7, false);
    OutputPower other = power(9, 32, 0.9, 1.7, false);
    SwingFit fit = SwingFit.of(List.of(limit, one, other), false);
    assertThat(fit.lostVolts()).isCloseTo(0.9, within(1e-9));
    assertThat(fit.report().residualFraction()).isEmpty();
    assertThat(fit.report().sentence()).contains("nothing tells how well");
    assertThatThrownBy(() -> SwingFit.of(List.of(limit, one), false))
        .hasMessageContaining("there are 1 typical output powers; a fit wants at least 2");
  }

  @Test
  void whatCannotBeIsRefusedByName() {
    OutputPower much = new OutputPower(6, 8, 1, 0.1, true);
    assertThatThrownBy(() -> SwingFit.of(List.of(much, power(9, 8, 1, 1, false)), false))
        .hasMessageContaining("1\u202fW into 8\u202fΩ from 6\u202fV would need");
    OutputPower one = power(6, 8, 1, 0, false);
    assertThatThrownBy(() -> SwingFit.of(List.of(one, one), false))
        .hasMessageContaining("about the same peak current");
  }

  /** A sine that rests off the middle clips at both sides at once. */
  @Test
  void theLossIsSharedOutByTheRestVoltage() {
    SwingFit fit = SwingFit.of(List.of(power(6, 8, 1, 2, false), power(9, 32, 1, 2, false)), false);
    OutputSwing swing = fit.swing(-0.3, 0.5);
    assertThat(swing.lostUpVolts()).isCloseTo(0.8, within(1e-9));
    assertThat(swing.lostDownVolts()).isCloseTo(0.2, within(1e-9));
    assertThat(swing.lostUpOhms()).isCloseTo(1, within(1e-9));
    assertThat(swing.lostWithoutBootstrapVolts()).isEqualTo(0.5);
  }
}
