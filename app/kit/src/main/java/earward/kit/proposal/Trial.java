package earward.kit.proposal;

import earward.block.check.Finding;
import earward.block.figure.CaseName;
import earward.block.figure.FigureName;
import earward.block.figure.Quantity;
import earward.kit.design.KitDesign;
import earward.kit.path.Assembler;
import earward.kit.path.Assembly;
import earward.kit.path.Figures;
import earward.kit.path.KitSolver;
import earward.kit.path.SolvedKit;
import earward.kit.proposal.MatchingAction.Effect;
import earward.kit.review.KitCheck;
import earward.kit.review.ReviewFinding;
import earward.kit.review.ReviewedKit;
import earward.kit.review.Reviewer;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** Tries an edited design at a seam: solves all that checks and the seam's figures need. */
final class Trial {
  private static final List<Quantity> AT_SEAM =
      List.of(
          Quantity.AUDIO_RMS_VOLTS,
          Quantity.LOADING_LOSS_DECIBELS,
          Quantity.ONWARD_OHMS,
          Quantity.BACKWARD_OHMS,
          Quantity.HEADROOM_DECIBELS,
          Quantity.DC_VOLTS,
          Quantity.LOAD_RATIO_WITHOUT);
  private static final List<Quantity> OF_PATH =
      List.of(
          Quantity.AUDIO_RMS_VOLTS,
          Quantity.DISTORTION,
          Quantity.LOW_EDGE_HERTZ,
          Quantity.HIGH_EDGE_HERTZ);

  private final Bench bench;

  Trial(Bench bench) {
    this.bench = bench;
  }

  /** What came of an edit. */
  record Outcome(
      Bench bench, String into, KitDesign design, Figures figures, List<Finding> findings) {

    List<Effect> effects() {
      List<Effect> effects = new ArrayList<>();
      for (FigureName name : wanted(into)) {
        double before = bench.now().figures().orNaN(name);
        double after = figures.orNaN(name);
        if (!Double.isNaN(before) || !Double.isNaN(after)) {
          effects.add(new Effect(name, before, after));
        }
      }
      return effects;
    }

    List<Finding> cleared() {
      return Bench.findings(bench.now()).stream()
          .filter(own -> findings.stream().noneMatch(other -> Bench.same(own, other)))
          .toList();
    }

    List<Finding> raised() {
      return findings.stream()
          .filter(
              other ->
                  Bench.findings(bench.now()).stream().noneMatch(own -> Bench.same(own, other)))
          .toList();
    }
  }

  private static List<FigureName> wanted(String into) {
    List<FigureName> names = new ArrayList<>();
    AT_SEAM.forEach(quantity -> names.add(new FigureName("seam." + into, quantity, CaseName.TEST)));
    OF_PATH.forEach(quantity -> names.add(new FigureName("path", quantity, CaseName.TEST)));
    return names;
  }

  /** Empty where the design cannot be built or solved. */
  Optional<Outcome> of(KitDesign edited, String into) {
    Assembly assembly = Assembler.assemble(edited, bench.types(), bench.library());
    if (!assembly.complete()) {
      return Optional.empty();
    }
    List<FigureName> names = new ArrayList<>();
    Reviewer.checks(assembly).stream().map(KitCheck::check).forEach(c -> names.add(c.figure()));
    names.addAll(wanted(into));
    SolvedKit solved = KitSolver.solve(assembly, names);
    ReviewedKit reviewed = Reviewer.review(solved, bench.language());
    return solved.solved()
        ? Optional.of(
            new Outcome(
                bench,
                into,
                edited,
                solved.figures(),
                reviewed.findings().stream().map(ReviewFinding::finding).toList()))
        : Optional.empty();
  }
}
