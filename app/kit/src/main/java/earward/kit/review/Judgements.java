package earward.kit.review;

import earward.block.BlockTexts;
import earward.block.Conditions;
import earward.block.check.Finding;
import earward.block.check.Severity;
import earward.block.figure.FigureName;
import earward.kit.path.Figures;
import earward.kit.path.PlacedBlock;
import earward.kit.path.SolvedKit;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;

/** What the block types themselves say of the nominal kit, once per edit. */
final class Judgements {
  private final SolvedKit solved;
  private final Locale language;

  Judgements(SolvedKit solved, Locale language) {
    this.solved = solved;
    this.language = language;
  }

  List<Finding> findings() {
    List<Finding> findings = new ArrayList<>();
    solved.assembly().blocks().forEach(block -> findings.addAll(of(block)));
    return findings;
  }

  @SuppressWarnings("CatchingUnchecked") // whatever a plug-in throws is a failure of that plug-in
  private List<Finding> of(PlacedBlock block) {
    Conditions conditions = solved.assembly().design().conditions().core();
    Figures figures = solved.figures();
    try {
      return block
          .type()
          .judge(
              block.values(),
              conditions,
              local -> figures.orNaN(FigureName.parse(local).within(block.id())))
          .stream()
          .map(finding -> ofBlock(finding, block))
          .toList();
    } catch (RuntimeException | LinkageError | StackOverflowError e) {
      return List.of(
          Finding.of(
              Severity.WEIGH,
              "plug-in-failed",
              block.id(),
              "The plug-in of '"
                  + block.type().id()
                  + "' failed when it judged block '"
                  + block.id()
                  + "': "
                  + e.getClass().getSimpleName()
                  + (e.getMessage() == null ? "" : ", " + e.getMessage())
                  + "."));
    }
  }

  private Finding ofBlock(Finding finding, PlacedBlock block) {
    String blockId = block.id();
    return new Finding(
        finding.severity(),
        finding.code(),
        finding.subject().isEmpty() ? blockId : blockId + "." + finding.subject(),
        words(finding, block),
        finding.source(),
        finding.measured());
  }

  /** The block's own text where the finding is said by one. */
  private String words(Finding finding, PlacedBlock block) {
    return finding.sentence().equals(Finding.textKey(finding.code()))
        ? BlockTexts.of(block.type(), language)
            .get(finding.sentence())
            .replace("{place}", block.id())
        : finding.sentence();
  }
}
