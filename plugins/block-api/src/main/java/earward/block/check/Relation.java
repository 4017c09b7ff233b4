package earward.block.check;

/** How a figure must stand to its limit. */
public enum Relation {
  AT_MOST,
  AT_LEAST;

  /** Whether the figure stands as it must; never true of a figure that is not a number. */
  public boolean holds(double figure, double limit) {
    return switch (this) {
      case AT_MOST -> figure <= limit;
      case AT_LEAST -> figure >= limit;
    };
  }
}
