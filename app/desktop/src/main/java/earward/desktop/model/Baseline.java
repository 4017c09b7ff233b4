package earward.desktop.model;

import earward.kit.path.KitCurves;
import earward.kit.review.ReviewedKit;
import java.util.Objects;
import java.util.Optional;

/**
 * A design that was pinned to compare others with.
 *
 * @param kit as it was solved
 * @param curves where they were solved
 */
public record Baseline(ReviewedKit kit, Optional<KitCurves> curves) {
  public Baseline {
    Objects.requireNonNull(kit);
    Objects.requireNonNull(curves);
  }
}
