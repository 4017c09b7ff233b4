package earward.block.device;

import earward.block.quantity.Unit;
import java.util.List;

/**
 * A junction field-effect transistor.
 *
 * <p>Terminals: DRAIN, GATE, SOURCE.
 *
 * @param model its figures
 */
public record FieldEffectTransistor(FieldEffectModel model) implements Device {
  @Override
  public List<Terminal> terminals() {
    return List.of(Terminal.DRAIN, Terminal.GATE, Terminal.SOURCE);
  }

  @Override
  public List<Parameter> parameters() {
    return List.of(
        new Parameter(
            "saturated-drain-amperes",
            Unit.AMPERE,
            model.saturatedDrainAmperes(),
            ToleranceClass.CURRENT_GAIN),
        new Parameter(
            "pinch-off-volts", Unit.VOLT, model.pinchOffVolts(), ToleranceClass.CURRENT_GAIN));
  }
}
