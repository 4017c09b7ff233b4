package earward.block.device;

import earward.block.quantity.Unit;
import java.util.List;

/**
 * A three-ended series regulator.
 *
 * <p>Terminals: INPUT, GROUND, OUTPUT.
 *
 * @param model its figures
 */
public record Regulator(RegulatorModel model) implements Device {
  @Override
  public List<Terminal> terminals() {
    return List.of(Terminal.INPUT, Terminal.GROUND, Terminal.OUTPUT);
  }

  @Override
  public List<Parameter> parameters() {
    return List.of(
        new Parameter("output-volts", Unit.VOLT, model.outputVolts(), ToleranceClass.SUPPLY),
        Parameter.fixed("drop-out-volts", Unit.VOLT, model.dropOutVolts()),
        Parameter.fixed("quiescent-amperes", Unit.AMPERE, model.quiescentAmperes()));
  }
}
