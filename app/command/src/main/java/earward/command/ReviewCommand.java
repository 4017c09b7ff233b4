package earward.command;

import earward.host.PluginSet;
import earward.kit.parts.PartsLibrary;
import earward.kit.proposal.Remedies;
import earward.kit.review.ReviewedKit;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;

/** The findings of a design. */
@Command(name = "review", description = "Shows what is to be said of a kit design, and remedies.")
final class ReviewCommand extends DesignCommand {
  @Option(names = "--json", description = "As JSON, in SI base units (review.schema.json).")
  private boolean json;

  @Override
  ReviewedKit completed(ReviewedKit reviewed, PluginSet types, PartsLibrary parts) {
    return Remedies.sought(reviewed, types, parts);
  }

  @Override
  void show(ReviewedKit reviewed, Program program) {
    if (json) {
      JsonOut.print(results(), ReviewJson.of(reviewed));
    } else {
      ReviewText.print(results(), reviewed);
    }
  }
}
