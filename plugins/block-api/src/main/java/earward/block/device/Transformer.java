package earward.block.device;

import earward.block.quantity.Unit;
import java.util.List;

/**
 * An audio transformer: an ideal ratio with magnetising inductance and winding resistances. The
 * secondary may have a tap at its middle; TAP may be left unconnected.
 *
 * <p>Terminals: PRIMARY_START, PRIMARY_END, TOP, TAP, BOTTOM.
 *
 * @param primaryHenries magnetising inductance seen at the primary, above 0
 * @param ratio turns of the whole secondary over those of the primary, above 0
 * @param primaryOhms DC resistance of the primary, at least 0
 * @param secondaryOhms DC resistance of the whole secondary, at least 0
 */
public record Transformer(
    double primaryHenries, double ratio, double primaryOhms, double secondaryOhms)
    implements Device {
  public Transformer {
    Require.above(0, primaryHenries, "primary inductance (H)");
    Require.above(0, ratio, "turns ratio");
    Require.atLeast(0, primaryOhms, "primary resistance (Ω)");
    Require.atLeast(0, secondaryOhms, "secondary resistance (Ω)");
  }

  @Override
  public List<Terminal> terminals() {
    return List.of(
        Terminal.PRIMARY_START, Terminal.PRIMARY_END, Terminal.TOP, Terminal.TAP, Terminal.BOTTOM);
  }

  @Override
  public List<Parameter> parameters() {
    return List.of(
        new Parameter("primary-henries", Unit.HENRY, primaryHenries, ToleranceClass.INDUCTOR),
        Parameter.fixed("ratio", Unit.NUMBER, ratio),
        new Parameter("primary-ohms", Unit.OHM, primaryOhms, ToleranceClass.WINDING),
        new Parameter("secondary-ohms", Unit.OHM, secondaryOhms, ToleranceClass.WINDING));
  }
}
