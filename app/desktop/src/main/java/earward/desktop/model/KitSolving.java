package earward.desktop.model;

import earward.engine.CircuitException;
import earward.engine.SolveOutcome;
import earward.kit.design.KitDesign;
import earward.kit.path.Assembler;
import earward.kit.path.Assembly;
import earward.kit.path.CompiledKit;
import earward.kit.path.Figures;
import earward.kit.path.KitCurves;
import earward.kit.path.KitSolver;
import earward.kit.path.SolvedKit;
import earward.kit.proposal.Remedies;
import earward.kit.review.ReviewedKit;
import earward.kit.review.Reviewer;
import java.util.List;
import java.util.Optional;

/** Solves with the blocks and parts of a workshop. Safe for several threads. */
public final class KitSolving implements Solving {
  private final Workshop workshop;

  /** The solving of a workshop. */
  public KitSolving(Workshop workshop) {
    this.workshop = workshop;
  }

  private Assembly assembled(KitDesign design) {
    return Assembler.assemble(design, workshop.types(), workshop.parts());
  }

  @Override
  public SolvedKit headline(KitDesign design) {
    return headline(assembled(design));
  }

  /** The headline figures of an assembly; none where it is not complete. */
  static SolvedKit headline(Assembly assembly) {
    if (!assembly.complete()) {
      return new SolvedKit(assembly, Figures.NONE, List.of(), false);
    }
    try {
      CompiledKit compiled = KitSolver.compileHeadline(assembly);
      double[] row = new double[compiled.circuit().figures().size()];
      SolveOutcome outcome =
          compiled.circuit().newSolver().solve(compiled.circuit().nominalValues(), row);
      return new SolvedKit(
          assembly,
          compiled.figures(row),
          outcome.findings(),
          outcome.solved(),
          java.util.Map.of());
    } catch (CircuitException e) {
      return new SolvedKit(assembly, Figures.NONE, List.of(e.finding()), false);
    }
  }

  @Override
  public ReviewedKit review(KitDesign design) {
    return Reviewer.review(KitSolver.solve(assembled(design)), Reviewer.USUAL_LANGUAGE);
  }

  @Override
  public ReviewedKit remedies(ReviewedKit reviewed) {
    return Remedies.sought(reviewed, workshop.types(), workshop.parts());
  }

  @Override
  public Optional<KitCurves> curves(KitDesign design) {
    return KitCurves.of(assembled(design));
  }
}
