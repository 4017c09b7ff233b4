package earward.timing;

import java.io.IOException;
import java.lang.management.ManagementFactory;
import java.lang.management.ThreadMXBean;

/**
 * The batch figures of one of a thousand perturbed kits through one compiled solver, warm, by the
 * time that the thread has had on its core: what else the machine does is not in it.
 *
 * @param kit the starter kit
 */
record OneKit(String kit) implements Bar {
  /** 10,000 kits in 2 s on two cores. */
  private static final double LIMIT_SECONDS = 0.4e-3;

  /** On a machine with other work caches are not its own: a quick run may take five times that. */
  private static final double SLACK = 5;

  private static final int ROUNDS = 5;
  private static final double NANOS = 1e9;

  @Override
  public String name() {
    return "the batch figures of one of a thousand perturbed kits of " + kit;
  }

  @Override
  public Timed measure(boolean quick) throws IOException {
    return new Timed(name(), seconds(quick), quick ? LIMIT_SECONDS * SLACK : LIMIT_SECONDS);
  }

  /** The best of some rounds after one that is not counted. */
  double seconds(boolean quick) throws IOException {
    ThreadMXBean threads = ManagementFactory.getThreadMXBean();
    PerturbedKits kits = new PerturbedKits();
    kits.name = kit;
    kits.all = false;
    kits.compile();
    try {
      double best = Double.POSITIVE_INFINITY;
      for (int round = 0; round <= (quick ? 2 : ROUNDS); round++) {
        long start = threads.getCurrentThreadCpuTime();
        for (int i = 0; i < PerturbedKits.KITS; i++) {
          var unused = kits.oneKit();
        }
        double here = (threads.getCurrentThreadCpuTime() - start) / NANOS / PerturbedKits.KITS;
        best = round == 0 ? best : Math.min(best, here);
      }
      return best;
    } finally {
      kits.close();
    }
  }
}
