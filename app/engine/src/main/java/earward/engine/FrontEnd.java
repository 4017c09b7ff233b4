package earward.engine;

import java.util.List;

/** What the receiver before the kit leaves of a sideband; both sidebands fare alike. */
public sealed interface FrontEnd {
  /** A front end that passes all sidebands alike. */
  FrontEnd FLAT = new Points(List.of());

  /**
   * Share of a sideband's amplitude that is left, relative to the carrier's.
   *
   * @param offsetHertz distance from the carrier, at least 0
   * @param carrierHertz the carrier, above 0
   */
  double share(double offsetHertz, double carrierHertz);

  /**
   * A measured response; straight lines in decibels between its points and on along the last.
   *
   * @param points by rising distance from the carrier; none for a flat response
   */
  record Points(List<Point> points) implements FrontEnd {
    public Points {
      points = List.copyOf(points);
      for (int i = 1; i < points.size(); i++) {
        if (!(points.get(i).offsetHertz() > points.get(i - 1).offsetHertz())) {
          throw new IllegalArgumentException("the points of the front end do not rise");
        }
      }
    }

    @Override
    public double share(double offsetHertz, double carrierHertz) {
      if (points.isEmpty()) {
        return 1;
      }
      double fromHertz = 0;
      double fromDecibels = 0;
      double slope = 0;
      for (int i = 0; i < points.size(); i++) {
        Point to = points.get(i);
        slope = (to.decibels() - fromDecibels) / (to.offsetHertz() - fromHertz);
        if (offsetHertz <= to.offsetHertz() || i == points.size() - 1) {
          break;
        }
        fromHertz = to.offsetHertz();
        fromDecibels = to.decibels();
      }
      return Math.pow(10, (fromDecibels + slope * (offsetHertz - fromHertz)) / 20);
    }
  }

  /**
   * One point of a response.
   *
   * @param offsetHertz distance from the carrier, above 0
   * @param decibels response relative to the carrier
   */
  record Point(double offsetHertz, double decibels) {
    public Point {
      if (!(offsetHertz > 0) || !Double.isFinite(decibels)) {
        throw new IllegalArgumentException(
            "a sideband at " + offsetHertz + " Hz with " + decibels + " dB makes no sense");
      }
    }
  }

  /**
   * Single tuned circuits at the carrier, each uncoupled to the others: |1 + jQ(f/f0 − f0/f)| to
   * the power −n, the mean of both sidebands.
   *
   * <p>Source: universal resonance curve, any radio text (Terman).
   *
   * @param number how many, at least 1
   * @param quality loaded Q of each, above 0
   */
  record TunedCircuits(int number, double quality) implements FrontEnd {
    public TunedCircuits {
      if (number < 1 || !(quality > 0)) {
        throw new IllegalArgumentException(
            number + " tuned circuits of Q " + quality + " make no sense");
      }
    }

    @Override
    public double share(double offsetHertz, double carrierHertz) {
      double upper = one((carrierHertz + offsetHertz) / carrierHertz);
      double lower = one(Math.max(1e-6, (carrierHertz - offsetHertz) / carrierHertz));
      return (upper + lower) / 2;
    }

    private double one(double ratio) {
      double off = quality * (ratio - 1 / ratio);
      return Math.pow(1 + off * off, -number / 2.0);
    }
  }
}
