package earward.command;

import earward.engine.CircuitException;
import earward.kit.review.ReviewedKit;
import earward.study.batch.Habits;
import earward.study.faults.FaultGuide;
import earward.study.faults.FaultOrder;
import earward.study.faults.FaultStudy;
import java.util.List;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;

/** The fault guide of a design. */
@Command(
    name = "faults",
    description = {
      "Solves every single fault of a kit: what the readings would be and what would be heard,",
      "grouped by what a builder can tell apart with their meter, the probable groups first."
    })
final class FaultsCommand extends DesignCommand {
  private static final int SPREAD_KITS = 40;

  @Option(
      names = "--threads",
      paramLabel = "T",
      description = "How many solve at a time; all cores unless said. It changes no result.")
  private int threads = Runtime.getRuntime().availableProcessors();

  @Option(names = "--json", description = "As JSON, in SI base units (faults.schema.json).")
  private boolean json;

  @Override
  void show(ReviewedKit reviewed, Program program) throws CommandFault {
    BatchCommand.require(threads, BatchCommand.MOST_THREADS, "threads");
    FaultGuide guide = guide(reviewed);
    if (json) {
      JsonOut.print(results(), FaultsJson.of(reviewed, guide));
    } else {
      FaultsText.print(results(), reviewed, guide);
    }
  }

  private FaultGuide guide(ReviewedKit reviewed) throws CommandFault {
    FaultOrder order = new FaultOrder(threads, SPREAD_KITS, 1, Habits.USUAL);
    try (Cancellation cancellation = new Cancellation(messages())) {
      FaultGuide guide =
          FaultStudy.of(reviewed.solved().assembly(), order, (done, all) -> !cancellation.asked());
      if (cancellation.asked()) {
        throw CommandFault.ofInput(List.of()); // the cancellation says it
      }
      return guide;
    } catch (CircuitException e) {
      throw CommandFault.ofInput(file() + ": " + e.finding().sentence());
    }
  }
}
