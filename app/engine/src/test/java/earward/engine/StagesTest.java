package earward.engine;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import earward.block.device.Adaptor;
import earward.block.device.AdaptorModel;
import earward.block.device.BipolarTransistor;
import earward.block.device.FieldEffectModel;
import earward.block.device.FieldEffectTransistor;
import earward.block.device.OpAmpModel;
import earward.block.device.OperationalAmplifier;
import earward.block.device.Terminal;
import earward.block.device.TransistorModel;
import earward.block.figure.CaseName;
import earward.block.figure.Quantity;
import java.util.Map;
import org.junit.jupiter.api.Test;

/**
 * Transistor and op-amp stages at their real operating point, against worked examples of a
 * handbook: Boylestad and Nashelsky, Electronic Devices and Circuit Theory (values from memory; the
 * book takes 0.7 V and 26 mV, so the saturation current is chosen to give 0.7 V and a few per cent
 * are allowed).
 */
class StagesTest {
  /** Fundamental of the generator's sawtooth of one volt, rms. */
  private static final double GENERATOR = 1 / (Math.PI * Math.sqrt(2));

  private static final double VT = 0.0256926;

  /** A generator of audio: what ripples on an adaptor, at a frequency. */
  private static TrialCircuit generator(TrialCircuit circuit, double hertz, String node) {
    return circuit.part(
        "generator",
        new Adaptor(new AdaptorModel("G", true, 1e-9, 1, 1, 1e-3, 1, hertz)),
        Map.of(Terminal.PLUS, node, Terminal.MINUS, Circuit.GROUND));
  }

  private static TrialCircuit rail(double volts) {
    return new TrialCircuit()
        .battery(volts, 1e-6, "rail")
        .solved(CaseName.TEST, Drive.NO_SIGNAL, Map.of(Slot.TONE_HERTZ, 1e3));
  }

  private static BipolarTransistor transistor(double gain, double amperes) {
    double saturation = amperes * Math.exp(-0.7 / VT);
    return new BipolarTransistor(
        new TransistorModel(
            "T", false, saturation, gain, 1, Double.POSITIVE_INFINITY, 60, 1, 150, 200, 1e-3));
  }

  private static Map<Terminal, String> npn(String collector, String base, String emitter) {
    return Map.of(Terminal.COLLECTOR, collector, Terminal.BASE, base, Terminal.EMITTER, emitter);
  }

  @Test
  void theDividerBiasedStageRestsWhereTheBookSays() {
    // Example 4.7: 22 V, 39 kΩ and 3.9 kΩ, 10 kΩ, 1.5 kΩ, β 140: IC 0.85 mA, VCE 12.22 V.
    double[] figures =
        rail(22)
            .resistor("r1", 39e3, "rail", "base")
            .resistor("r2", 3.9e3, "base", Circuit.GROUND)
            .resistor("rc", 10e3, "rail", "collector")
            .resistor("re", 1.5e3, "emitter", Circuit.GROUND)
            .part("t", transistor(140, 0.85e-3), npn("collector", "base", "emitter"))
            .want("t", Quantity.DC_AMPERES)
            .want("collector", Quantity.DC_VOLTS)
            .want("emitter", Quantity.DC_VOLTS)
            .figures();
    assertThat(figures[0]).isCloseTo(0.85e-3, within(0.005e-3));
    assertThat(figures[1] - figures[2]).isCloseTo(12.22, within(0.08));
  }

  private static TrialCircuit commonEmitter() {
    return generator(rail(22), 1e3, "source")
        .seam("input", "source", "in")
        .capacitor("c1", 1, "in", "base")
        .resistor("r1", 56e3, "rail", "base")
        .resistor("r2", 8.2e3, "base", Circuit.GROUND)
        .resistor("rc", 6.8e3, "rail", "collector")
        .resistor("re", 1.5e3, "emitter", Circuit.GROUND)
        .capacitor("ce", 1, "emitter", Circuit.GROUND)
        .part("t", transistor(90, 1.4e-3), npn("collector", "base", "emitter"))
        .seam("output", "collector", "out")
        .resistor("rl", 1e9, "out", Circuit.GROUND)
        .probe("path", "out", Circuit.GROUND);
  }

  @Test
  void theCommonEmitterStageAmplifiesAsInTheBook() {
    // Example 5.2: 56 kΩ, 8.2 kΩ, 6.8 kΩ, 1.5 kΩ bypassed, 22 V, β 90: re 18.44 Ω, Zi 1.35 kΩ,
    // Zo 6.8 kΩ, Av −368.76. The book leaves the base current out of the divider: that is 5 %.
    double[] figures =
        commonEmitter()
            .want("seam.input", Quantity.ONWARD_OHMS)
            .want("seam.output", Quantity.BACKWARD_OHMS)
            .want("generator", Quantity.HUM_RMS_VOLTS)
            .want("t", Quantity.DC_AMPERES)
            .figures();
    assertThat(figures[3] * 91 / 90).isCloseTo(0.026 / 18.44, within(0.08e-3));
    assertThat(figures[0]).isCloseTo(1350, within(70.0));
    assertThat(figures[1]).isCloseTo(6800, within(1.0));
    assertThat(figures[2] / GENERATOR).isCloseTo(368.76, within(20.0));
    // and exactly: gm·RC with gm = IC/Vt
    assertThat(figures[2] / GENERATOR).isCloseTo(figures[3] / VT * 6800, within(0.05));
  }

  @Test
  void theEmitterFollowerHasTheBooksImpedances() {
    // Emitter-follower example: 12 V, 220 kΩ, 3.3 kΩ, β 100: re 12.61 Ω, Zi 132.72 kΩ, Zo 12.56 Ω,
    // Av 0.996.
    double[] figures =
        generator(rail(12), 1e3, "source")
            .seam("input", "source", "in")
            .capacitor("c1", 1, "in", "base")
            .resistor("rb", 220e3, "rail", "base")
            .resistor("re", 3.3e3, "emitter", Circuit.GROUND)
            .part("t", transistor(100, 2.04e-3), npn("rail", "base", "emitter"))
            .seam("output", "emitter", "out")
            .resistor("rl", 1e9, "out", Circuit.GROUND)
            .probe("path", "out", Circuit.GROUND)
            .want("seam.input", Quantity.ONWARD_OHMS)
            .want("seam.output", Quantity.BACKWARD_OHMS)
            .want("generator", Quantity.HUM_RMS_VOLTS)
            .figures();
    assertThat(figures[0]).isCloseTo(132.72e3, within(1.5e3));
    assertThat(figures[1]).isCloseTo(12.56, within(0.3));
    assertThat(figures[2] / GENERATOR).isCloseTo(0.996, within(0.001));
  }

  @Test
  void theSelfBiasedFieldEffectStageIsTheBooks() {
    // Self-bias example: IDSS 8 mA, VP −6 V, RD 3.3 kΩ, RS 1 kΩ, 20 V: VGS −2.6 V, ID 2.6 mA,
    // VD 11.42 V; bypassed, gm = 1.51 mS: Av −gm·RD = −4.98, Zo 3.3 kΩ.
    double[] figures =
        generator(rail(20), 1e3, "source")
            .capacitor("c1", 1, "source", "gate")
            .resistor("rg", 1e6, "gate", Circuit.GROUND)
            .resistor("rd", 3.3e3, "rail", "drain")
            .resistor("rs", 1e3, "lead", Circuit.GROUND)
            .capacitor("cs", 1, "lead", Circuit.GROUND)
            .part(
                "j",
                new FieldEffectTransistor(new FieldEffectModel("J", false, 8e-3, 6, 30, 150, 300)),
                Map.of(Terminal.GATE, "gate", Terminal.DRAIN, "drain", Terminal.SOURCE, "lead"))
            .seam("output", "drain", "out")
            .resistor("rl", 1e9, "out", Circuit.GROUND)
            .probe("path", "out", Circuit.GROUND)
            .want("j", Quantity.DC_AMPERES)
            .want("drain", Quantity.DC_VOLTS)
            .want("generator", Quantity.HUM_RMS_VOLTS)
            .want("seam.output", Quantity.BACKWARD_OHMS)
            .figures();
    assertThat(figures[0]).isCloseTo(2.6e-3, within(0.02e-3));
    assertThat(figures[1]).isCloseTo(11.42, within(0.06));
    assertThat(figures[2] / GENERATOR).isCloseTo(4.98, within(0.03));
    assertThat(figures[3]).isCloseTo(3300, within(0.5));
  }

  private static TrialCircuit nonInverting(double hertz, double bias) {
    OpAmpModel model = new OpAmpModel("O", 1e5, 1e6, 1e12, 100, 1, 1, 1e-3, bias, 0, 3, 40);
    return generator(rail(20), hertz, "source")
        .capacitor("c1", 1, "source", "in")
        .resistor("up", 10e3, "rail", "in")
        .resistor("down", 10e3, "in", Circuit.GROUND)
        .resistor("rf", 90e3, "out", "inverting")
        .resistor("rg", 10e3, "inverting", "bottom")
        .capacitor("cg", 1, "bottom", Circuit.GROUND)
        .part(
            "o",
            new OperationalAmplifier(model),
            Map.of(
                Terminal.INPUT, "in",
                Terminal.INVERTING, "inverting",
                Terminal.OUTPUT, "out",
                Terminal.SUPPLY, "rail",
                Terminal.GROUND, Circuit.GROUND))
        .seam("output", "out", "far")
        .resistor("rl", 1e9, "far", Circuit.GROUND)
        .probe("path", "far", Circuit.GROUND);
  }

  @Test
  void theNonInvertingStageHasTheGainOfItsTwoResistors() {
    // 1 + Rf/Rg less one part in A/gain, and Ro/(1 + A/gain) at its output (any op-amp text).
    double[] figures =
        nonInverting(1, 0)
            .want("generator", Quantity.HUM_RMS_VOLTS)
            .want("out", Quantity.DC_VOLTS)
            .figures();
    assertThat(figures[0] / GENERATOR).isCloseTo(10 / (1 + 10 / 1e5), within(2e-3));
    assertThat(figures[1]).isCloseTo(10, within(1e-3));
    double loop = 1e5 / 10 / Math.hypot(1, 1e3 / (1e6 / 1e5));
    double ohms = nonInverting(1e3, 0).want("seam.output", Quantity.BACKWARD_OHMS).figure();
    assertThat(ohms).isCloseTo(100 / loop, within(0.02 * 100 / loop));
  }

  @Test
  void itsBandEndsAtTheGainBandwidthProductOverItsGain() {
    // 1 MHz over 10: at 100 kHz the gain has fallen by 3.01 dB (any op-amp text).
    double low = nonInverting(100, 0).want("generator", Quantity.HUM_RMS_VOLTS).figure();
    double edge = nonInverting(100e3, 0).want("generator", Quantity.HUM_RMS_VOLTS).figure();
    assertThat(20 * Math.log10(low / edge)).isCloseTo(3.01, within(0.02));
  }

  @Test
  void itsBiasCurrentFallsAcrossItsResistors() {
    // Output offset Ib·(Rf − Rsource): DC gain 1, both inputs draw alike (any op-amp text).
    double quiet = nonInverting(1e3, 0).want("out", Quantity.DC_VOLTS).figure();
    double biased = nonInverting(1e3, 1e-6).want("out", Quantity.DC_VOLTS).figure();
    assertThat(biased - quiet).isCloseTo(1e-6 * (90e3 - 5e3), within(1e-4));
  }
}
