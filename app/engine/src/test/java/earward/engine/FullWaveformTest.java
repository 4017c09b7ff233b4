package earward.engine;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import earward.block.device.OutputSwing;
import earward.block.figure.CaseName;
import earward.block.figure.Quantity;
import earward.engine.waveform.WaveformFigures;
import earward.engine.waveform.WaveformListener;
import earward.engine.waveform.WaveformResult;
import earward.engine.waveform.WaveformSettings;
import java.util.List;
import java.util.Map;
import java.util.concurrent.atomic.AtomicInteger;
import org.junit.jupiter.api.Test;

/** The full waveform where the answer is known, and its power balance. */
class FullWaveformTest {
  /** nVt of the trial diodes, n = 1.05 at 25 °C, in V. */
  private static final double SCALED_VOLTS = 1.05 * 1.380649e-23 * 298.15 / 1.602176634e-19;

  private static WaveformResult run(TrialCircuit trial, boolean squares, String... places) {
    CompiledCircuit compiled = trial.compile();
    WaveformResult result =
        compiled.fullWaveform(
            compiled.nominalValues(),
            CaseName.TEST,
            new WaveformSettings(List.of(places), true, squares),
            WaveformListener.PATIENT);
    assertThat(result.end()).as(result.trouble()).isEqualTo(WaveformResult.End.SOLVED);
    return result;
  }

  private static TrialCircuit detector(double depth) {
    return new TrialCircuit()
        .generator(330, "in")
        .resistor("detector.r0", 10, "in", "x")
        .diode("detector.d1", 3e-7, 1.05, 25, "x", "a")
        .capacitor("detector.c1", 1.8e-9, "a", Circuit.GROUND)
        .resistor("detector.r1", 27e3, "a", Circuit.GROUND)
        .resistor("detector.r2", 2.7e3, "a", "b")
        .capacitor("detector.c2", 150e-12, "b", Circuit.GROUND)
        .capacitor("detector.cc", 1e-6, "b", "w")
        .resistor("detector.rl", 47e3, "w", Circuit.GROUND)
        .probe("r0", "in", "x")
        .probe("diode", "x", "a")
        .probe("both", "in", "a")
        .probe("r2", "a", "b")
        .signal(1, depth, 1000);
  }

  @Test
  void theFeedsPowerIsTheHeatOfAllParts() {
    WaveformResult result = run(detector(0.6), true, "r0", "diode", "both", "a", "r2", "w");

    double squareAmperes = result.at("r0").meanSquareVolts() / 100;
    double diodeWatts =
        (result.at("both").meanSquareVolts()
                - result.at("r0").meanSquareVolts()
                - result.at("diode").meanSquareVolts())
            / 20;
    double watts =
        340 * squareAmperes
            + diodeWatts
            + result.at("a").meanSquareVolts() / 27e3
            + result.at("r2").meanSquareVolts() / 2.7e3
            + result.at("w").meanSquareVolts() / 47e3;
    assertThat(result.feedWatts()).isCloseTo(watts, within(2e-4 * watts));
    assertThat(diodeWatts).isPositive();
  }

  /** A linear circuit at the carrier and its multiples: E/√2 over |1 + jωRC|, nothing beyond. */
  @Test
  void aLinearCircuitDoesWhatItsImpedancesSay() {
    WaveformResult result =
        run(
            new TrialCircuit()
                .generator(1000, "in")
                .capacitor("detector.c", 1e-9, "in", Circuit.GROUND)
                .signal(2, 0, 1000),
            false,
            "in");

    double turn = 2 * Math.PI * 455e3 * 1000 * 1e-9;
    WaveformFigures in = result.at("in");
    double expected = Math.sqrt(2) / Math.hypot(1, turn);
    assertThat(in.carrierRmsVolts()).isCloseTo(expected, within(3e-4 * expected));
    assertThat(in.secondCarrierRmsVolts()).isLessThan(1e-4);
    assertThat(in.dcVolts()).isCloseTo(0, within(1e-6));
  }

  /** J = Is·(exp(−V/nVt)·I0(E/nVt) − 1) = V/R with a large reservoir (Clarke and Hess 1971). */
  @Test
  void aLargeReservoirGivesTheClosedFormOfTheExponentialDiode() {
    double peak = 0.15;
    WaveformResult result =
        run(
            new TrialCircuit()
                .generator(1e-3, "in")
                .diode("detector.d1", 1e-7, 1.05, 0, "in", "a")
                .capacitor("detector.c1", 1e-6, "a", Circuit.GROUND)
                .resistor("detector.r1", 100e3, "a", Circuit.GROUND)
                .signal(peak, 0, 1000),
            false,
            "a");

    double bessel = besselZero(peak / SCALED_VOLTS);
    double low = 0;
    double high = peak;
    for (int i = 0; i < 60; i++) {
      double middle = (low + high) / 2;
      double current = 1e-7 * (Math.exp(-middle / SCALED_VOLTS) * bessel - 1);
      low = current > middle / 100e3 ? middle : low;
      high = current > middle / 100e3 ? high : middle;
    }
    assertThat(result.at("a").dcVolts()).isCloseTo(low, within(3e-4 * low));
  }

  private static double besselZero(double x) {
    double sum = 0;
    double term = 1;
    for (int k = 1; k < 80; k++) {
      sum += term;
      term *= x * x / 4 / k / k;
    }
    return sum;
  }

  /** Behind the amplifier stands gain times the wiper until the output meets the rail. */
  @Test
  void anAmplifierClipsWhereItsSwingEnds() {
    TrialCircuit trial =
        detector(0.9)
            .battery(6, 0.1, "rail")
            .capacitor("supply.c", 1000e-6, "rail", Circuit.GROUND)
            .amplifier(false, 4e-3, new OutputSwing(0.5, 0.2, 0.5, 0.2, 0), "w", "rail")
            .capacitor("power.c", 2200e-6, "plus", "out")
            .resistor("load.r", 8, "out", Circuit.GROUND)
            .want("out", Quantity.AUDIO_RMS_VOLTS)
            .want("out", Quantity.DISTORTION);
    double[] fast = trial.figures();
    WaveformResult result = run(trial, false, "w", "out");

    double out = result.at("out").audioRmsVolts();
    assertThat(result.at("w").audioRmsVolts() * 20).isGreaterThan(1.5 * out);
    assertThat(out).isCloseTo(fast[0], within(0.01 * fast[0]));
    assertThat(result.at("out").distortion()).isCloseTo(fast[1], within(0.02));
  }

  @Test
  void aListenerIsToldAndMayEndIt() {
    CompiledCircuit compiled = detector(0.3).compile();
    AtomicInteger calls = new AtomicInteger();
    WaveformResult result =
        compiled.fullWaveform(
            compiled.nominalValues(),
            CaseName.TEST,
            WaveformSettings.of(List.of("a")),
            (steps, period, share) -> calls.incrementAndGet() < 700);

    assertThat(result.end()).isEqualTo(WaveformResult.End.CANCELLED);
    assertThat(calls).hasValue(700);
    assertThat(result.figures()).isEmpty();
  }

  @Test
  void aCaseWithoutCarrierIsRefused() {
    CompiledCircuit compiled =
        detector(0.3).solved(CaseName.NO_SIGNAL, Drive.NO_SIGNAL, Map.of()).compile();

    assertThatThrownBy(
            () ->
                compiled.fullWaveform(
                    compiled.nominalValues(),
                    CaseName.NO_SIGNAL,
                    WaveformSettings.of(List.of("a")),
                    WaveformListener.PATIENT))
        .isInstanceOf(IllegalArgumentException.class)
        .hasMessageContaining("no carrier");
  }
}
