package earward.engine;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import earward.block.device.Diode;
import earward.block.device.DiodeMaterial;
import earward.block.device.DiodeModel;
import earward.block.device.Terminal;
import earward.block.device.Transformer;
import earward.block.device.TunedFeed;
import earward.block.figure.CaseName;
import earward.block.figure.Quantity;
import earward.block.law.ExponentialDetector;
import earward.block.law.ThermalVoltage;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Detectors with more than one diode against closed forms. */
class SeveralDetectorsTest {
  private static final double SATURATION = 2e-7;
  private static final double EMISSION = 1.1;
  private static final double LOAD = 47e3;
  private static final double SCALED_THERMAL_VOLTS = EMISSION * ThermalVoltage.volts(25);

  private static TrialCircuit diode(TrialCircuit to, String name, String anode, String cathode) {
    return to.diode(name, SATURATION, EMISSION, 0, anode, cathode);
  }

  /** A stiff feed and an ideal transformer with a centre tap, each half with the full carrier. */
  private static TrialCircuit fullWave(double peakVolts) {
    TrialCircuit circuit =
        new TrialCircuit()
            .generator(1e-3, "feed")
            .part(
                "feed.transformer",
                new Transformer(1, 2, 0, 0),
                Map.of(
                    Terminal.PRIMARY_START,
                    "feed",
                    Terminal.PRIMARY_END,
                    Circuit.GROUND,
                    Terminal.TOP,
                    "plus",
                    Terminal.TAP,
                    Circuit.GROUND,
                    Terminal.BOTTOM,
                    "minus"));
    diode(circuit, "detector.d1", "plus", "out");
    diode(circuit, "detector.d2", "minus", "out");
    return circuit
        .resistor("detector.r", LOAD, "out", Circuit.GROUND)
        .capacitor("detector.c", 100e-9, "out", Circuit.GROUND)
        .signal(peakVolts, 0, 400);
  }

  /** Clarke and Hess 1971, each of the two diodes with half of the load's current. */
  @ParameterizedTest
  @CsvSource({"0.1", "0.5", "2"})
  void aFullWaveDetectorIsTwoDiodesWithHalfTheCurrentEach(double peakVolts) {
    double direct =
        ExponentialDetector.directVolts(peakVolts, 2 * LOAD, SATURATION, SCALED_THERMAL_VOLTS);
    assertThat(fullWave(peakVolts).want("out", Quantity.DC_VOLTS).figure())
        .isCloseTo(direct, within(1e-3 * direct));
  }

  /** The halves take turns: the fundamental cancels, and what is left is at twice the carrier. */
  @Test
  void aFullWaveDetectorLeavesOnlyTheEvenHarmonicsOfTheCarrier() {
    double[] figures =
        fullWave(1)
            .want("out", Quantity.CARRIER_RMS_VOLTS)
            .want("out", Quantity.SECOND_CARRIER_RMS_VOLTS)
            .want("out", Quantity.THIRD_CARRIER_RMS_VOLTS)
            .figures();
    assertThat(figures[0]).isLessThan(1e-6 * figures[1]);
    assertThat(figures[1]).isGreaterThan(1e-6);
    assertThat(figures[2]).isLessThan(1e-6 * figures[1]);
  }

  /** A whole winding of four times the half's resistance, and a single diode at the half. */
  @Test
  void halfOfATunedWindingIsAWindingOfAQuarterOfItsResistance() {
    double[] halves =
        centreTapped()
            .want("out", Quantity.DC_VOLTS)
            .want("out", Quantity.AUDIO_RMS_VOLTS)
            .figures();
    // Each half is a winding of a quarter of the resistance with half of the carrier. Its diode
    // gives half of the load's current, in shorter pulses than one diode that gives it all, so the
    // level is a little higher than with that one.
    TrialCircuit single = new TrialCircuit().tuned(3e3, 400, "in");
    diode(single, "detector.d1", "in", "out");
    double[] whole =
        single
            .resistor("detector.r", LOAD, "out", Circuit.GROUND)
            .capacitor("detector.c", 10e-9, "out", Circuit.GROUND)
            .signal(0.5, 0.3, 400)
            .want("out", Quantity.DC_VOLTS)
            .want("out", Quantity.AUDIO_RMS_VOLTS)
            .figures();
    assertThat(halves[0] / whole[0]).isBetween(1.0, 1.08);
    assertThat(halves[1] / whole[1]).isBetween(1.0, 1.08);
  }

  private static TrialCircuit centreTapped() {
    TrialCircuit circuit =
        new TrialCircuit()
            .part(
                "feed.can",
                new TunedFeed(12e3, 400, 0, 0.5, 0.001),
                Map.of(
                    Terminal.TOP, "plus", Terminal.TAP, Circuit.GROUND, Terminal.BOTTOM, "minus"));
    diode(circuit, "detector.d1", "plus", "out");
    diode(circuit, "detector.d2", "minus", "out");
    return circuit
        .resistor("detector.r", LOAD, "out", Circuit.GROUND)
        .capacitor("detector.c", 10e-9, "out", Circuit.GROUND)
        .signal(1, 0.3, 400);
  }

  /** A forward bias brings a silicon diode to where it detects weak signals. */
  @Test
  void aBiasLetsASiliconDiodeDetectAWeakSignal() {
    double without = silicon(false);
    double biased = silicon(true);
    assertThat(biased).isGreaterThan(20 * without);
  }

  private static double silicon(boolean bias) {
    DiodeModel model = DiodeModel.plain("silicon", DiodeMaterial.SILICON, 2.52e-9, 1.752, 0.6);
    TrialCircuit circuit =
        new TrialCircuit()
            .generator(330, "in")
            .part(
                "detector.d1",
                new Diode(model),
                Map.of(Terminal.ANODE, "out", Terminal.CATHODE, "in"))
            .resistor("detector.r", LOAD, "out", Circuit.GROUND)
            .capacitor("detector.c", 1e-9, "out", Circuit.GROUND)
            .battery(9, 1, "rail");
    circuit.resistor("detector.bias", bias ? 470e3 : 1e12, "rail", "out");
    return circuit
        .signal(0.03, 0.3, 400)
        .want("out", Quantity.AUDIO_RMS_VOLTS, CaseName.TEST)
        .figure();
  }
}
