package earward.block.device;

import earward.block.quantity.Unit;
import java.util.List;

/**
 * A switch, or the switching contact of a jack.
 *
 * <p>Terminals: A, B.
 *
 * @param closed whether it is closed in use
 * @param contactOhms resistance when closed, above 0
 */
public record Switch(boolean closed, double contactOhms) implements Device {
  public Switch {
    Require.above(0, contactOhms, "contact resistance (Ω)");
  }

  /** A closed contact of 20 mΩ (common practice). */
  public static Switch closedInUse() {
    return new Switch(true, 0.02);
  }

  @Override
  public List<Terminal> terminals() {
    return List.of(Terminal.A, Terminal.B);
  }

  @Override
  public List<Parameter> parameters() {
    double offOhms = 1e9;
    return List.of(Parameter.fixed("ohms", Unit.OHM, closed ? contactOhms : offOhms));
  }
}
