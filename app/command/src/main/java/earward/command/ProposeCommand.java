package earward.command;

import earward.host.PluginSet;
import earward.kit.design.QuantityException;
import earward.kit.file.Designs;
import earward.kit.parts.PartsLibrary;
import earward.kit.proposal.Matching;
import earward.kit.proposal.MatchingAction;
import earward.kit.proposal.Proposal;
import earward.kit.proposal.Proposals;
import earward.kit.proposal.Stock;
import earward.kit.review.ReviewedKit;
import earward.kit.review.Reviewer;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Objects;
import java.util.Set;
import org.jspecify.annotations.Nullable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;

/** Better values for a design, written as another design. */
@Command(
    name = "propose",
    description = "Chooses values that leave fewer findings, shows them and writes a new design.")
final class ProposeCommand extends DesignCommand {
  @Option(
      names = {"-o", "--output"},
      paramLabel = "NEW",
      required = true,
      description = "The design file to write; never the one that is read.")
  private @Nullable Path output;

  @Option(
      names = "--block",
      paramLabel = "ID",
      description = "Only this block, by its own design equations.")
  private @Nullable String block;

  @Option(
      names = "--keep",
      paramLabel = "BLOCK.SETTING",
      description = "A setting that stays as it is; may be given several times.")
  private List<String> kept = List.of();

  @Option(
      names = "--stock",
      paramLabel = "FILE",
      description = "The resistances and capacitances at hand, one a line; else any preferred one.")
  private @Nullable Path stock;

  @Option(
      names = "--seam",
      paramLabel = "ID",
      description =
          "What could be done where this block is entered: pad, coupling capacitor, series or shunt"
              + " resistor, buffer, another track; all are shown with what they do, one is written.")
  private @Nullable String seam;

  @Option(
      names = "--take",
      paramLabel = "N",
      description = "Which of those shown is written; else the first.")
  private int taken = 1;

  private @Nullable Proposal proposal;
  private List<MatchingAction> actions = List.of();

  @Override
  ReviewedKit completed(ReviewedKit reviewed, PluginSet types, PartsLibrary parts)
      throws CommandFault {
    if (!reviewed.solved().solved()) {
      throw CommandFault.ofInput(
          file() + ": the kit cannot be solved as it is; 'earward review' says why.");
    }
    requireKnown(reviewed);
    if (seam != null) {
      return atSeam(seam, reviewed, types, parts);
    }
    Set<String> stays = Set.copyOf(kept);
    try {
      proposal =
          block == null
              ? Proposals.ofPath(reviewed, types, parts, stock(), stays)
              : Proposals.ofBlock(reviewed, block, types, parts, stock(), stays);
    } catch (IllegalArgumentException e) {
      throw CommandFault.ofInput(file() + ": " + e.getMessage());
    }
    return proposal.after();
  }

  private ReviewedKit atSeam(String into, ReviewedKit reviewed, PluginSet types, PartsLibrary parts)
      throws CommandFault {
    try {
      actions = Matching.at(reviewed, into, types, parts);
    } catch (IllegalArgumentException e) {
      throw CommandFault.ofInput(file() + ": " + e.getMessage());
    }
    if (taken < 1 || taken > actions.size()) {
      throw CommandFault.ofInput(
          file() + ": --take is " + taken + "; it is a number from 1 to " + actions.size() + ".");
    }
    return Reviewer.review(actions.get(taken - 1).edited(), types, parts);
  }

  /** A setting that is kept must be one: a slip of the pen would let it be changed. */
  private void requireKnown(ReviewedKit reviewed) throws CommandFault {
    for (String each : kept) {
      boolean known =
          reviewed.solved().assembly().blocks().stream()
              .flatMap(
                  placed ->
                      placed.type().settings().stream()
                          .map(setting -> placed.id() + "." + setting.id()))
              .anyMatch(each::equals);
      if (!known) {
        throw CommandFault.ofInput(
            file()
                + ": there is no setting '"
                + each
                + "' to keep; wanted a block and a setting of it, such as detector.c1.");
      }
    }
  }

  private Stock stock() throws CommandFault {
    if (stock == null) {
      return Stock.EVERYTHING;
    }
    try {
      return Stock.of(Files.readAllLines(stock, StandardCharsets.UTF_8));
    } catch (QuantityException e) {
      throw CommandFault.ofInput(stock + ", " + e.sentence() + ".");
    } catch (IOException e) {
      throw CommandFault.ofInput(
          stock + ": this list of values cannot be read; check its name and that it is UTF-8.");
    }
  }

  @Override
  void show(ReviewedKit reviewed, Program program) throws CommandFault {
    Path target = Objects.requireNonNull(output);
    OutputFile file = OutputFile.at(target, file());
    String text = Designs.text(reviewed.solved().assembly().design());
    try {
      file.write(out -> out.write(text.getBytes(StandardCharsets.UTF_8)));
    } catch (IOException e) {
      throw OutputFile.fault(target, e);
    }
    results().println(target);
    if (actions.isEmpty()) {
      changes(Objects.requireNonNull(proposal));
    } else {
      SeamText.print(results(), actions, taken);
    }
    results().println();
    ReviewText.print(results(), reviewed);
  }

  private void changes(Proposal shown) {
    if (shown.changes().isEmpty()) {
      results().println("No value is changed: none that was tried leaves fewer findings.");
      return;
    }
    TextTable table = new TextTable();
    for (Proposal.Change change : shown.changes()) {
      table.row(
          change.block() + "." + change.setting(),
          change.from().isEmpty() ? "(usual)" : Shown.plain(change.from()),
          "->",
          Shown.plain(change.to()),
          Shown.plain(change.why()));
    }
    table.print(results());
  }
}
