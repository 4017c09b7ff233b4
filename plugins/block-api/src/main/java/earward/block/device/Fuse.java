package earward.block.device;

import earward.block.quantity.Unit;
import java.util.List;

/**
 * A fuse.
 *
 * <p>Terminals: A, B.
 *
 * @param ratedAmperes rated current, above 0
 * @param coldOhms resistance, above 0
 */
public record Fuse(double ratedAmperes, double coldOhms) implements Device {
  public Fuse {
    Require.above(0, ratedAmperes, "rated current (A)");
    Require.above(0, coldOhms, "cold resistance (Ω)");
  }

  @Override
  public List<Terminal> terminals() {
    return List.of(Terminal.A, Terminal.B);
  }

  @Override
  public List<Parameter> parameters() {
    return List.of(Parameter.fixed("ohms", Unit.OHM, coldOhms));
  }
}
