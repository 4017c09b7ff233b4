package earward.study.batch;

/** How one value differs from kit to kit. */
public sealed interface Spread {
  /**
   * The value of a draw.
   *
   * @param draw from −1 (one end) to 1 (the other)
   */
  double at(double draw);

  /** The same with its width multiplied by a factor, at least 0. */
  Spread scaled(double factor);

  /**
   * Evenly within a share to both sides: a maker promises no more than the ends.
   *
   * @param nominal the nominal value
   * @param share from 0 to below 1
   */
  record Within(double nominal, double share) implements Spread {
    public Within {
      if (!(share >= 0 && share < 1)) {
        throw new IllegalArgumentException(
            "a spread of " + share + " to both sides makes no sense; wanted from 0 to below 1");
      }
    }

    @Override
    public double at(double draw) {
      return nominal * (1 + share * draw);
    }

    @Override
    public Spread scaled(double factor) {
      return new Within(nominal, Math.min(0.99, share * factor));
    }
  }

  /**
   * Evenly in the logarithm between two ends: what spreads by factors, as saturation currents do.
   *
   * @param least above 0
   * @param most at least the least
   */
  record Band(double least, double most) implements Spread {
    public Band {
      if (!(least > 0 && most >= least) || Double.isInfinite(most)) {
        throw new IllegalArgumentException(
            "a band from " + least + " to " + most + " makes no sense; wanted 0 < least <= most");
      }
    }

    @Override
    public double at(double draw) {
      return least * Math.pow(most / least, (draw + 1) / 2);
    }

    @Override
    public Spread scaled(double factor) {
      double middle = Math.sqrt(least * most);
      double half = Math.pow(most / least, factor / 2);
      return new Band(middle / half, middle * half);
    }
  }
}
