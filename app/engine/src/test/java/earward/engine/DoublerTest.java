package earward.engine;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import earward.block.figure.Quantity;
import earward.block.law.ClippingDepth;
import earward.block.law.ExponentialDetector;
import earward.block.law.ThermalVoltage;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** The voltage doubler against closed forms. */
class DoublerTest {
  private static final double SATURATION = 2e-7;
  private static final double EMISSION = 1.1;
  private static final double LOAD = 47e3;
  private static final double SCALED_THERMAL_VOLTS = EMISSION * ThermalVoltage.volts(25);

  private static TrialCircuit diode(TrialCircuit to, String name, String anode, String cathode) {
    return to.diode(name, SATURATION, EMISSION, 0, anode, cathode);
  }

  private static TrialCircuit doubler(double peakVolts, double sourceOhms) {
    TrialCircuit circuit =
        new TrialCircuit()
            .generator(sourceOhms, "in")
            .capacitor("detector.pump", 100e-9, "in", "pump");
    diode(circuit, "detector.d1", Circuit.GROUND, "pump");
    diode(circuit, "detector.d2", "pump", "out");
    return circuit
        .resistor("detector.r", LOAD, "out", Circuit.GROUND)
        .capacitor("detector.c", 100e-9, "out", Circuit.GROUND)
        .signal(peakVolts, 0, 400);
  }

  /** Clarke and Hess 1971: both diodes carry the load's current, each at half of the output. */
  @ParameterizedTest
  @CsvSource({"0.1", "0.5", "2"})
  void aDoublerIsTwoDiodesInSeriesForTheOutput(double peakVolts) {
    double each =
        ExponentialDetector.directVolts(peakVolts, LOAD / 2, SATURATION, SCALED_THERMAL_VOLTS);
    double[] figures =
        doubler(peakVolts, 1e-3)
            .want("out", Quantity.DC_VOLTS)
            .want("pump", Quantity.DC_VOLTS)
            .figures();
    assertThat(figures[0]).isCloseTo(2 * each, within(2e-3 * each));
    assertThat(figures[1]).isCloseTo(each, within(2e-3 * each));
  }

  /** Twice the peak is what a doubler tends to (any handbook). */
  @Test
  void aDoublersOutputTendsToTwiceThePeak() {
    assertThat(doubler(8, 10).want("out", Quantity.DC_VOLTS).figure()).isBetween(14.5, 16.0);
  }

  /**
   * The pump capacitor discharges through the load as C1 does, so that the diode to ground lets go
   * first: where the rule says so, and where the solved current reverses.
   */
  @ParameterizedTest
  @CsvSource({"1e-9, 1e-10", "1e-9, 4.7e-10", "1e-10, 4.7e-10"})
  void aDoublersFirstDiodeLetsGoWhereTheRuleSays(double pumpFarads, double farads) {
    TrialCircuit circuit =
        new TrialCircuit()
            .generator(100, "in")
            .capacitor("detector.pump", pumpFarads, "in", "pump");
    diode(circuit, "detector.d1", Circuit.GROUND, "pump");
    diode(circuit, "detector.d2", "pump", "out");
    double[] figures =
        circuit
            .resistor("detector.r", LOAD, "out", Circuit.GROUND)
            .capacitor("detector.c", farads, "out", Circuit.GROUND)
            .signal(3, 0.3, 4.5e3)
            .want("detector.d1", Quantity.CLIPPING_DEPTH)
            .want("detector.d1", Quantity.REVERSAL_DEPTH)
            .want("detector.d2", Quantity.CLIPPING_DEPTH)
            .figures();
    assertThat(figures[0]).isCloseTo(figures[1], within(0.05 * figures[1]));
    assertThat(figures[2]).isGreaterThan(figures[0]);
    // Both capacitors side by side would be the strict diagonal rule's worst case.
    assertThat(figures[0]).isGreaterThan(ClippingDepth.diagonal(LOAD, pumpFarads + farads, 4.5e3));
  }
}
