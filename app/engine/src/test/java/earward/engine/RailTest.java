package earward.engine;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import earward.block.device.Adaptor;
import earward.block.device.AdaptorModel;
import earward.block.device.BipolarTransistor;
import earward.block.device.OutputSwing;
import earward.block.device.Terminal;
import earward.block.device.TransistorModel;
import earward.block.figure.CaseName;
import earward.block.figure.Quantity;
import java.util.Map;
import org.junit.jupiter.api.Test;

/** Ripple that comes through, and the loop that closes through an old battery. */
class RailTest {
  private static TrialCircuit adaptor(TrialCircuit circuit, boolean regulated) {
    AdaptorModel model = new AdaptorModel("A", regulated, 9, 0.3, 12, 2, 1, 100);
    return circuit.part(
        "supply.adaptor",
        new Adaptor(model),
        Map.of(Terminal.PLUS, "rail", Terminal.MINUS, Circuit.GROUND));
  }

  private static TrialCircuit filtered(boolean regulated) {
    return adaptor(new TrialCircuit(), regulated)
        .resistor("filter.r", 98, "rail", "quiet")
        .capacitor("filter.c", 1e-3, "quiet", Circuit.GROUND)
        .resistor("load.r", 200, "quiet", Circuit.GROUND)
        .probe("path", "quiet", Circuit.GROUND)
        .solved(CaseName.TEST, Drive.NO_SIGNAL, Map.of());
  }

  @Test
  void hummingThroughAnRcFollowsItsDivider() {
    // |Zc ∥ RL| over the whole chain at 100 Hz: a divider, as in any filter text; the fundamental
    // of
    // a sawtooth of 1 V peak to peak is 1/(π√2) V rms (Fourier).
    double omega = 2 * Math.PI * 100;
    double shunt = 1 / 200.0;
    double susceptance = omega * 1e-3;
    double norm = shunt * shunt + susceptance * susceptance;
    double re = shunt / norm;
    double im = -susceptance / norm;
    double share = Math.hypot(re, im) / Math.hypot(100 + re, im);
    double fromRail = Math.hypot(re, im) / Math.hypot(98 + re, im);
    double[] figures =
        filtered(true)
            .want("supply.adaptor", Quantity.HUM_RMS_VOLTS)
            .want("supply.adaptor", Quantity.RIPPLE_REJECTION_DECIBELS)
            .figures();
    assertThat(figures[0]).isCloseTo(share / Math.PI / Math.sqrt(2), within(1e-7));
    assertThat(figures[1]).isCloseTo(-20 * Math.log10(fromRail), within(1e-6));
  }

  @Test
  void anUnregulatedAdaptorHumsWithItsCurrent() {
    double[] figures =
        filtered(false)
            .want("supply.adaptor", Quantity.HUM_RMS_VOLTS)
            .want("supply.adaptor", Quantity.SUPPLY_AMPERES)
            .figures();
    double full = filtered(true).want("supply.adaptor", Quantity.HUM_RMS_VOLTS).figure();
    assertThat(figures[0]).isCloseTo(full * figures[1] / 0.3, within(1e-9));
  }

  /** A stage that turns the rail's movement round, into an amplifier that loads the rail. */
  private static TrialCircuit loop(double ohms, double tone) {
    TransistorModel model =
        new TransistorModel("T", false, 1e-14, 200, 3, 80, 45, 0.5, 150, 200, 100);
    return new TrialCircuit()
        .battery(9, ohms, "cell")
        .seam("rail", "cell", "rail-main")
        .capacitor("supply.c", 100e-6, "rail-main", Circuit.GROUND)
        .resistor("pre.up", 33e3, "rail-main", "base")
        .resistor("pre.down", 10e3, "base", Circuit.GROUND)
        .resistor("pre.rc", 4.7e3, "rail-main", "collector")
        .resistor("pre.re", 1e3, "emitter", Circuit.GROUND)
        .capacitor("pre.ce", 100e-6, "emitter", Circuit.GROUND)
        .part(
            "pre.t",
            new BipolarTransistor(model),
            Map.of(
                Terminal.BASE, "base",
                Terminal.COLLECTOR, "collector",
                Terminal.EMITTER, "emitter"))
        .capacitor("pre.cc", 100e-9, "collector", "in")
        .resistor("pre.rl", 47e3, "in", Circuit.GROUND)
        .amplifier(false, 5e-3, new OutputSwing(0.8, 0, 0.8, 0, 0), "in", "rail-main")
        .capacitor("power.c", 470e-6, "plus", "out")
        .resistor("load.r", 8, "out", Circuit.GROUND)
        .solved(CaseName.TEST, Drive.NO_SIGNAL, Map.of(Slot.TONE_HERTZ, tone));
  }

  @Test
  void theLoopSustainsItselfWhereTheRailIsTheNegativeOfTheBatterysResistance() {
    // Nyquist: R·Y = −1. The seam's impedance looking on, solved apart, must be R times the margin.
    double[] figures =
        loop(1e-4, 400)
            .want("supply.battery", Quantity.RAIL_LOOP_MARGIN_DECIBELS)
            .want("supply.battery", Quantity.RAIL_LOOP_HERTZ)
            .figures();
    assertThat(figures[1]).isBetween(0.5, 20e3);
    double onward = loop(1e-4, figures[1]).want("seam.rail", Quantity.ONWARD_OHMS).figure();
    double critical = 1e-4 * Math.pow(10, figures[0] / 20);
    assertThat(critical).isCloseTo(onward, within(onward * 1e-4));
  }

  @Test
  void twiceTheResistanceTakesSixDecibels() {
    double one =
        loop(1e-4, 400).want("supply.battery", Quantity.RAIL_LOOP_MARGIN_DECIBELS).figure();
    double two =
        loop(2e-4, 400).want("supply.battery", Quantity.RAIL_LOOP_MARGIN_DECIBELS).figure();
    assertThat(one - two).isCloseTo(20 * Math.log10(2), within(0.01));
  }

  @Test
  void withoutAStageThatTurnsItRoundNothingSustainsItself() {
    double margin =
        new TrialCircuit()
            .battery(9, 10, "rail-main")
            .capacitor("supply.c", 100e-6, "rail-main", Circuit.GROUND)
            .resistor("load.r", 200, "rail-main", Circuit.GROUND)
            .solved(CaseName.TEST, Drive.NO_SIGNAL, Map.of())
            .want("supply.battery", Quantity.RAIL_LOOP_MARGIN_DECIBELS)
            .figure();
    assertThat(margin).isEqualTo(Double.POSITIVE_INFINITY);
  }

  @Test
  void aBridgeLetsThroughWhatItsDataSheetSays() {
    // The trial amplifier rejects its supply by 100 dB, from rail to load as data sheets give it.
    double rejection =
        adaptor(new TrialCircuit(), true)
            .idealAmplifier(true, 5e-3, "in", "rail")
            .resistor("in.r", 1e3, "in", Circuit.GROUND)
            .resistor("load.r", 16, "plus", "minus")
            .probe("path", "plus", "minus")
            .solved(CaseName.TEST, Drive.NO_SIGNAL, Map.of())
            .want("supply.adaptor", Quantity.RIPPLE_REJECTION_DECIBELS)
            .figure();
    assertThat(rejection).isCloseTo(100, within(0.1));
  }

  /** A detector into an output stage whose battery has ten ohms and no capacitor beside it. */
  private static TrialCircuit playing(boolean bridge) {
    TrialCircuit circuit =
        new TrialCircuit()
            .generator(50, "in")
            .diode("detector.d1", 1e-7, 1.05, 10, "in", "a")
            .capacitor("detector.c", 1e-9, "a", Circuit.GROUND)
            .resistor("detector.r", 22e3, "a", Circuit.GROUND)
            .capacitor("pad.c", 1e-6, "a", "b")
            .resistor("pad.r", 200e3, "b", "c")
            .resistor("pad.r2", 50e3, "c", Circuit.GROUND)
            .battery(9, 10, "rail")
            .idealAmplifier(bridge, 5e-3, "c", "rail")
            .probe("supply.rail", "rail", Circuit.GROUND)
            .signal(3, 0.1, 400);
    return bridge
        ? circuit.resistor("load.r", 16, "plus", "minus")
        : circuit
            .capacitor("power.c", 1e-2, "plus", "out")
            .resistor("load.r", 16, "out", Circuit.GROUND);
  }

  @Test
  void theRailOfOneOutputCarriesTheHarmonicsOfHalfWaves() {
    // Fourier series of a half-wave rectified sine (any handbook): 1/2 at the tone, 2/(3π),
    // 2/(15π),
    // 2/(35π) ... at its even multiples.
    double[] figures =
        playing(false)
            .want("supply.rail", Quantity.SECOND_HARMONIC)
            .want("supply.rail", Quantity.DISTORTION)
            .figures();
    double sum = 0;
    for (int h = 2; h <= 10; h += 2) {
      sum += Math.pow(4 / (Math.PI * (h * h - 1)), 2);
    }
    assertThat(figures[0]).isCloseTo(4 / (3 * Math.PI), within(2e-3));
    assertThat(figures[1]).isCloseTo(Math.sqrt(sum), within(2e-3));
  }

  @Test
  void theRailOfABridgeCarriesTwiceTheToneOnly() {
    // Full-wave rectified: each half wave is one output's.
    double[] figures =
        playing(true)
            .want("supply.rail", Quantity.SECOND_HARMONIC)
            .want("supply.rail", Quantity.AUDIO_RMS_VOLTS)
            .figures();
    assertThat(figures[1]).isLessThan(1e-3);
    assertThat(figures[0]).isGreaterThan(10);
  }
}
