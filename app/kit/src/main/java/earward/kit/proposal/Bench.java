package earward.kit.proposal;

import earward.block.BlockTypes;
import earward.block.check.Finding;
import earward.block.check.Severity;
import earward.block.figure.FigureName;
import earward.kit.design.KitDesign;
import earward.kit.parts.PartsLibrary;
import earward.kit.path.Assembler;
import earward.kit.path.Assembly;
import earward.kit.path.KitSolver;
import earward.kit.review.ReviewFinding;
import earward.kit.review.ReviewedKit;
import earward.kit.review.Reviewer;
import java.util.List;
import java.util.Locale;
import java.util.Optional;

/** Where edits are tried: the kit as it stands, and what it takes to solve another. */
record Bench(ReviewedKit now, BlockTypes types, PartsLibrary library, Locale language) {

  KitDesign design() {
    return now.solved().assembly().design();
  }

  Assembly assembly() {
    return now.solved().assembly();
  }

  /** One figure of an edited design; NaN where it cannot be built or has no such figure. */
  double figure(KitDesign edited, FigureName name) {
    Assembly assembly = Assembler.assemble(edited, types, library);
    return assembly.complete() ? KitSolver.figure(assembly, name) : Double.NaN;
  }

  /**
   * The whole review of an edited design, where it clears the finding and brings no new STOP; empty
   * otherwise.
   */
  Optional<ReviewedKit> proof(KitDesign edited, Finding finding) {
    Assembly assembly = Assembler.assemble(edited, types, library);
    if (!assembly.complete()) {
      return Optional.empty();
    }
    ReviewedKit after = Reviewer.review(KitSolver.solve(assembly), language);
    boolean cleared = findings(after).stream().noneMatch(other -> same(other, finding));
    boolean stops = added(after).stream().anyMatch(added -> added.severity() == Severity.STOP);
    return after.solved().solved() && cleared && !stops ? Optional.of(after) : Optional.empty();
  }

  /** What another review finds that this one did not. */
  List<Finding> added(ReviewedKit after) {
    return findings(after).stream()
        .filter(other -> findings(now).stream().noneMatch(own -> same(own, other)))
        .toList();
  }

  static List<Finding> findings(ReviewedKit reviewed) {
    return reviewed.findings().stream().map(ReviewFinding::finding).toList();
  }

  static boolean same(Finding one, Finding other) {
    return one.code().equals(other.code()) && one.subject().equals(other.subject());
  }
}
