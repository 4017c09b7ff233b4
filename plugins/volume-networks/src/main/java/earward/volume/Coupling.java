package earward.volume;

import earward.block.Conditions;
import earward.block.check.Check;
import earward.block.check.RemedyHint;
import earward.block.check.Severity;
import earward.block.device.Capacitor;
import earward.block.device.Dielectric;
import earward.block.figure.CaseName;
import earward.block.figure.FigureName;
import earward.block.figure.Quantity;
import earward.block.law.RcEdge;
import earward.block.quantity.Series;
import java.util.List;

/** What the coupling capacitors of a volume network have in common. */
final class Coupling {
  static final double LEAST_FARADS = 1e-9;
  static final double MOST_FARADS = 4.7e-6;
  private static final double FILM_RATED_VOLTS = 63;

  /** How far below the lowest tone one corner of several should lie (common practice). */
  private static final double BELOW_LOWEST_TONE = 2;

  private Coupling() {}

  /** Film throughout: no polarity to mind, whichever way round the detector's DC is. */
  static Capacitor capacitor(double farads) {
    return new Capacitor(farads, Dielectric.FILM, FILM_RATED_VOLTS, 0, 0);
  }

  static Check edgeCheck(String node, Conditions conditions, List<RemedyHint> remedies) {
    return Check.atMost(
        "coupling-edge",
        Severity.WEIGH,
        new FigureName(node, Quantity.LOW_EDGE_HERTZ, CaseName.TEST),
        conditions.lowestToneHertz(),
        "the kit design's own audio band",
        remedies.toArray(RemedyHint[]::new));
  }

  /** The capacitance whose corner with the resistance lies an octave below the lowest tone. */
  static double farads(double ohms, double lowestToneHertz) {
    double least = RcEdge.farads(ohms, lowestToneHertz / BELOW_LOWEST_TONE);
    if (!(least > LEAST_FARADS)) {
      return LEAST_FARADS;
    }
    double fitted = Series.E6.contains(least) ? least : Series.E6.next(least);
    return Math.min(MOST_FARADS, fitted);
  }
}
