package org.evenbeam.stats.failures;

import org.evenbeam.stats.StandardNormal;

/**
 * The normal approximation of the binomial test.
 *
 * @param statistic z
 * @param pTwoSided probability of a z at least as far from zero
 * @param pLess probability of a z at most as large
 * @param pGreater probability of a z at least as large
 * @param expectedFailures n p
 * @param expectedPasses n (1 - p)
 */
public record ProportionZ(
    double statistic,
    double pTwoSided,
    double pLess,
    double pGreater,
    double expectedFailures,
    double expectedPasses) {
  /** The fewest expected failures and passes for which the approximation is used. */
  public static final double FEWEST_EXPECTED = 10;

  /** Lets 100 (1 - 0.9) be 10, as it is in decimals. */
  private static final double ROUNDING = 1 - 1e-12;

  static ProportionZ of(FailureCount count, double rate) {
    int n = count.n();
    double z = (count.failures() - n * rate) / Math.sqrt(n * rate * (1 - rate));
    return new ProportionZ(
        z,
        2 * StandardNormal.upperTail(Math.abs(z)),
        StandardNormal.lowerTail(z),
        StandardNormal.upperTail(z),
        n * rate,
        n * (1 - rate));
  }

  /** Whether both expectations reach 10, the trade's condition (common practice). */
  public boolean applicable() {
    return Math.min(expectedFailures, expectedPasses) >= FEWEST_EXPECTED * ROUNDING;
  }
}
