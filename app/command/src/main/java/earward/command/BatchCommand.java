package earward.command;

import earward.engine.CircuitException;
import earward.kit.path.Assembly;
import earward.kit.review.ReviewedKit;
import earward.study.batch.Batch;
import earward.study.batch.BatchOrder;
import earward.study.batch.BatchResult;
import earward.study.batch.Habits;
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

  @Option(names = "--json", description = "As JSON, in SI base units (batch.schema.json).")
  private boolean json;

  @Override
  void show(ReviewedKit reviewed, Program program) throws CommandFault {
    require(kits, MOST_KITS, "kits");
    require(threads, MOST_THREADS, "threads");
    BatchResult result = batch(reviewed.solved().assembly());
    if (json) {
      JsonOut.print(results(), BatchJson.of(reviewed, result));
    } else {
      BatchText.print(results(), reviewed, result);
    }
  }

  static void require(long given, long most, String what) throws CommandFault {
    if (given < 1 || given > most) {
      throw CommandFault.ofInput(
          "--" + what + " is " + given + "; it must be from 1 to " + most + ".");
    }
  }

  private BatchResult batch(Assembly assembly) throws CommandFault {
    BatchOrder order = new BatchOrder(kits, seed, threads, full, Habits.USUAL);
    try (Cancellation cancellation = new Cancellation(messages())) {
      KitsProgress progress = new KitsProgress(messages(), cancellation::asked);
      BatchResult result = Batch.run(assembly, order, progress);
      if (result.cancelled()) {
        throw CommandFault.ofInput(java.util.List.of()); // the cancellation says it
      }
      return result;
    } catch (CircuitException e) {
      throw CommandFault.ofInput(file() + ": " + e.finding().sentence());
    }
  }
}
