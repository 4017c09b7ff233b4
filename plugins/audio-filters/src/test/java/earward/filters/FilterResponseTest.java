package earward.filters;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import earward.block.Proposer;
import earward.block.law.Butterworth;
import earward.block.law.DeEmphasis;
import earward.block.law.TwinT;
import earward.block.setting.SettingValue;
import earward.block.setting.Values;
import earward.block.testkit.Variation;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Filters as fitted, with values of the series, solved and held against their published curves. */
class FilterResponseTest {
  private static final double PASS_HERTZ = 400;

  /**
   * Butterworth 1930: 10·log10(1 + (f/fc)^2n), 12.30 dB an octave above the corner for n = 2. The
   * leeway is what capacitors off the wanted value by up to 5 % make of it, and a transistor that
   * gives back a little less than it gets.
   */
  @ParameterizedTest
  @CsvSource({
    "second, op-amp, 0.3",
    "third, op-amp, 0.7",
    "second, transistor, 0.6",
    "third, transistor, 1.2"
  })
  void theLowPassIsMaximallyFlat(String order, String follower, double decibels) {
    ButterworthLowPass type = new ButterworthLowPass();
    Values values =
        FilterBench.values(type, Map.of("order", order, "follower", follower, "corner-hertz", 5e3));
    Proposer.Setting asked = new Proposer.Setting(values, Variation.PLAIN_CONDITIONS, 1e3, 1e6);
    SettingValue ohms = type.proposer().orElseThrow().propose(asked).get("ohms");
    FilterBench bench = new FilterBench(type, values.with("ohms", ohms));
    int n = order.equals("second") ? 2 : 3;
    for (double hertz : new double[] {1e3, 2.5e3, 5e3, 10e3}) {
      assertThat(bench.decibels(hertz, PASS_HERTZ))
          .as(hertz + " Hz")
          .isCloseTo(Butterworth.decibels(n, hertz / 5e3), within(decibels));
    }
    double below = follower.equals("op-amp") ? 0.99 : 0.93;
    assertThat(bench.ratio(PASS_HERTZ)).isBetween(below, 1.001);
  }

  /** The twin-T's own curve; resistors of E96 leave the notch within half a per cent. */
  @ParameterizedTest
  @CsvSource({"9-khz, 9000", "10-khz, 10000"})
  void thePlainNotchIsATwinT(String whistle, double notchHertz) {
    WhistleNotch type = new WhistleNotch();
    FilterBench bench =
        new FilterBench(
            type, FilterBench.values(type, Map.of("whistle", whistle, "width", "plain")));
    for (double ratio : new double[] {0.1, 0.236, 0.5, 2}) {
      assertThat(bench.ratio(ratio * notchHertz)).isCloseTo(TwinT.response(ratio, 0), within(0.01));
    }
    assertThat(bench.ratio(notchHertz)).isLessThan(0.006);
  }

  @Test
  void theNarrowNotchKeepsTheTrebleAndTakesTheWhistle() {
    WhistleNotch type = new WhistleNotch();
    Values values =
        FilterBench.values(type, Map.of("whistle", "10-khz", "quality", 2, "farads", 220e-12));
    FilterBench bench = new FilterBench(type, values);
    double pass = bench.ratio(PASS_HERTZ);
    for (double ratio : new double[] {0.25, 0.5, 0.8, 1.5}) {
      assertThat(bench.ratio(ratio * 10e3) / pass)
          .as("f/f0 " + ratio)
          .isCloseTo(TwinT.response(ratio, TwinT.share(2)), within(0.06));
    }
    assertThat(bench.ratio(10e3) / pass).isLessThan(0.1);
  }

  /** NRSC-1's curve turned over, and the plain time constants of ITU-R BS.450. */
  @ParameterizedTest
  @CsvSource({"north-american", "75-us", "50-us"})
  void theDeEmphasisUndoesTheCurve(String curve) {
    DeEmphasisNetwork type = new DeEmphasisNetwork();
    Values values =
        FilterBench.values(type, Map.of("curve", curve, "source-ohms", 0, "load-ohms", 100e6));
    FilterBench bench = new FilterBench(type, values);
    for (double hertz : new double[] {1e3, 2e3, 5e3, 10e3}) {
      double boost =
          curve.equals("north-american")
              ? DeEmphasis.nrscBoostDecibels(hertz)
              : DeEmphasis.boostDecibels(hertz, curve.equals("75-us") ? 75e-6 : 50e-6);
      assertThat(bench.decibels(hertz, 20)).as(hertz + " Hz").isCloseTo(-boost, within(0.25));
    }
  }
}
