package earward.block.device;

import earward.block.quantity.Unit;
import java.util.List;

/**
 * A mains adaptor: an e.m.f. behind its internal resistance, such that its rated voltage stands at
 * its rated current.
 *
 * <p>Terminals: PLUS, MINUS.
 *
 * @param model its figures
 */
public record Adaptor(AdaptorModel model) implements Device {
  @Override
  public List<Terminal> terminals() {
    return List.of(Terminal.PLUS, Terminal.MINUS);
  }

  @Override
  public List<Parameter> parameters() {
    double electromotiveVolts =
        model.ratedVolts() + (model.regulated() ? 0 : model.ratedAmperes() * model.internalOhms());
    return List.of(
        new Parameter("volts", Unit.VOLT, electromotiveVolts, ToleranceClass.SUPPLY),
        Parameter.fixed("internal-ohms", Unit.OHM, model.internalOhms()));
  }
}
