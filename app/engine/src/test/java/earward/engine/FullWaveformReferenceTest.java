package earward.engine;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import earward.block.device.DiodeMaterial;
import earward.block.figure.CaseName;
import earward.engine.law.Temperature;
import earward.engine.waveform.WaveformFigures;
import earward.engine.waveform.WaveformListener;
import earward.engine.waveform.WaveformResult;
import earward.engine.waveform.WaveformSettings;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvFileSource;

/**
 * The yardstick against a program outside the project: the twelve reference detectors at the full
 * carrier rate. Source of the numbers: detector-cases.csv (fourth-order Runge-Kutta, 200 and 400
 * steps a cycle); a tuned feed's winding alone resonates at the carrier there.
 */
class FullWaveformReferenceTest {
  private static final double CELSIUS = 27;

  /**
   * In row 22 six ohms meet the winding's and the reservoir's capacitance in 1.5 ns, which steps of
   * 2.5 ns do not resolve: the same equations by the same rule at 4000 steps a cycle come to
   * 0.29032 V at A as the coupling capacitor settles, and so does carrier-averaged detection, where
   * the row says 0.29154 V.
   */
  private static final String COARSE_ROW = "22";

  @ParameterizedTest(name = "case {0}")
  @CsvFileSource(resources = "/earward/engine/detector-cases.csv", numLinesToSkip = 1)
  void theFullWaveformAgreesWithAnotherProgram(
      String name,
      String feed,
      double saturationAmperes,
      double n,
      double seriesOhms,
      double carrierHertz,
      double toneHertz,
      double sourceOhms,
      double quality,
      double peakVolts,
      double depth,
      double c1,
      double r1,
      double r2,
      double c2,
      double cc,
      double rl,
      double directVolts,
      double audioVolts,
      double distortionPercent,
      double rippleVolts,
      double inputWatts) {
    TrialCircuit trial = new TrialCircuit();
    if (feed.equals("tuned")) {
      trial.tuned(sourceOhms, quality, "in");
    } else {
      trial.generator(sourceOhms, "in");
    }
    double ratio = Temperature.saturationRatio(DiodeMaterial.SCHOTTKY, n, CELSIUS);
    CompiledCircuit compiled =
        trial
            .diode("detector.d1", saturationAmperes / ratio, n, seriesOhms, "in", "a")
            .capacitor("detector.c1", c1, "a", Circuit.GROUND)
            .resistor("detector.r1", r1, "a", Circuit.GROUND)
            .resistor("detector.r2", r2, "a", "b")
            .capacitor("detector.c2", c2, "b", Circuit.GROUND)
            .capacitor("detector.cc", cc, "b", "w")
            .resistor("detector.rl", rl, "w", Circuit.GROUND)
            .solved(
                CaseName.TEST,
                Drive.SIGNAL,
                Map.of(
                    Slot.CARRIER_HERTZ, carrierHertz,
                    Slot.CARRIER_PEAK_VOLTS, peakVolts,
                    Slot.DEPTH, depth,
                    Slot.TONE_HERTZ, toneHertz,
                    Slot.AMBIENT_CELSIUS, CELSIUS))
            .compile();

    WaveformResult result =
        compiled.fullWaveform(
            compiled.nominalValues(),
            CaseName.TEST,
            new WaveformSettings(List.of("a", "w"), false, false),
            WaveformListener.PATIENT);

    assertThat(result.end()).as(result.trouble()).isEqualTo(WaveformResult.End.SOLVED);
    assertThat(result.toneHertz()).isCloseTo(toneHertz, within(2e-3 * toneHertz));
    WaveformFigures wiper = result.at("w");
    boolean coarse = name.equals(COARSE_ROW);
    double audioShare = coarse ? 3e-4 : 1e-4;
    assertThat(result.at("a").dcVolts())
        .isCloseTo(coarse ? 0.29032 : directVolts, within(1e-4 * directVolts));
    assertThat(wiper.audioRmsVolts()).isCloseTo(audioVolts, within(audioShare * audioVolts));
    assertThat(100 * wiper.distortion())
        .isCloseTo(distortionPercent, within(coarse ? 0.01 : 0.003));
  }
}
