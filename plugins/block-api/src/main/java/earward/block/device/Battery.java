package earward.block.device;

import earward.block.quantity.Unit;
import java.util.List;

/**
 * A battery: an e.m.f. behind its internal resistance. Which state of charge holds belongs to the
 * case; the nominal parameters are those of a new one.
 *
 * <p>Terminals: PLUS, MINUS.
 *
 * @param model its figures
 */
public record Battery(BatteryModel model) implements Device {
  @Override
  public List<Terminal> terminals() {
    return List.of(Terminal.PLUS, Terminal.MINUS);
  }

  @Override
  public List<Parameter> parameters() {
    return List.of(
        new Parameter("volts", Unit.VOLT, model.newVolts(), ToleranceClass.SUPPLY),
        new Parameter("internal-ohms", Unit.OHM, model.newOhms(), ToleranceClass.FIXED));
  }
}
