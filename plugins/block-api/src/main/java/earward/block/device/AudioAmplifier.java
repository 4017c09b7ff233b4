package earward.block.device;

import earward.block.quantity.Unit;
import java.util.List;

/**
 * An audio power amplifier IC as fitted.
 *
 * <p>Terminals: those of its model's pins.
 *
 * @param model its data
 * @param heatSinkKelvinPerWatt thermal resistance of the heat sink with its interface, above 0,
 *     infinite for none
 */
public record AudioAmplifier(AmplifierModel model, double heatSinkKelvinPerWatt) implements Device {
  public AudioAmplifier {
    Require.above(0, heatSinkKelvinPerWatt, "heat sink (K/W)");
  }

  /** Without a heat sink. */
  public AudioAmplifier(AmplifierModel model) {
    this(model, Double.POSITIVE_INFINITY);
  }

  @Override
  public List<Terminal> terminals() {
    return model.pins().stream().map(Pin::terminal).distinct().toList();
  }

  @Override
  public List<Pin> pins() {
    return model.pins();
  }

  @Override
  public List<Parameter> parameters() {
    return List.of(
        new Parameter("gain", Unit.NUMBER, model.gain().fixedGain(), ToleranceClass.AMPLIFIER_GAIN),
        new Parameter(
            "feedback-ohms", Unit.OHM, model.gain().feedbackOhms(), ToleranceClass.AMPLIFIER_GAIN),
        new Parameter(
            "quiescent-amperes",
            Unit.AMPERE,
            model.quiescentAmperes(),
            ToleranceClass.QUIESCENT_CURRENT),
        Parameter.fixed("rest-fraction", Unit.FRACTION, model.restFraction()),
        Parameter.fixed("input-ohms", Unit.OHM, model.inputOhms()),
        Parameter.fixed("bias-amperes", Unit.AMPERE, model.biasAmperes()),
        Parameter.fixed("heat-sink", Unit.KELVIN_PER_WATT, heatSinkKelvinPerWatt));
  }
}
