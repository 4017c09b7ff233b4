package earward.study.limits;

/**
 * How many of the drawn kits limits must hold, so that a share of all kits passes them: the
 * distribution-free tolerance limit (Wilks 1941). With the r-th smallest of n kits as the limit, at
 * least a share p passes with the probability that at most r − 1 of n kits lie below the
 * p-quantile.
 */
final class ToleranceRank {
  private static final double SURE = 0.95;

  private ToleranceRank() {}

  /** The least rank that gives the share with 95 % confidence; n where none does. */
  static int of(int kits, double share) {
    double sum = 0;
    for (int below = 0; below < kits; below++) {
      sum += binomial(kits, below, share);
      if (sum >= SURE) {
        return below + 1;
      }
    }
    return kits;
  }

  /** How sure it is that a share of all kits lies below the rank-th smallest of n. */
  static double confidence(int kits, int rank, double share) {
    double sum = 0;
    for (int below = 0; below < rank; below++) {
      sum += binomial(kits, below, share);
    }
    return Math.min(1, sum);
  }

  private static double binomial(int n, int k, double p) {
    double log = k * Math.log(p) + (n - k) * Math.log1p(-p);
    for (int i = 1; i <= Math.min(k, n - k); i++) {
      log += Math.log((double) (n - i + 1) / i);
    }
    return Math.exp(log);
  }
}
