package earward.study.faults;

import earward.kit.design.Bench;
import earward.kit.path.Assembly;
import earward.study.batch.BatchProgress;
import earward.study.limits.Meter;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Queue;
import java.util.concurrent.ConcurrentLinkedQueue;
import java.util.concurrent.ExecutionException;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.Future;

/** Solves every fault of a kit and groups them by what a builder can tell apart. */
public final class FaultStudy {
  private final FaultSolver solver;
  private final FaultOrder order;
  private final Queue<FaultSolver.OneThread> idle = new ConcurrentLinkedQueue<>();

  private FaultStudy(FaultSolver solver, FaultOrder order) {
    this.solver = solver;
    this.order = order;
  }

  /**
   * The fault guide of a complete assembly; without groups where it was ended early.
   *
   * @param progress counts faults and healthy kits together
   * @throws earward.engine.CircuitException where the circuit makes no sense to the engine
   */
  public static FaultGuide of(Assembly assembly, FaultOrder order, BatchProgress progress) {
    return of(new FaultSolver(assembly, order.habits()), order, progress);
  }

  /** The same of faults that are compiled already. */
  public static FaultGuide of(FaultSolver solver, FaultOrder order, BatchProgress progress) {
    return new FaultStudy(solver, order).guide(progress);
  }

  private FaultGuide guide(BatchProgress progress) {
    List<Fault> faults = solver.faults();
    ExecutorService threads = Executors.newFixedThreadPool(order.threads());
    try {
      List<Future<Signs>> asked = new ArrayList<>();
      asked.add(threads.submit(() -> signs(solver.draw().nominal(), List.of())));
      for (Fault fault : faults) {
        asked.add(threads.submit(() -> signs(solver.draw().nominal(), List.of(fault.values()))));
      }
      for (int kit = 0; kit < order.spreadKits(); kit++) {
        double[] values = solver.draw().nominal();
        solver.draw().draw(order.seed(), kit, values);
        asked.add(threads.submit(() -> signs(values, List.of())));
      }
      List<Signs> found = new ArrayList<>();
      for (Future<Signs> each : asked) {
        found.add(each.get());
        if (!progress.goesOn(found.size(), asked.size())) {
          return grouped(faults, found.get(0), List.of(), List.of());
        }
      }
      int after = faults.size() + 1;
      return grouped(
          faults, found.get(0), found.subList(1, after), found.subList(after, found.size()));
    } catch (InterruptedException e) {
      Thread.currentThread().interrupt();
      throw new IllegalStateException("the fault guide was interrupted", e);
    } catch (ExecutionException e) {
      throw new IllegalStateException("a fault could not be looked at: " + e.getCause(), e);
    } finally {
      threads.shutdownNow();
    }
  }

  private Signs signs(double[] values, List<Map<String, Double>> wrong) {
    FaultSolver.OneThread free = idle.poll();
    FaultSolver.OneThread one = free == null ? solver.new OneThread() : free;
    Signs signs = one.signs(values, wrong);
    idle.add(one);
    return signs;
  }

  private FaultGuide grouped(
      List<Fault> faults, Signs healthy, List<Signs> signs, List<Signs> kits) {
    List<Double> relative = new ArrayList<>();
    for (int i = 0; i < solver.readings().size(); i++) {
      relative.add(Spreads.relative(kits, i));
    }
    ReadingError error = new ReadingError(solver.readings(), relative, meter(solver.assembly()));
    return new Grouping(solver.readings(), healthy, error).guide(faults, signs, relative);
  }

  /** The first instrument of the bench. */
  static Meter meter(Assembly assembly) {
    Bench bench = assembly.design().bench();
    return new Meter((bench.instruments().isEmpty() ? Bench.USUAL : bench).instruments().get(0));
  }
}
