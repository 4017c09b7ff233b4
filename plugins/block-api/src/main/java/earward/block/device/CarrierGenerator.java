package earward.block.device;

import earward.block.quantity.Unit;
import java.util.List;

/**
 * An untuned feed: the e.m.f. E(t)·cos ωc·t behind a source resistance. It stands for the front end
 * and is not fitted. The carrier's level, depth and tone belong to the case.
 *
 * <p>Terminals: TOP, BOTTOM.
 *
 * @param sourceOhms resistance behind which the e.m.f. stands, above 0
 */
public record CarrierGenerator(double sourceOhms) implements Device {
  public CarrierGenerator {
    Require.above(0, sourceOhms, "source resistance (Ω)");
  }

  @Override
  public List<Terminal> terminals() {
    return List.of(Terminal.TOP, Terminal.BOTTOM);
  }

  @Override
  public List<Parameter> parameters() {
    return List.of(Parameter.fixed("source-ohms", Unit.OHM, sourceOhms));
  }

  @Override
  public boolean fitted() {
    return false;
  }
}
