package earward.block.device;

import static earward.block.Refused.refused;
import static org.assertj.core.api.Assertions.assertThat;

import earward.block.quantity.Unit;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.DynamicTest;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.TestFactory;

class DevicesRefuseTest {
  private static final double NAN = Double.NaN;

  @TestFactory
  Stream<DynamicTest> impossiblePassiveParts() {
    return Stream.of(
        refused("no ohms", () -> new Resistor(0), "resistance (Ω) is 0.0", "above 0"),
        refused("ohms that are no number", () -> new Resistor(NAN), "resistance (Ω)"),
        refused("no watts", () -> new Resistor(1, 0), "rated dissipation (W)"),
        refused("no farads", () -> Capacitor.of(-1e-9, 63), "capacitance (F) is -1.0E-9"),
        refused("no volts", () -> Capacitor.of(1e-9, 0), "rated voltage (V)"),
        refused(
            "negative leakage",
            () -> new Capacitor(1e-9, Dielectric.FILM, 63, 0, -1),
            "leakage (A)"),
        refused(
            "negative series resistance",
            () -> new Capacitor(1e-9, Dielectric.FILM, 63, -1, 0),
            "series resistance (Ω)"),
        refused("no henries", () -> new Inductor(0, 1), "inductance (H)"),
        refused("negative winding", () -> new Inductor(1, -1), "winding resistance (Ω)"),
        refused("no track", () -> new Potentiometer(0, Taper.LINEAR, 0.5), "track (Ω)"),
        refused(
            "turned beyond its stop",
            () -> new Potentiometer(1e3, Taper.LINEAR, 1.01),
            "position of the turn is 1.01",
            "from 0.0 to 1.0"),
        refused(
            "negative end resistance",
            () -> new Potentiometer(1e3, Taper.LINEAR, -1, 0.5, false),
            "end resistance (Ω)"),
        refused("beyond the turn", () -> Taper.LINEAR.fractionBelowWiper(-0.1), "position"),
        refused("no contact", () -> new Switch(true, 0), "contact resistance (Ω)"),
        refused("no rated current", () -> new Fuse(0, 1), "rated current (A)"),
        refused("no cold resistance", () -> new Fuse(1, 0), "cold resistance (Ω)"),
        refused("no coil", () -> new MeterMovement(0, 1e-3), "coil resistance (Ω)"),
        refused("no full scale", () -> new MeterMovement(1e3, 0), "full-scale current (A)"),
        refused("no primary", () -> new Transformer(0, 1, 1, 1), "primary inductance (H)"),
        refused("no ratio", () -> new Transformer(1, 0, 1, 1), "turns ratio"),
        refused("negative primary", () -> new Transformer(1, 1, -1, 1), "primary resistance (Ω)"),
        refused(
            "negative secondary", () -> new Transformer(1, 1, 1, -1), "secondary resistance (Ω)"));
  }

  @TestFactory
  Stream<DynamicTest> impossibleFeedsAndSinks() {
    AmplifierModel model = amplifier(false, PINS);
    return Stream.of(
        refused("no source", () -> new CarrierGenerator(0), "source resistance (Ω)"),
        refused("no Rp", () -> new TunedFeed(0, 40, 0, 1, 1), "parallel resistance"),
        refused("a Q below 1", () -> new TunedFeed(1e3, 0.5, 0, 1, 1), "Q of the winding is 0.5"),
        refused("far off tune", () -> new TunedFeed(1e3, 40, 2e6, 1, 1), "detuning (Hz)"),
        refused("a tap outside", () -> new TunedFeed(1e3, 40, 0, 1.5, 1), "tap of the winding"),
        refused("a negative winding", () -> new TunedFeed(1e3, 40, 0, 1, -1), "winding resistance"),
        refused("no heat sink at all", () -> new AudioAmplifier(model, 0), "heat sink (K/W)"),
        refused("pin nought", () -> new Pin(0, Terminal.INPUT), "pin number", "found 0"),
        refused("a parameter", () -> Parameter.fixed("x", Unit.OHM, NAN), "parameter x"));
  }

  @TestFactory
  Stream<DynamicTest> impossibleAmplifiers() {
    return Stream.of(
        refused("no name", () -> amplifier(" ", false, PINS), "amplifier has no name"),
        refused(
            "no output pin",
            () -> amplifier(false, PINS.subList(0, 3)),
            "sample has no pin for OUTPUT"),
        refused("a bridge of one output", () -> amplifier(true, PINS), "OUTPUT_TWO"),
        refused(
            "gain from outside without the pin",
            () ->
                amplifier(
                    "sample",
                    new AmplifierGain(50, 6e3, 5e3, 20e3, 0, List.of()),
                    0.5,
                    30,
                    false,
                    PINS),
            "set from outside",
            "GAIN"),
        refused(
            "rest above the supply",
            () -> amplifier("sample", FIXED_GAIN, 1.2, 30, false, PINS),
            "rest voltage"),
        refused(
            "less rejection with the capacitor than without",
            () -> amplifier("sample", FIXED_GAIN, 0.5, 60, false, PINS),
            "ripple rejection"),
        refused(
            "no gain", () -> new AmplifierGain(0, 6e3, 5e3, 20e3, 0, List.of()), "fixed gain is 0"),
        refused(
            "no loop gain",
            () -> new AmplifierGain(50, 6e3, 1, 20e3, 0, List.of()),
            "open-loop gain"),
        refused(
            "a control curve that turns back",
            () ->
                new AmplifierGain(
                    50,
                    6e3,
                    5e3,
                    20e3,
                    0,
                    List.of(new ControlPoint(1, -20), new ControlPoint(0.9, 0))),
            "control voltage (V) is 0.9",
            "above 1.0"),
        refused("a gain from nothing", () -> new OutputSwing(-0.1, 0, 0, 0, 0), "lost voltage up"),
        refused(
            "an absolute maximum below the lowest supply",
            () -> new AmplifierRatings(5, 4, 8, 1, 150, 100, 30),
            "absolute maximum supply (V) is 4.0",
            "above 5.0"),
        refused(
            "a junction that bears nothing",
            () -> new AmplifierRatings(3, 16, 4, 1, 25, 100, 30),
            "highest junction temperature"));
  }

  @TestFactory
  Stream<DynamicTest> impossibleModels() {
    DiodeMaterial schottky = DiodeMaterial.SCHOTTKY;
    return Stream.of(
        refused("a diode without name", () -> DiodeModel.plain("", schottky, 1e-7, 1, 10), "name"),
        refused(
            "no saturation current",
            () -> DiodeModel.plain("BAT46", schottky, 0, 1, 10),
            "BAT46: saturation current (A) is 0.0"),
        refused(
            "an emission coefficient of 5",
            () -> DiodeModel.plain("BAT46", schottky, 1e-7, 5, 10),
            "emission coefficient is 5.0",
            "from 0.9 to 3"),
        refused(
            "a band that misses its middle",
            () -> new DiodeModel("x", schottky, 1e-7, 2e-7, 3e-7, 1, 1, 0, 0.5, 0.5, 1e9, 50, 0),
            "least saturation current"),
        refused(
            "a grading exponent of 1",
            () -> new DiodeModel("x", schottky, 1e-7, 1e-8, 3e-7, 1, 1, 0, 0.5, 1, 1e9, 50, 0),
            "grading exponent"),
        refused(
            "a battery that rises",
            () -> new BatteryModel("9 V block", 5.4, 1.7, 9.6, 10, 0.5, 0.05, 0.1, 10, 0.3),
            "9 V block: voltage when new (V) is 5.4",
            "above 9.6"),
        refused(
            "a highest voltage below that of a new one",
            () -> new BatteryModel("9 V block", 9.6, 1.7, 5.4, 10, 0.5, 0.05, 0.1, 9, 0.3),
            "highest voltage (V)"),
        refused(
            "an adaptor that sags without load",
            () -> new AdaptorModel("12 V", false, 12, 1, 11, 0.1, 0.05, 100),
            "unloaded voltage (V) is 11.0",
            "at least 12.0"),
        refused(
            "a regulator above its input",
            () -> new RegulatorModel("5 V", 5, 2, 4e-3, 5, 0.5, 0.1, 125, 65),
            "highest input (V)"),
        refused(
            "a loudspeaker without resonance",
            () -> new LoudspeakerModel("8 ohm", 8, 7.4, 0.1, 1e-4, 0, 4, 1.5, 86, 0.5),
            "resonance (Hz)"),
        refused(
            "a loudspeaker louder than a jet",
            () -> new LoudspeakerModel("8 ohm", 8, 7.4, 0.1, 1e-4, 240, 4, 1.5, 186, 0.5),
            "sensitivity (dB)"),
        refused(
            "a transistor without gain",
            () -> new TransistorModel("npn", false, 1e-14, 0, 4, 80, 30, 0.5, 150, 200),
            "npn: current gain"),
        refused(
            "a transistor that never pinches off",
            () -> new FieldEffectModel("jfet", false, 5e-3, 0, 25, 150, 300),
            "pinch-off voltage"),
        refused(
            "an op-amp without gain",
            () -> new OpAmpModel("op", 1, 1e6, 1e6, 100, 1.5, 0.1, 1e-3, 1e-7, 2e-8, 3, 30),
            "open-loop gain"));
  }

  private static final AmplifierGain FIXED_GAIN =
      new AmplifierGain(50, Double.POSITIVE_INFINITY, 5e3, 20e3, 0, List.of());
  private static final List<Pin> PINS =
      List.of(
          new Pin(1, Terminal.INPUT),
          new Pin(2, Terminal.SUPPLY),
          new Pin(3, Terminal.GROUND),
          new Pin(4, Terminal.OUTPUT));

  private static AmplifierModel amplifier(boolean bridge, List<Pin> pins) {
    return amplifier("sample", bridge, pins);
  }

  private static AmplifierModel amplifier(String name, boolean bridge, List<Pin> pins) {
    return amplifier(name, FIXED_GAIN, 0.5, 30, bridge, pins);
  }

  private static AmplifierModel amplifier(
      String name,
      AmplifierGain gain,
      double restFraction,
      double bareRejection,
      boolean bridge,
      List<Pin> pins) {
    return new AmplifierModel(
        name,
        bridge,
        gain,
        new OutputSwing(0.8, 1.5, 0.6, 1.2, 1),
        new AmplifierRatings(3, 16, 4, 1.5, 150, 100, 30),
        6e-3,
        restFraction,
        0,
        20e3,
        1e-7,
        50,
        bareRejection,
        3e-6,
        "DIP-8",
        pins);
  }

  @Test
  void everyParameterNameIsOfItsOwnAndEveryTerminalToo() {
    List<Device> devices =
        List.of(
            new Resistor(1),
            Capacitor.of(1e-6, 25),
            new Inductor(1, 1),
            new Diode(DiodeModel.plain("x", DiodeMaterial.SILICON, 1e-9, 1.7, 1)),
            new Potentiometer(1e3, Taper.AUDIO_10, 0.5),
            new CarrierGenerator(50),
            new TunedFeed(1e3, 40, 0, 1, 1),
            new Transformer(1, 1, 1, 1),
            new AudioAmplifier(amplifier(false, PINS)),
            Switch.closedInUse(),
            new Fuse(1, 0.1),
            new MeterMovement(1e3, 1e-3));
    for (Device device : devices) {
      assertThat(device.parameters()).extracting(Parameter::name).doesNotHaveDuplicates();
      assertThat(device.terminals()).doesNotHaveDuplicates().isNotEmpty();
      assertThat(device.pins()).extracting(Pin::number).doesNotHaveDuplicates();
    }
  }
}
