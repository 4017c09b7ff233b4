package earward.study.batch;

/**
 * What is taken for granted of kits and their builders, beside the tolerances of the design. All of
 * it is judgement (common practice), and the results of a batch state it.
 *
 * @param kitsPerLot kits whose like parts come from one bag, at least 1
 * @param lotShare share of a tolerance that all parts of one bag have in common, from 0 to 1
 * @param batteryUsed most that the builder's battery has been used up, from 0 (new) to 1 (its end)
 * @param ambientKelvin how far the room may lie to both sides of the usual ambient, at least 0
 */
public record Habits(int kitsPerLot, double lotShare, double batteryUsed, double ambientKelvin) {
  /** Bags for 50 kits with 30 % in common, a battery used up by a fifth, a room within 5 K. */
  public static final Habits USUAL = new Habits(50, 0.3, 0.2, 5);

  /** No lots, new batteries, one temperature: the tolerances alone. */
  public static final Habits NONE = new Habits(1, 0, 0, 0);

  public Habits {
    if (kitsPerLot < 1) {
      throw new IllegalArgumentException("a lot is of " + kitsPerLot + " kits; wanted at least 1");
    }
    requireShare(lotShare, "share of a lot");
    requireShare(batteryUsed, "most that a battery is used up");
    if (!(ambientKelvin >= 0) || Double.isInfinite(ambientKelvin)) {
      throw new IllegalArgumentException(
          "the ambient differs by " + ambientKelvin + " K; wanted at least 0");
    }
  }

  private static void requireShare(double share, String what) {
    if (!(share >= 0 && share <= 1)) {
      throw new IllegalArgumentException(what + " is " + share + "; it must be from 0 to 1");
    }
  }
}
