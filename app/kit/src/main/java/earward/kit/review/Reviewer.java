package earward.kit.review;

import earward.block.BlockTypes;
import earward.block.check.Finding;
import earward.kit.design.KitDesign;
import earward.kit.parts.PartsLibrary;
import earward.kit.path.Assembler;
import earward.kit.path.Assembly;
import earward.kit.path.KitSolver;
import earward.kit.path.SolvedKit;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashSet;
import java.util.List;
import java.util.Locale;
import java.util.Set;

/**
 * The door of the review: a design in, its figures and all that is to be said of them out. Remedies
 * are looked for by {@code earward.kit.proposal}.
 */
public final class Reviewer {
  /** The language of sentences where no other is asked for. */
  public static final Locale USUAL_LANGUAGE = Locale.ENGLISH;

  private Reviewer() {}

  /**
   * Assembles and solves a design and holds every check against its figures.
   *
   * @param design what is to be built
   * @param types the block types at hand
   * @param library the parts that settings may name
   */
  public static ReviewedKit review(KitDesign design, BlockTypes types, PartsLibrary library) {
    return review(KitSolver.solve(Assembler.assemble(design, types, library)), USUAL_LANGUAGE);
  }

  /**
   * Holds every check against the figures of a kit that was solved.
   *
   * @param solved the kit; one that is not complete has the findings of its assembly only
   * @param language of the sentences
   */
  public static ReviewedKit review(SolvedKit solved, Locale language) {
    List<Finding> all = new ArrayList<>(solved.assembly().findings());
    all.addAll(solved.findings());
    if (solved.assembly().complete()) {
      all.addAll(new HeldChecks(solved, language).findings());
      all.addAll(new Judgements(solved, language).findings());
    }
    return new ReviewedKit(
        solved, weightiestFirst(all).stream().map(f -> new ReviewFinding(f, List.of())).toList());
  }

  /** Every check that is held against a kit: its blocks', its own, those of every part. */
  public static List<KitCheck> checks(Assembly assembly) {
    return KitChecks.of(assembly);
  }

  /** Sorted by severity, in the order found within each; what was already said is left out. */
  private static List<Finding> weightiestFirst(List<Finding> all) {
    record Said(String code, String subject, String sentence) {}
    Set<Said> said = new HashSet<>();
    return all.stream()
        .sorted(Comparator.comparing(Finding::severity))
        .filter(f -> said.add(new Said(f.code(), f.subject(), f.sentence())))
        .toList();
  }
}
