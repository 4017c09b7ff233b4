package earward.block.device;

import earward.block.quantity.Unit;
import java.util.List;

/**
 * A resistor, by Ohm's law.
 *
 * <p>Terminals: A, B.
 *
 * @param ohms resistance, above 0
 * @param ratedWatts dissipation that it bears, above 0
 */
public record Resistor(double ohms, double ratedWatts) implements Device {
  private static final double USUAL_WATTS = 0.25;

  public Resistor {
    Require.above(0, ohms, "resistance (Ω)");
    Require.above(0, ratedWatts, "rated dissipation (W)");
  }

  /** A quarter-watt resistor. */
  public Resistor(double ohms) {
    this(ohms, USUAL_WATTS);
  }

  @Override
  public List<Terminal> terminals() {
    return List.of(Terminal.A, Terminal.B);
  }

  @Override
  public List<Parameter> parameters() {
    return List.of(new Parameter("ohms", Unit.OHM, ohms, ToleranceClass.RESISTOR));
  }
}
