package earward.block.device;

import earward.block.quantity.Unit;
import java.util.List;

/**
 * A moving-coil meter built into the kit, such as a tuning meter.
 *
 * <p>Terminals: A, B.
 *
 * @param coilOhms resistance, above 0
 * @param fullScaleAmperes current at full scale, above 0
 */
public record MeterMovement(double coilOhms, double fullScaleAmperes) implements Device {
  public MeterMovement {
    Require.above(0, coilOhms, "coil resistance (Ω)");
    Require.above(0, fullScaleAmperes, "full-scale current (A)");
  }

  @Override
  public List<Terminal> terminals() {
    return List.of(Terminal.A, Terminal.B);
  }

  @Override
  public List<Parameter> parameters() {
    return List.of(new Parameter("coil-ohms", Unit.OHM, coilOhms, ToleranceClass.WINDING));
  }
}
