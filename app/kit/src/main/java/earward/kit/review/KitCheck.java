package earward.kit.review;

import earward.block.check.Check;
import earward.block.figure.FigureName;
import earward.kit.path.Figures;
import java.util.Objects;

/**
 * A check as it is held against a whole kit, its figure named in the whole path.
 *
 * @param check figure, relation, limit
 * @param subject the block that it is about, or the path
 * @param part reference of the part that it is about; empty where it is about none
 * @param ofBlock whether a block makes it: its sentence is the block's text {@code check.CODE}, and
 *     its figure must exist; else the kit makes it, and what a kit does not have is not asked for
 */
public record KitCheck(Check check, String subject, String part, boolean ofBlock) {
  public KitCheck {
    Objects.requireNonNull(check);
    Objects.requireNonNull(subject);
    Objects.requireNonNull(part);
  }

  static KitCheck ofPath(Check check) {
    return new KitCheck(check, KitChecks.SUBJECT, "", false);
  }

  /** Whether it holds what the design's own conditions want of the whole path. */
  public boolean wanted() {
    return !ofBlock && check.source().equals(KitChecks.SOURCE);
  }

  /** The figure that is held, NaN where there is none; of a block's own place, that of its seam. */
  public double figure(Figures figures) {
    FigureName name = check.figure();
    double own = figures.orNaN(name);
    return Double.isNaN(own)
        ? figures.orNaN(new FigureName("seam." + name.place(), name.quantity(), name.caseName()))
        : own;
  }
}
