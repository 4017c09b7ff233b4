package earward.timing.diagnosis;

import earward.kit.path.Assembly;
import earward.study.batch.BatchProgress;
import earward.study.faults.FaultGroup;
import earward.study.faults.FaultGuide;
import earward.study.faults.FaultOrder;
import earward.study.faults.FaultSolver;
import earward.study.faults.FaultStudy;
import java.io.PrintStream;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.TreeMap;
import java.util.stream.Collectors;
import java.util.stream.IntStream;

/** Runs trials of one kit, prints their confusion, and holds them against their bars. */
public final class TrialCall {
  private static final double FIRST = 0.70;
  private static final double AMONG_THREE = 0.90;
  private static final double HEALTHY = 0.99;
  private static final double MOST_PARTS = 3;

  private TrialCall() {}

  /**
   * Runs the trials.
   *
   * @return 0 where all bars are met, 1 otherwise
   */
  public static int run(String kit, Assembly assembly, int trials, long seed, PrintStream out) {
    FaultSolver solver = DiagnosisTrial.solver(assembly);
    FaultGuide guide = FaultStudy.of(solver, FaultOrder.usual(), BatchProgress.NONE);
    DiagnosisTrial trial = new DiagnosisTrial(assembly, solver, guide);
    List<Outcome> outcomes =
        IntStream.range(0, trials)
            .parallel()
            .mapToObj(number -> trial.trial(seed, number))
            .toList();
    double parts = guide.groups().stream().mapToInt(TrialCall::parts).average().orElse(0);
    out.printf(
        Locale.ROOT,
        "%s: %d faults, %d groups of %.2f parts on average, %d without trace; %d trials%n",
        kit,
        guide.faults(),
        guide.groups().size(),
        parts,
        guide.withoutTrace().size(),
        trials);
    List<Outcome> faulty = outcomes.stream().filter(one -> !one.healthy()).toList();
    List<Outcome> sound = outcomes.stream().filter(Outcome::healthy).toList();
    boolean kept = bar(out, "right group first", share(faulty, 1), FIRST);
    kept &= bar(out, "right group among the first three", share(faulty, 3), AMONG_THREE);
    kept &= bar(out, "healthy kits called healthy", share(sound, 1), HEALTHY);
    kept &= parts <= MOST_PARTS;
    out.printf(
        Locale.ROOT,
        "readings and observations taken: %.1f on average%n",
        outcomes.stream().mapToInt(Outcome::readings).average().orElse(0));
    confusion(faulty, out);
    return kept ? 0 : 1;
  }

  private static int parts(FaultGroup group) {
    return (int)
        group.faults().stream().flatMap(each -> each.fault().parts().stream()).distinct().count();
  }

  private static double share(List<Outcome> outcomes, int within) {
    long right =
        outcomes.stream().filter(one -> within == 1 ? one.first() : one.amongThree()).count();
    return outcomes.isEmpty() ? 0 : (double) right / outcomes.size();
  }

  private static boolean bar(PrintStream out, String what, double share, double least) {
    boolean kept = share >= least;
    out.printf(
        Locale.ROOT,
        "%s %s: %.1f %% (at least %.0f %%)%n",
        kept ? "kept  " : "MISSED",
        what,
        100 * share,
        100 * least);
    return kept;
  }

  /** For each true group that was missed, what it was called instead; 0 is healthy. */
  private static void confusion(List<Outcome> faulty, PrintStream out) {
    Map<String, Map<Integer, Integer>> called = new TreeMap<>();
    for (Outcome one : faulty) {
      String truth =
          one.truth().stream()
              .map(number -> String.format(Locale.ROOT, "%3d", number))
              .collect(Collectors.joining(" +"));
      called.computeIfAbsent(truth, t -> new TreeMap<>()).merge(one.called(), 1, Integer::sum);
    }
    out.println("confusion, true group: called (times); 0 is healthy");
    called.forEach(
        (truth, times) ->
            out.println(
                truth
                    + ": "
                    + times.entrySet().stream()
                        .map(each -> each.getKey() + " (" + each.getValue() + ")")
                        .collect(Collectors.joining(", "))));
  }
}
