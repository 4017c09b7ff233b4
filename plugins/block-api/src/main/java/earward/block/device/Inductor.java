package earward.block.device;

import earward.block.quantity.Unit;
import java.util.List;

/**
 * An inductor with its winding resistance.
 *
 * <p>Terminals: A, B.
 *
 * @param henries inductance, above 0
 * @param seriesOhms winding resistance, at least 0
 */
public record Inductor(double henries, double seriesOhms) implements Device {
  public Inductor {
    Require.above(0, henries, "inductance (H)");
    Require.atLeast(0, seriesOhms, "winding resistance (Ω)");
  }

  @Override
  public List<Terminal> terminals() {
    return List.of(Terminal.A, Terminal.B);
  }

  @Override
  public List<Parameter> parameters() {
    return List.of(
        new Parameter("henries", Unit.HENRY, henries, ToleranceClass.INDUCTOR),
        new Parameter("series-ohms", Unit.OHM, seriesOhms, ToleranceClass.WINDING));
  }
}
