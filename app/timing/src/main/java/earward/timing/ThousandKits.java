package earward.timing;

import java.io.IOException;

/**
 * A thousand perturbed kits through one compiled solver, one after the other: the time of one, told
 * without a limit. Where a thousand would take too long, as many as go into the time.
 *
 * @param kit the starter kit
 * @param all whether all figures are solved, or those that a batch asks of each kit
 */
record ThousandKits(String kit, boolean all) implements Bar {
  private static final int WARM_UPS = 20;
  private static final double LONGEST_SECONDS = 50;
  private static final double NANOS = 1e9;

  @Override
  public String name() {
    String figures = all ? "all figures" : "the batch figures";
    return figures + " of one of a thousand perturbed kits of " + kit;
  }

  @Override
  public Timed measure(boolean quick) throws IOException {
    int share = quick ? QUICK_SHARE : 1;
    PerturbedKits kits = new PerturbedKits();
    kits.name = kit;
    kits.all = all;
    kits.compile();
    try {
      return timed(kits, PerturbedKits.KITS / share, LONGEST_SECONDS / share);
    } finally {
      kits.close();
    }
  }

  private Timed timed(PerturbedKits kits, int most, double longestSeconds) {
    for (int i = 0; i < WARM_UPS; i++) {
      var unused = kits.oneKit();
    }
    int done = 0;
    double seconds = 0;
    long start = System.nanoTime();
    while (done < most && seconds < longestSeconds) {
      var unused = kits.oneKit();
      done++;
      seconds = (System.nanoTime() - start) / NANOS;
    }
    String told = name() + " (" + done + " solved)";
    return new Timed(told, seconds / done, Double.POSITIVE_INFINITY);
  }
}
