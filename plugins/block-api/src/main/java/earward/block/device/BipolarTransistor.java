package earward.block.device;

import earward.block.quantity.Unit;
import java.util.List;

/**
 * A bipolar transistor, npn or pnp.
 *
 * <p>Terminals: COLLECTOR, BASE, EMITTER.
 *
 * @param model its figures
 */
public record BipolarTransistor(TransistorModel model) implements Device {
  @Override
  public List<Terminal> terminals() {
    return List.of(Terminal.COLLECTOR, Terminal.BASE, Terminal.EMITTER);
  }

  @Override
  public List<Parameter> parameters() {
    return List.of(
        new Parameter(
            "saturation-amperes",
            Unit.AMPERE,
            model.saturationAmperes(),
            ToleranceClass.SATURATION_CURRENT),
        new Parameter(
            "current-gain", Unit.NUMBER, model.currentGain(), ToleranceClass.CURRENT_GAIN));
  }
}
