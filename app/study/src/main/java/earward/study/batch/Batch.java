package earward.study.batch;

import earward.kit.path.Assembly;
import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Deque;
import java.util.List;
import java.util.Queue;
import java.util.concurrent.ConcurrentLinkedQueue;
import java.util.concurrent.ExecutionException;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.Future;

/**
 * Solves many kits of one design. Threads solve pieces of consecutive kits; one thread counts them
 * in the order of their numbers, so that nothing depends on how many threads there are. No more
 * than a few pieces are held at a time.
 */
public final class Batch {
  private static final int KITS_A_PIECE = 16;
  private static final int PIECES_AHEAD = 4;

  private final BatchPlan plan;
  private final BatchOrder order;
  private final Queue<KitRun> idle = new ConcurrentLinkedQueue<>();

  private Batch(BatchPlan plan, BatchOrder order) {
    this.plan = plan;
    this.order = order;
  }

  /**
   * The batch of a complete assembly.
   *
   * @throws earward.engine.CircuitException where the circuit makes no sense to the engine
   */
  public static BatchResult run(Assembly assembly, BatchOrder order, BatchProgress progress) {
    return run(BatchPlan.of(assembly, order.full(), order.habits()), order, progress);
  }

  /** The batch of a plan, whose draw and figures count, whatever the order says of them. */
  public static BatchResult run(BatchPlan plan, BatchOrder order, BatchProgress progress) {
    Batch batch = new Batch(plan, order);
    BatchCount count = new BatchCount(plan, order);
    batch.visit((number, figures) -> count.add(figures), progress);
    return count.result();
  }

  /** Takes the kits of a batch, one after the other. */
  @FunctionalInterface
  public interface Visitor {
    /**
     * One kit.
     *
     * @param number from 0, rising
     * @param figures readings of the plan, then the figures of its checks; empty: no solution
     */
    void kit(long number, double[] figures);
  }

  /** Solves the kits of a plan and hands each to a visitor, in the order of their numbers. */
  public static void each(
      BatchPlan plan, BatchOrder order, BatchProgress progress, Visitor visitor) {
    new Batch(plan, order).visit(visitor, progress);
  }

  private void visit(Visitor visitor, BatchProgress progress) {
    ExecutorService threads = Executors.newFixedThreadPool(order.threads());
    Deque<Future<List<double[]>>> ahead = new ArrayDeque<>();
    try {
      long next = 0;
      long done = 0;
      while (done < order.kits()) {
        while (next < order.kits() && ahead.size() < PIECES_AHEAD * order.threads()) {
          long from = next;
          next = Math.min(order.kits(), from + KITS_A_PIECE);
          long to = next;
          ahead.add(threads.submit(() -> piece(from, to)));
        }
        for (double[] figures : ahead.remove().get()) {
          visitor.kit(done, figures);
          done++;
        }
        if (!progress.goesOn(done, order.kits())) {
          return;
        }
      }
    } catch (InterruptedException e) {
      Thread.currentThread().interrupt();
    } catch (ExecutionException e) {
      throw new IllegalStateException("a kit of the batch failed: " + e.getCause(), e);
    } finally {
      threads.shutdownNow();
    }
  }

  private List<double[]> piece(long from, long to) {
    KitRun found = idle.poll();
    KitRun run = found == null ? new KitRun(plan) : found;
    List<double[]> rows = new ArrayList<>();
    for (long kit = from; kit < to && !Thread.currentThread().isInterrupted(); kit++) {
      rows.add(run.solve(order.seed(), kit));
    }
    idle.add(run);
    return rows;
  }
}
