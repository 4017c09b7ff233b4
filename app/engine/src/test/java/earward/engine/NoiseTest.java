package earward.engine;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import earward.block.device.Battery;
import earward.block.device.BatteryModel;
import earward.block.device.BipolarTransistor;
import earward.block.device.FieldEffectModel;
import earward.block.device.FieldEffectTransistor;
import earward.block.device.OpAmpModel;
import earward.block.device.OperationalAmplifier;
import earward.block.device.Potentiometer;
import earward.block.device.Taper;
import earward.block.device.Terminal;
import earward.block.device.TransistorModel;
import earward.block.figure.CaseName;
import earward.block.figure.Quantity;
import java.util.Map;
import org.junit.jupiter.api.Test;

/** Noise of the smallest circuits whose noise is known. */
class NoiseTest {
  private static final double BOLTZMANN = 1.380649e-23;
  private static final double CHARGE = 1.602176634e-19;
  private static final double KELVIN_300 = 26.85;

  private static TrialCircuit quiet(TrialCircuit circuit, double low, double high) {
    return circuit.solved(
        CaseName.NO_SIGNAL,
        Drive.NO_SIGNAL,
        Map.of(
            Slot.LOWEST_TONE_HERTZ, low,
            Slot.HIGHEST_TONE_HERTZ, high,
            Slot.AMBIENT_CELSIUS, KELVIN_300));
  }

  private static double noise(TrialCircuit circuit, String place, double low, double high) {
    return quiet(circuit, low, high)
        .want(place, Quantity.NOISE_RMS_VOLTS, CaseName.NO_SIGNAL)
        .figure();
  }

  @Test
  void aResistorMakesWhatJohnsonMeasured() {
    // Worked example of a resistor noise calculator (CHECKS NO-1): 100 kΩ, 1 MHz, 300 K: 40.69 µV.
    TrialCircuit alone = new TrialCircuit().resistor("r", 100e3, "a", Circuit.GROUND);
    assertThat(noise(alone, "a", 10, 1e6 + 10)).isCloseTo(40.69e-6, within(0.02e-6));
  }

  @Test
  void anRcMakesTheRootOfKtOverCWhateverItsResistance() {
    // kT/C, any text on sampled noise: 1 nF at 300 K gives 2.035 µV.
    for (double ohms : new double[] {1e3, 47e3}) {
      TrialCircuit rc =
          new TrialCircuit()
              .resistor("r", ohms, "a", Circuit.GROUND)
              .capacitor("c", 1e-9, "a", Circuit.GROUND);
      double volts = noise(rc, "a", 1e-3, 1e10);
      assertThat(volts).isCloseTo(Math.sqrt(BOLTZMANN * 300 / 1e-9), within(2e-10));
    }
  }

  @Test
  void aPotentiometerAtHalfMakesTheNoiseOfAQuarterOfItsTrack() {
    // CHECKS NO-7: 10 kΩ at half travel between quiet ends is 2.5 kΩ; both halves in parallel.
    TrialCircuit pot =
        new TrialCircuit()
            .battery(9, 1e-3, "top")
            .part(
                "volume.track",
                new Potentiometer(10e3, Taper.LINEAR, 1e-3, 0.5, false),
                Map.of(
                    Terminal.TOP, "top",
                    Terminal.WIPER, "wiper",
                    Terminal.BOTTOM, Circuit.GROUND));
    double expected = Math.sqrt(4 * BOLTZMANN * 300 * 2.5e3 * 10e3);
    assertThat(noise(pot, "wiper", 10, 10010)).isCloseTo(expected, within(expected * 1e-5));
  }

  @Test
  void aDiodeAtRestMakesTheNoiseOfItsZeroBiasResistance() {
    // 2q(J + 2Is) at J = 0 is 4kT/Rj with Rj = kT/(q·Is): van der Ziel, Noise.
    double saturation = 1e-7;
    double ohms = BOLTZMANN * 300 / CHARGE / saturation;
    TrialCircuit diode =
        new TrialCircuit()
            .diode("d", saturation, 1, 0.001, "a", Circuit.GROUND)
            .resistor("r", 1e12, "a", Circuit.GROUND);
    TrialCircuit warm =
        diode.solved(
            CaseName.NO_SIGNAL,
            Drive.NO_SIGNAL,
            Map.of(Slot.LOWEST_TONE_HERTZ, 10.0, Slot.HIGHEST_TONE_HERTZ, 1010.0));
    double there = warm.want("a", Quantity.NOISE_RMS_VOLTS, CaseName.NO_SIGNAL).figure();
    double kelvin = 298.15;
    double expected = Math.sqrt(4 * BOLTZMANN * kelvin * ohms * kelvin / 300 * 1000);
    assertThat(there).isCloseTo(expected, within(expected * 1e-3));
  }

  @Test
  void aTransistorStageHasTheNoiseOfTheHandbook() {
    // Horowitz and Hill: en² = 4kT(rbb + re/2), re = Vt/Ic, beside the load's own 4kTR.
    TransistorModel model =
        new TransistorModel(
            "T", false, 1e-14, 1e6, 1, Double.POSITIVE_INFINITY, 45, 0.5, 150, 200, 150);
    double vt = BOLTZMANN * 300 / CHARGE;
    TrialCircuit stage =
        new TrialCircuit()
            .battery(0.65, 1e-6, "base")
            .resistor("load", 1e3, "collector", "supply")
            .part(
                "supply.other",
                new Battery(new BatteryModel("cell", 9, 1e-6, 4, 1e-6, 1, 0.1, 0, 9, 1)),
                Map.of(Terminal.PLUS, "supply", Terminal.MINUS, Circuit.GROUND))
            .part(
                "amp.t",
                new BipolarTransistor(model),
                Map.of(
                    Terminal.BASE, "base",
                    Terminal.COLLECTOR, "collector",
                    Terminal.EMITTER, Circuit.GROUND));
    double[] figures =
        quiet(stage, 100, 10100)
            .want("collector", Quantity.NOISE_RMS_VOLTS, CaseName.NO_SIGNAL)
            .want("amp.t", Quantity.DC_AMPERES, CaseName.NO_SIGNAL)
            .figures();
    double siemens = figures[1] / vt;
    double gain = siemens * 1e3;
    double square = 4 * BOLTZMANN * 300 * (gain * gain * (150 + vt / figures[1] / 2) + 1e3) * 10e3;
    assertThat(figures[0]).isCloseTo(Math.sqrt(square), within(1e-3 * Math.sqrt(square)));
  }

  @Test
  void aFollowerOpAmpPassesItsInputNoise() {
    // A follower's output noise is its input noise (any op-amp text), here 20 nV in 1 Hz.
    OpAmpModel model = new OpAmpModel("O", 1e5, 1e8, 1e12, 10, 1, 1, 1e-3, 0, 20e-9, 3, 30);
    TrialCircuit follower =
        new TrialCircuit()
            .battery(9, 1e-6, "rail")
            .resistor("up", 100, "rail", "in")
            .resistor("down", 100, "in", Circuit.GROUND)
            .part(
                "amp.o",
                new OperationalAmplifier(model),
                Map.of(
                    Terminal.INPUT, "in",
                    Terminal.INVERTING, "out",
                    Terminal.OUTPUT, "out",
                    Terminal.SUPPLY, "rail",
                    Terminal.GROUND, Circuit.GROUND));
    double expected = Math.sqrt((20e-9 * 20e-9 + 4 * BOLTZMANN * 300 * 50) * 10e3);
    assertThat(noise(follower, "out", 10, 10010)).isCloseTo(expected, within(expected * 1e-3));
  }

  @Test
  void aFieldEffectTransistorHasTwoThirdsOfItsTransconductance() {
    // van der Ziel 1962: id² = 4kT·(2/3)·gm at saturation; gate at the source, so gm = 2Idss/Vp.
    FieldEffectModel model = new FieldEffectModel("J", false, 5e-3, 2, 30, 150, 300);
    TrialCircuit stage =
        new TrialCircuit()
            .battery(12, 1e-6, "rail")
            .resistor("load", 1e3, "rail", "drain")
            .part(
                "amp.j",
                new FieldEffectTransistor(model),
                Map.of(
                    Terminal.GATE, Circuit.GROUND,
                    Terminal.DRAIN, "drain",
                    Terminal.SOURCE, Circuit.GROUND));
    double siemens = 2 * 5e-3 / 2;
    double expected = Math.sqrt(4 * BOLTZMANN * 300 * (2 / 3.0 * siemens * 1e6 + 1e3) * 10e3);
    assertThat(noise(stage, "drain", 10, 10010)).isCloseTo(expected, within(expected * 1e-3));
  }

  private static double detectorNoise(double peakVolts, Drive drive, double sourceOhms) {
    return new TrialCircuit()
        .generator(sourceOhms, "in")
        .diode("detector.d1", 1e-7, 1, 1, "in", "out")
        .resistor("detector.r", 22e3, "out", Circuit.GROUND)
        .capacitor("detector.c", 1e-9, "out", Circuit.GROUND)
        .solved(CaseName.TEST, drive, Map.of(Slot.CARRIER_PEAK_VOLTS, peakVolts, Slot.DEPTH, 0.3))
        .want("out", Quantity.NOISE_RMS_VOLTS)
        .figure();
  }

  @Test
  void aFaintCarrierLeavesTheDetectorsNoiseAsItIsAtRest() {
    double rest = detectorNoise(2e-3, Drive.NO_SIGNAL, 50);
    assertThat(detectorNoise(2e-3, Drive.SIGNAL, 50)).isCloseTo(rest, within(rest * 5e-3));
  }

  @Test
  void theNoiseOfTheSourceBesideTheCarrierIsDetected() {
    // At 3 V the diode follows the envelope, and the pulses through a source of 2 kΩ are damped by
    // it: what is left is thermal noise, mostly of the source in phase with the carrier, 2·4kTR of
    // envelope (Rice 1945); 2q times the mean current alone would make four times that.
    double more = detectorNoise(3, Drive.SIGNAL, 2000);
    double detected = Math.sqrt(2 * 4 * BOLTZMANN * 298.15 * 2000 * 4900);
    assertThat(more / detected).isBetween(0.5, 2.0);
  }

  @Test
  void withoutSourceResistanceTheShotNoiseIsThatOfTheMeanCurrent() {
    // 2q(J + 2Is) into the port's own conductance (van der Ziel), nothing damping the pulses.
    double[] figures =
        new TrialCircuit()
            .generator(1e-3, "in")
            .diode("detector.d1", 1e-7, 1, 1e-3, "in", "out")
            .resistor("detector.r", 22e3, "out", Circuit.GROUND)
            .capacitor("detector.c", 1e-9, "out", Circuit.GROUND)
            .solved(
                CaseName.TEST,
                Drive.SIGNAL,
                Map.of(
                    Slot.CARRIER_PEAK_VOLTS, 0.05,
                    Slot.DEPTH, 0.3,
                    Slot.LOWEST_TONE_HERTZ, 50.0,
                    Slot.HIGHEST_TONE_HERTZ, 150.0))
            .want("out", Quantity.NOISE_RMS_VOLTS)
            .want("out", Quantity.DC_VOLTS)
            .figures();
    double vt = BOLTZMANN * 298.15 / CHARGE;
    double mean = figures[1] / 22e3;
    // a small drive: J + Is grows with the mean, and its slope to the port's voltage is (J + Is)/Vt
    double siemens = (mean + 1e-7) / vt + 1 / 22e3;
    double square =
        (2 * CHARGE * (mean + 2e-7) + 4 * BOLTZMANN * 298.15 / 22e3) / siemens / siemens * 100;
    assertThat(figures[0]).isCloseTo(Math.sqrt(square), within(0.02 * Math.sqrt(square)));
  }
}
