package earward.block.testkit;

import static earward.block.device.Terminal.BOOTSTRAP;
import static earward.block.device.Terminal.COMPENSATION;
import static earward.block.device.Terminal.CONTROL;
import static earward.block.device.Terminal.GAIN;
import static earward.block.device.Terminal.GROUND;
import static earward.block.device.Terminal.INPUT;
import static earward.block.device.Terminal.INVERTING;
import static earward.block.device.Terminal.INVERTING_TWO;
import static earward.block.device.Terminal.OUTPUT;
import static earward.block.device.Terminal.OUTPUT_TWO;
import static earward.block.device.Terminal.RIPPLE;
import static earward.block.device.Terminal.SUPPLY;

import earward.block.device.AdaptorModel;
import earward.block.device.AmplifierGain;
import earward.block.device.AmplifierModel;
import earward.block.device.AmplifierRatings;
import earward.block.device.AmplifierTraits;
import earward.block.device.BatteryModel;
import earward.block.device.ControlPoint;
import earward.block.device.DiodeMaterial;
import earward.block.device.DiodeModel;
import earward.block.device.FieldEffectModel;
import earward.block.device.LoudspeakerModel;
import earward.block.device.OpAmpModel;
import earward.block.device.OutputSwing;
import earward.block.device.PartKind;
import earward.block.device.PartModel;
import earward.block.device.Pin;
import earward.block.device.RegulatorModel;
import earward.block.device.Terminal;
import earward.block.device.TransistorModel;
import java.util.ArrayList;
import java.util.List;

/**
 * Parts to try a block with, one or more of each kind. They are invented, with figures of a usual
 * size; no data sheet stands behind them, and no figure of a kit comes from them.
 */
public final class SampleParts {
  private static final double NONE = Double.POSITIVE_INFINITY;

  private SampleParts() {}

  /** Samples of a kind, as unlike each other as the kind allows. */
  public static List<PartModel> of(PartKind kind) {
    return switch (kind) {
      case DIODE ->
          List.of(
              DiodeModel.plain("sample Schottky diode", DiodeMaterial.SCHOTTKY, 1e-7, 1.05, 10),
              DiodeModel.plain("sample germanium diode", DiodeMaterial.GERMANIUM, 1e-6, 1.3, 60));
      case AMPLIFIER -> List.of(singleEnded(), bridge(), controlledBridge());
      case LOUDSPEAKER ->
          List.of(
              new LoudspeakerModel("sample loudspeaker", 8, 7.4, 0.1, 1e-4, 240, 4, 1.5, 86, 0.5));
      case BATTERY ->
          List.of(new BatteryModel("sample battery", 9.6, 1.7, 5.4, 10, 0.5, 0.05, 0.1, 10, 0.3));
      case ADAPTOR ->
          List.of(new AdaptorModel("sample adaptor", true, 12, 1, 12.6, 0.1, 0.05, 100));
      case REGULATOR ->
          List.of(new RegulatorModel("sample regulator", 5, 2, 4e-3, 30, 0.5, 0.1, 125, 65));
      case TRANSISTOR ->
          List.of(
              new TransistorModel("sample npn", false, 1e-14, 200, 4, 80, 30, 0.5, 150, 200),
              new TransistorModel("sample pnp", true, 1e-14, 150, 4, 60, 30, 0.5, 150, 200));
      case FIELD_EFFECT_TRANSISTOR ->
          List.of(
              new FieldEffectModel("sample field-effect transistor", false, 5e-3, 2, 25, 150, 300));
      case OP_AMP ->
          List.of(
              new OpAmpModel(
                  "sample op-amp", 1e5, 1e6, 1e6, 100, 1.5, 0.1, 1e-3, 1e-7, 2e-8, 3, 30));
    };
  }

  private static AmplifierModel singleEnded() {
    return amplifier(
        "sample single-ended amplifier",
        new AmplifierGain(50, 6000, 5000, 20e3, 5e-6, List.of()),
        pins(COMPENSATION, GAIN, INPUT, GROUND, OUTPUT, SUPPLY, BOOTSTRAP, RIPPLE));
  }

  /** Pin 5 is not used by the bridge, as in types that are a pair of amplifiers. */
  private static AmplifierModel bridge() {
    return amplifier(
        "sample bridge amplifier",
        new AmplifierGain(90, NONE, 5000, 100e3, 0, List.of()),
        List.of(
            new Pin(1, OUTPUT),
            new Pin(2, SUPPLY),
            new Pin(3, OUTPUT_TWO),
            new Pin(4, GROUND),
            new Pin(5, INVERTING_TWO),
            new Pin(6, GROUND),
            new Pin(7, INPUT),
            new Pin(8, INVERTING)));
  }

  private static AmplifierModel controlledBridge() {
    return amplifier(
        "sample bridge amplifier with DC volume control",
        new AmplifierGain(
            100,
            NONE,
            5000,
            100e3,
            0,
            List.of(new ControlPoint(0.4, -60), new ControlPoint(1.2, 0))),
        pins(SUPPLY, INPUT, GROUND, CONTROL, OUTPUT, GROUND, OUTPUT_TWO));
  }

  private static List<Pin> pins(Terminal... terminals) {
    List<Pin> pins = new ArrayList<>();
    for (Terminal terminal : terminals) {
      pins.add(new Pin(pins.size() + 1, terminal));
    }
    return pins;
  }

  private static AmplifierModel amplifier(String name, AmplifierGain gain, List<Pin> pins) {
    return new AmplifierModel(
        name,
        pins.stream().anyMatch(pin -> pin.terminal() == OUTPUT_TWO),
        gain,
        new OutputSwing(0.8, 1.5, 0.6, 1.2, 1),
        new AmplifierRatings(3, 16, 4, 1.5, 150, 100, 30),
        6e-3,
        0.5,
        0,
        20e3,
        1e-7,
        50,
        30,
        3e-6,
        "DIP-8",
        pins,
        new AmplifierTraits(false, false, 0.4));
  }
}
