package earward.study.batch;

import java.util.List;
import java.util.Objects;
import java.util.Optional;

/**
 * What a batch gave.
 *
 * @param order what was asked for
 * @param kits kits that were done; fewer than asked for where it was cancelled
 * @param passed kits of which no STOP check fails and every limit wanted is met
 * @param unsolved kits of which some case found no solution
 * @param readings spread of each reading
 * @param checks how the kits stand to each check
 * @param notLookedAt checks, by code, that the batch did not solve; a full batch does
 * @param worst the worst kit
 */
public record BatchResult(
    BatchOrder order,
    long kits,
    long passed,
    long unsolved,
    List<ReadingSpread> readings,
    List<CheckOutcome> checks,
    List<String> notLookedAt,
    Optional<WorstKit> worst) {
  /** Two-sided 95 % of the normal distribution. */
  private static final double NINETY_FIVE = 1.959963984540054;

  public BatchResult {
    Objects.requireNonNull(order);
    readings = List.copyOf(readings);
    checks = List.copyOf(checks);
    notLookedAt = List.copyOf(notLookedAt);
    Objects.requireNonNull(worst);
  }

  /** Whether it was ended before its last kit. */
  public boolean cancelled() {
    return kits < order.kits();
  }

  /** Share of good kits. */
  public double goodShare() {
    return kits == 0 ? Double.NaN : (double) passed / kits;
  }

  /**
   * Lower or upper end of the yield's own uncertainty, 95 %.
   *
   * <p>Source: Wilson 1927, the score interval of a share.
   */
  public double goodShareBound(boolean upper) {
    if (kits == 0) {
      return Double.NaN;
    }
    double n = kits;
    double z2 = NINETY_FIVE * NINETY_FIVE;
    double p = goodShare();
    double middle = p + z2 / (2 * n);
    double half = NINETY_FIVE * Math.sqrt(p * (1 - p) / n + z2 / (4 * n * n));
    double bound = (middle + (upper ? half : -half)) / (1 + z2 / n);
    return Math.min(1, Math.max(0, bound));
  }
}
