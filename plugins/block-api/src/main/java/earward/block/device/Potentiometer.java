package earward.block.device;

import earward.block.quantity.Unit;
import java.util.ArrayList;
import java.util.List;

/**
 * A potentiometer: one part with three ends, or with a tap of its track four. A trimmer is one too.
 *
 * <p>Terminals: TOP, WIPER, BOTTOM, and TAP where it has one.
 *
 * @param trackOhms resistance from end to end, above 0
 * @param taper its law
 * @param endOhms what is left between wiper and an end at the stop, at least 0
 * @param position of the turn in the nominal kit, from 0 (wiper at BOTTOM) to 1 (wiper at TOP)
 * @param trimmer whether the builder sets it once, with a screwdriver
 * @param tapFraction share of the track's resistance between TAP and BOTTOM, below 1; 0 for no tap
 */
public record Potentiometer(
    double trackOhms,
    Taper taper,
    double endOhms,
    double position,
    boolean trimmer,
    double tapFraction)
    implements Device {
  public Potentiometer {
    Require.above(0, trackOhms, "track (Ω)");
    Require.atLeast(0, endOhms, "end resistance (Ω)");
    Require.within(0, 1, position, "position of the turn");
    Require.within(0, 0.99, tapFraction, "tap of the track");
  }

  /** A track without a tap. */
  public Potentiometer(
      double trackOhms, Taper taper, double endOhms, double position, boolean trimmer) {
    this(trackOhms, taper, endOhms, position, trimmer, 0);
  }

  /** Whether the track has a tap. */
  public boolean tapped() {
    return tapFraction > 0;
  }

  /** A front-panel control with an end resistance of 0.2 % of the track (common practice). */
  public Potentiometer(double trackOhms, Taper taper, double position) {
    this(trackOhms, taper, 0.002 * trackOhms, position, false);
  }

  @Override
  public List<Terminal> terminals() {
    return tapped()
        ? List.of(Terminal.TOP, Terminal.WIPER, Terminal.BOTTOM, Terminal.TAP)
        : List.of(Terminal.TOP, Terminal.WIPER, Terminal.BOTTOM);
  }

  @Override
  public List<Parameter> parameters() {
    List<Parameter> parameters = new ArrayList<>(track());
    if (tapped()) {
      parameters.add(Parameter.fixed("tap-fraction", Unit.FRACTION, tapFraction));
    }
    return List.copyOf(parameters);
  }

  private List<Parameter> track() {
    return List.of(
        new Parameter("track-ohms", Unit.OHM, trackOhms, ToleranceClass.POTENTIOMETER_TRACK),
        new Parameter(
            "fraction-at-half-turn",
            Unit.FRACTION,
            taper.fractionAtHalfTurn(),
            taper == Taper.LINEAR ? ToleranceClass.FIXED : ToleranceClass.POTENTIOMETER_TAPER),
        Parameter.fixed("end-ohms", Unit.OHM, endOhms),
        Parameter.fixed("position", Unit.FRACTION, position));
  }
}
