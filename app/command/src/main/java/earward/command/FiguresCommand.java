package earward.command;

import earward.kit.review.ReviewedKit;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;

/** All figures of a design. */
@Command(name = "figures", description = "Shows all figures of a kit design.")
final class FiguresCommand extends DesignCommand {
  @Option(names = "--json", description = "As JSON, in SI base units (figures.schema.json).")
  private boolean json;

  @Override
  void show(ReviewedKit reviewed, Program program) {
    if (json) {
      JsonOut.print(results(), FiguresJson.of(reviewed));
    } else {
      FiguresText.print(results(), reviewed);
    }
  }
}
