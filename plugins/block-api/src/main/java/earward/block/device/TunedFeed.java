package earward.block.device;

import earward.block.quantity.Unit;
import java.util.List;

/**
 * The last IF transformer with the drive current of the stage before it, all referred to the whole
 * winding TOP to BOTTOM without the diode: current into Rp ∥ L ∥ C. The carrier's no-load level at
 * that winding, its depth and its tone belong to the case. Its detuning counts from the peak as the
 * builder finds it, with diode and capacitances in place.
 *
 * <p>Terminals: PRIMARY_START, PRIMARY_END, TOP, TAP, BOTTOM; the drive needs no terminal, so a
 * feed connects TOP and BOTTOM, and TAP where it is used.
 *
 * @param parallelOhms Rp at the winding, above 0
 * @param quality Q without the diode, at least 1
 * @param detuningHertz how far the peak lies above the carrier (negative: below)
 * @param tapFraction share of the winding between TAP and BOTTOM, from 0 to 1
 * @param windingOhms DC resistance TOP to BOTTOM, at least 0
 */
public record TunedFeed(
    double parallelOhms,
    double quality,
    double detuningHertz,
    double tapFraction,
    double windingOhms)
    implements Device {
  public TunedFeed {
    Require.above(0, parallelOhms, "parallel resistance of the winding (Ω)");
    Require.atLeast(1, quality, "Q of the winding");
    Require.within(-1e6, 1e6, detuningHertz, "detuning (Hz)");
    Require.within(0, 1, tapFraction, "tap of the winding");
    Require.atLeast(0, windingOhms, "winding resistance (Ω)");
  }

  @Override
  public List<Terminal> terminals() {
    return List.of(
        Terminal.PRIMARY_START, Terminal.PRIMARY_END, Terminal.TOP, Terminal.TAP, Terminal.BOTTOM);
  }

  @Override
  public List<Parameter> parameters() {
    return List.of(
        new Parameter("parallel-ohms", Unit.OHM, parallelOhms, ToleranceClass.WINDING),
        new Parameter("quality", Unit.NUMBER, quality, ToleranceClass.WINDING),
        Parameter.fixed("detuning-hertz", Unit.HERTZ, detuningHertz),
        Parameter.fixed("tap-fraction", Unit.FRACTION, tapFraction),
        Parameter.fixed("winding-ohms", Unit.OHM, windingOhms));
  }
}
