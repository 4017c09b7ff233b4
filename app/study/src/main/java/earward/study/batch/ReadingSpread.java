package earward.study.batch;

import earward.block.figure.FigureName;
import java.util.Objects;

/**
 * One figure over the kits of a batch.
 *
 * @param figure its name
 * @param nominal of the nominal kit; NaN where it has none
 * @param distribution over the kits
 */
public record ReadingSpread(FigureName figure, double nominal, Distribution distribution) {
  public ReadingSpread {
    Objects.requireNonNull(figure);
    Objects.requireNonNull(distribution);
  }
}
