package earward.command;

import earward.block.figure.CaseName;
import earward.kit.path.WaveformProof;
import earward.kit.review.ReviewedKit;
import java.util.List;
import java.util.Optional;
import java.util.stream.Collectors;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;

/** The figures of a design held against the full waveform. */
@Command(
    name = "prove",
    description = {
      "Solves the full waveform of a kit design, at the carrier's own rate, and compares.",
      "It takes seconds; Ctrl-C ends it."
    })
final class ProveCommand extends DesignCommand {
  @Option(names = "--json", description = "As JSON, in SI base units (prove.schema.json).")
  private boolean json;

  @Option(
      names = "--case",
      paramLabel = "CASE",
      defaultValue = "test",
      description = "weak, test, strong, deepest or full-volume; test unless said otherwise.")
  private String caseText = "test";

  @Override
  void show(ReviewedKit reviewed, Program program) throws CommandFault {
    CaseName caseName = asked();
    WaveformProof proof;
    try (Cancellation cancellation = new Cancellation(messages())) {
      ProofProgress progress = new ProofProgress(messages(), cancellation::asked);
      proof = WaveformProof.of(reviewed.solved().assembly(), caseName, progress);
      if (proof.cancelled()) {
        throw CommandFault.ofInput(List.of()); // the cancellation says it
      }
    } catch (IllegalArgumentException e) {
      throw CommandFault.ofInput(file() + ": nothing can be proven: " + e.getMessage() + ".");
    }
    if (!proof.trouble().isEmpty()) {
      throw CommandFault.ofProgram(file() + ": " + proof.trouble());
    }
    if (json) {
      JsonOut.print(results(), ProofJson.of(reviewed, proof));
    } else {
      ProofText.print(results(), reviewed, proof);
    }
  }

  private CaseName asked() throws CommandFault {
    Optional<CaseName> found =
        WaveformProof.cases().stream().filter(each -> each.text().equals(caseText)).findFirst();
    if (found.isEmpty()) {
      throw CommandFault.ofInput(
          "There is no case '"
              + caseText
              + "' to prove; there are "
              + WaveformProof.cases().stream().map(CaseName::text).collect(Collectors.joining(", "))
              + ".");
    }
    return found.get();
  }
}
