package earward.command;

import earward.engine.CircuitException;
import earward.kit.review.ReviewedKit;
import earward.study.batch.Batch;
import earward.study.batch.BatchOrder;
import earward.study.batch.BatchPlan;
import earward.study.batch.BatchResult;
import earward.study.batch.Habits;
import earward.study.matters.Matters;
import earward.study.matters.MattersStudy;
import java.util.List;
import java.util.Optional;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;

/** Many kits of a design, each out of other parts. */
@Command(
    name = "batch",
    description = {
      "Solves many kits of a design, each part off within its tolerance: the spread of every",
      "reading, the share of good kits, and the worst kit. The same seed gives the same kits,",
      "whatever the number of threads. Ctrl-C ends it."
    })
final class BatchCommand extends DesignCommand {
  static final long MOST_KITS = 100_000_000;
  static final int MOST_THREADS = 256;

  @Option(
      names = "--kits",
      paramLabel = "N",
      description = "How many kits; 1000 unless said otherwise.")
  private long kits = 1000;

  @Option(names = "--seed", paramLabel = "S", description = "Seed of all draws; 1 unless said.")
  private long seed = 1;

  @Option(
      names = "--threads",
      paramLabel = "T",
      description = "How many solve at a time; all cores unless said. It changes no result.")
  private int threads = Runtime.getRuntime().availableProcessors();

  @Option(
      names = "--full",
      description = "All figures and checks, those too that are a search; much slower.")
  private boolean full;

  @Option(
      names = "--matters",
      description = {
        "Also which parts make the spread of each reading, and what tighter or looser tolerances",
        "would do to the yield: some ten batches more."
      })
  private boolean matters;

  @Option(names = "--json", description = "As JSON, in SI base units (batch.schema.json).")
  private boolean json;

  @Override
  void show(ReviewedKit reviewed, Program program) throws CommandFault {
    require(kits, MOST_KITS, "kits");
    require(threads, MOST_THREADS, "threads");
    BatchOrder order = new BatchOrder(kits, seed, threads, full, Habits.USUAL);
    BatchResult result;
    Optional<Matters> found = Optional.empty();
    try (Cancellation cancellation = new Cancellation(messages())) {
      KitsProgress progress = new KitsProgress(messages(), cancellation::asked);
      BatchPlan plan = BatchPlan.of(reviewed.solved().assembly(), full, order.habits());
      result = Batch.run(plan, order, progress);
      if (matters && !cancellation.asked()) {
        found = Optional.of(MattersStudy.of(plan, order, result, progress));
      }
      if (cancellation.asked()) {
        throw CommandFault.ofInput(List.of()); // the cancellation says it
      }
    } catch (CircuitException e) {
      throw CommandFault.ofInput(file() + ": " + e.finding().sentence());
    }
    if (json) {
      JsonOut.print(results(), BatchJson.of(reviewed, result, found));
    } else {
      BatchText.print(results(), reviewed, result);
      found.ifPresent(what -> MattersText.print(results(), reviewed.solved().assembly(), what));
    }
  }

  static void require(long given, long most, String what) throws CommandFault {
    if (given < 1 || given > most) {
      throw CommandFault.ofInput(
          "--" + what + " is " + given + "; it must be from 1 to " + most + ".");
    }
  }
}
