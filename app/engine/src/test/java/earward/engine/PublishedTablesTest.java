package earward.engine;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import earward.block.device.AmplifierGain;
import earward.block.device.AmplifierModel;
import earward.block.device.AmplifierRatings;
import earward.block.device.AudioAmplifier;
import earward.block.device.OutputSwing;
import earward.block.device.Pin;
import earward.block.device.Potentiometer;
import earward.block.device.Taper;
import earward.block.device.Terminal;
import earward.block.figure.CaseName;
import earward.block.figure.Quantity;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Solved circuits against published tables: tapers, time constants, heat sinks. */
class PublishedTablesTest {
  private static double wiperShare(Taper taper, double position) {
    return new TrialCircuit()
            .battery(10, 1e-6, "top")
            .part(
                "volume.track",
                new Potentiometer(10e3, taper, 0, position, false),
                Map.of(
                    Terminal.TOP, "top",
                    Terminal.WIPER, "wiper",
                    Terminal.BOTTOM, Circuit.GROUND))
            .solved(CaseName.NO_SIGNAL, Drive.NO_SIGNAL, Map.of())
            .want("wiper", Quantity.DC_VOLTS, CaseName.NO_SIGNAL)
            .figure()
        / 10;
  }

  @ParameterizedTest
  @CsvSource({
    "AUDIO_10, 0.10, -20.00",
    "AUDIO_15, 0.15, -16.48",
    "AUDIO_20, 0.20, -13.98",
    "LINEAR, 0.50, -6.02",
    "REVERSE_15, 0.85, -1.41"
  })
  void atHalfTurnEachTaperStandsWhereItsMakersSay(Taper taper, double share, double decibels) {
    // A10 and A15 are named by the share at half turn (parts lists of audio potentiometers; 10 % is
    // the commoner figure of encyclopaedic pages); 20 % and the mirrored reverse law: from memory.
    assertThat(wiperShare(taper, 0.5)).isCloseTo(share, within(1e-6));
    assertThat(20 * Math.log10(wiperShare(taper, 0.5))).isCloseTo(decibels, within(5e-3));
    // two straight lines that meet there, as most carbon tracks are made (common practice)
    assertThat(wiperShare(taper, 0.25)).isCloseTo(share / 2, within(1e-6));
    assertThat(wiperShare(taper, 0.75)).isCloseTo((1 + share) / 2, within(1e-6));
  }

  /** A detector with a plain load, the feed of the networks below. */
  private static TrialCircuit detector() {
    return new TrialCircuit()
        .generator(1e-3, "in")
        .diode("detector.d1", 1e-5, 1, 0, "in", "out")
        .resistor("detector.r", 10e3, "out", Circuit.GROUND)
        .capacitor("detector.c", 1e-9, "out", Circuit.GROUND)
        .signal(5, 0.3, 400)
        .want("b", Quantity.DC_VOLTS);
  }

  /** What is lost between the detector and B at each frequency, in dB, as solved. */
  private static double[] cutDecibels(TrialCircuit circuit, double... hertz) {
    CompiledCircuit compiled = circuit.compile();
    double[] values = compiled.nominalValues();
    Response before = compiled.response(values, CaseName.TEST, "out", hertz);
    Response after = compiled.response(values, CaseName.TEST, "b", hertz);
    double[] cut = new double[hertz.length];
    for (int i = 0; i < cut.length; i++) {
      cut[i] =
          20 * Math.log10(before.points().get(i).magnitude() / after.points().get(i).magnitude());
    }
    return cut;
  }

  private static TrialCircuit timeConstant(double ohms, double farads) {
    return detector()
        .resistor("filter.r", ohms, "out", "b")
        .capacitor("filter.c", farads, "b", Circuit.GROUND);
  }

  /** R1 along the signal, R2 and C to ground. */
  private static TrialCircuit northAmerican(double source, double r1, double r2, double farads) {
    return detector()
        .resistor("source.r", source, "out", "a")
        .resistor("filter.r1", r1, "a", "b")
        .resistor("filter.r2", r2, "b", "foot")
        .capacitor("filter.c", farads, "foot", Circuit.GROUND);
  }

  @ParameterizedTest
  @CsvSource({
    "500, 0.11, 0.23",
    "1000, 0.41, 0.87",
    "2000, 1.45, 2.76",
    "3000, 2.76, 4.77",
    "4000, 4.11, 6.58",
    "5000, 5.40, 8.16",
    "7500, 8.16, 11.30",
    "10000, 10.36, 13.66",
    "12500, 12.15, 15.53",
    "15000, 13.66, 17.07"
  })
  void aSolvedTimeConstantCutsAsBroadcastingBoosts(
      double hertz, double fiftyMicroseconds, double seventyFive) {
    // ITU-R BS.450, 50 and 75 µs as a parallel R-C admittance; computed from the law by a separate
    // program, the end points 13.7 and 17.1 dB at 15 kHz well known (from memory).
    assertThat(cutDecibels(timeConstant(5e3, 10e-9), hertz)[0])
        .isCloseTo(fiftyMicroseconds, within(6e-3));
    assertThat(cutDecibels(timeConstant(7.5e3, 10e-9), hertz)[0])
        .isCloseTo(seventyFive, within(6e-3));
  }

  @ParameterizedTest
  @CsvSource({"7.5e3, 2122.07", "5e3, 3183.10", "1829.4, 8700"})
  void theCornersOfTheTimeConstantsStandInTheSolvedCircuit(double ohms, double hertz) {
    // 75 µs 2122.07 Hz, 50 µs 3183.10 Hz (tables of broadcast standards); 18.294 µs 8.7 kHz
    // (NRSC-1).
    assertThat(cutDecibels(timeConstant(ohms, 10e-9), hertz)[0]).isCloseTo(3.0103, within(1e-3));
  }

  @ParameterizedTest
  @CsvSource({
    "50, 0.00",
    "100, 0.01",
    "400, 0.14",
    "1000, 0.81",
    "1500, 1.63",
    "2000, 2.54",
    "2500, 3.44",
    "3000, 4.28",
    "3500, 5.05",
    "4000, 5.75",
    "4500, 6.37",
    "5000, 6.92",
    "6000, 7.85",
    "7000, 8.58",
    "7500, 8.89",
    "8000, 9.16",
    "9000, 9.62",
    "9500, 9.82",
    "10000, 10.00"
  })
  void theWorkedNorthAmericanNetworkCutsAsItsCurveSays(double hertz, double decibels) {
    // NRSC-1 over DC; outside figures 1.72 dB at 2, 6.11 at 5, 8.07 at 7.5 kHz over 1 kHz (quoted
    // in
    // secondary sources), 10 dB at 10 kHz. Worked realisation: C 10 nF, R1 5.671 kΩ, R2 1.829 kΩ.
    assertThat(cutDecibels(northAmerican(1e-3, 5671, 1829, 10e-9), hertz)[0])
        .isCloseTo(decibels, within(7e-3));
    // a source of 1 kΩ, counted into R1, changes nothing
    assertThat(cutDecibels(northAmerican(1000, 4671, 1829, 10e-9), hertz)[0])
        .isCloseTo(decibels, within(7e-3));
  }

  @Test
  void preferredValuesAndASourceThatIsForgottenMoveTheCorners() {
    // R1 5.6 kΩ and R2 1.8 kΩ of E24: 2151 and 8842 Hz; with 1 kΩ before it and R1 left, the pole
    // falls to 1/(2π·8.4 kΩ·10 nF) = 1894.7 Hz (arithmetic).
    for (double hertz : new double[] {500, 2151, 5000, 8842, 15e3}) {
      assertThat(cutDecibels(northAmerican(1e-3, 5600, 1800, 10e-9), hertz)[0])
          .isCloseTo(cut(hertz, 2150.8, 8841.9), within(2e-3));
      assertThat(cutDecibels(northAmerican(1000, 5600, 1800, 10e-9), hertz)[0])
          .isCloseTo(cut(hertz, 1894.7, 8841.9), within(2e-3));
    }
  }

  private static double cut(double hertz, double pole, double zero) {
    return 20 * Math.log10(Math.hypot(1, hertz / pole) / Math.hypot(1, hertz / zero));
  }

  /** An amplifier that turns what it draws into heat alone: 5 W of 10 V. */
  private static double[] cooled(
      double watts, double ambientCelsius, double toCase, double sinkWithInterface) {
    AmplifierModel model =
        new AmplifierModel(
            "heater",
            false,
            new AmplifierGain(20, Double.POSITIVE_INFINITY, 1e4, 1e6, 0, List.of()),
            new OutputSwing(0, 0, 0, 0, 0),
            new AmplifierRatings(1, 100, 1, 10, 150, 1e4, toCase),
            watts / 10,
            0.5,
            0,
            100e3,
            0,
            100,
            100,
            0,
            "TO-220",
            List.of(
                new Pin(1, Terminal.INPUT),
                new Pin(2, Terminal.OUTPUT),
                new Pin(3, Terminal.SUPPLY),
                new Pin(4, Terminal.GROUND)));
    return new TrialCircuit()
        .battery(10, 1e-6, "rail-main")
        .resistor("in.r", 10e3, "in", Circuit.GROUND)
        .part(
            "power.amplifier",
            new AudioAmplifier(model, sinkWithInterface),
            Map.of(
                Terminal.INPUT, "in",
                Terminal.OUTPUT, "out",
                Terminal.SUPPLY, "rail-main",
                Terminal.GROUND, Circuit.GROUND))
        .resistor("load.r", 1e9, "out", Circuit.GROUND)
        .solved(CaseName.NO_SIGNAL, Drive.NO_SIGNAL, Map.of(Slot.AMBIENT_CELSIUS, ambientCelsius))
        .want("power.amplifier", Quantity.DISSIPATION_WATTS, CaseName.NO_SIGNAL)
        .want("power.amplifier", Quantity.SURFACE_CELSIUS, CaseName.NO_SIGNAL)
        .want("power.amplifier", Quantity.JUNCTION_CELSIUS, CaseName.NO_SIGNAL)
        .figures();
  }

  @Test
  void aHeatSinkRisesAsPublished() {
    // Slides on heat-sink selection (TO-220, 5 W, 3 K/W to the case, 1 K/W with grease, 50 to
    // 150 °C): below 16 K/W; the one chosen, 13.2 K/W, rises by 66 °C. The interface is counted
    // with the sink here, so its 5 °C are added to the surface.
    double[] chosen = cooled(5, 50, 3, 13.2 + 1);
    assertThat(chosen[0]).isCloseTo(5, within(1e-4));
    assertThat(chosen[1] - 50).isCloseTo(66 + 5, within(0.2));
    assertThat(chosen[2]).isCloseTo(136, within(0.3));
    assertThat(cooled(5, 50, 3, 16 + 1)[2]).isCloseTo(150, within(0.3));
  }

  @Test
  void theHeatSinkOfADataSheetJustHoldsTheJunction() {
    // Philips TDA2613 (July 1994) p. 5: 4.1 W, 60 °C, 150 °C, 8 K/W to the case: 14 K/W.
    assertThat(cooled(4.1, 60, 8, 14)[2]).isCloseTo(150, within(0.5));
  }
}
