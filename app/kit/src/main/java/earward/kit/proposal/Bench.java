package earward.kit.proposal;

import earward.block.BlockTypes;
import earward.block.check.Finding;
import earward.block.check.Severity;
import earward.block.figure.CaseName;
import earward.block.figure.FigureName;
import earward.block.figure.Quantity;
import earward.engine.Seam;
import earward.kit.design.KitDesign;
import earward.kit.parts.PartsLibrary;
import earward.kit.path.Assembler;
import earward.kit.path.Assembly;
import earward.kit.path.KitSolver;
import earward.kit.review.ReviewFinding;
import earward.kit.review.ReviewedKit;
import earward.kit.review.Reviewer;
import java.util.ArrayList;
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

  /** The same bench with another kit on it. */
  Bench at(ReviewedKit kit) {
    return new Bench(kit, types, library, language);
  }

  /**
   * What all checks find of an edited design, with no more solved than their figures and the
   * impedances of its seams; empty where it cannot be built.
   */
  Optional<ReviewedKit> checked(KitDesign edited) {
    Assembly assembly = Assembler.assemble(edited, types, library);
    if (!assembly.complete()) {
      return Optional.empty();
    }
    List<FigureName> names = new ArrayList<>();
    Reviewer.checks(assembly).forEach(each -> names.add(each.check().figure()));
    for (Seam seam : assembly.circuit().seams()) {
      String place = "seam." + seam.name();
      names.add(new FigureName(place, Quantity.ONWARD_OHMS, CaseName.TEST));
      names.add(new FigureName(place, Quantity.BACKWARD_OHMS, CaseName.TEST));
    }
    return Optional.of(Reviewer.review(KitSolver.solve(assembly, names), language));
  }

  /**
   * What all checks find of an edited design, where it clears the finding and brings no new STOP;
   * empty otherwise.
   */
  Optional<ReviewedKit> proof(KitDesign edited, Finding finding) {
    return checked(edited)
        .filter(after -> after.solved().solved())
        .filter(after -> findings(after).stream().noneMatch(other -> same(other, finding)))
        .filter(after -> added(after).stream().noneMatch(each -> each.severity() == Severity.STOP));
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
