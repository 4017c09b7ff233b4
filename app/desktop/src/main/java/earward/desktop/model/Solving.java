package earward.desktop.model;

import earward.kit.design.KitDesign;
import earward.kit.path.KitCurves;
import earward.kit.path.SolvedKit;
import earward.kit.review.ReviewedKit;
import java.util.Optional;

/** What a workbench asks to be solved; always called off the event thread. */
public interface Solving {
  /** The figures that an edit shows at once. */
  SolvedKit headline(KitDesign design);

  /** All figures and findings. */
  ReviewedKit review(KitDesign design);

  /** The same review with proven remedies at its findings. */
  ReviewedKit remedies(ReviewedKit reviewed);

  /** The curves; empty where the kit is not complete. */
  Optional<KitCurves> curves(KitDesign design);
}
