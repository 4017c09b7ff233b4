package earward.study.batch;

import earward.block.check.Relation;
import java.util.Objects;

/**
 * How the kits of a batch stand to one check.
 *
 * @param held the check
 * @param kits kits that have its figure
 * @param failed kits that fail it
 * @param nominal the nominal kit's figure
 * @param distribution of the figure
 */
public record CheckOutcome(
    BatchCheck held, long kits, long failed, double nominal, Distribution distribution) {
  public CheckOutcome {
    Objects.requireNonNull(held);
    Objects.requireNonNull(distribution);
  }

  /** Share of the kits that fail it. */
  public double failedShare() {
    return kits == 0 ? 0 : (double) failed / kits;
  }

  /** The worst figure of all kits. */
  public double worst() {
    return held.check().relation() == Relation.AT_MOST ? distribution.most() : distribution.least();
  }
}
