package org.evenbeam.stats.failures;

import org.apache.commons.statistics.distribution.BetaDistribution;
import org.evenbeam.stats.Arguments;
import org.evenbeam.stats.Interval;
import org.evenbeam.stats.Shown;
import org.evenbeam.stats.StandardNormal;

/**
 * Bounds of a true failure rate at level 1 - alpha.
 *
 * @param clopperPearson the exact two-sided interval: Clopper and Pearson, Biometrika 26 (1934)
 *     404, doi:10.1093/biomet/26.4.404, by quantiles of the beta distribution
 * @param wilson the score interval: Wilson, J. Am. Statist. Assoc. 22 (1927) 209,
 *     doi:10.1080/01621459.1927.10502953
 * @param lowerBound the exact one-sided lower bound
 * @param upperBound the exact one-sided upper bound
 */
public record FailureBounds(
    Interval clopperPearson, Interval wilson, double lowerBound, double upperBound) {

  static FailureBounds of(FailureCount count, double alpha) {
    Arguments.significance(alpha);
    return new FailureBounds(
        new Interval(lower(count, alpha / 2), upper(count, alpha / 2)),
        wilson(count, alpha),
        lower(count, alpha),
        upper(count, alpha));
  }

  /** What the one-sided bounds show about the rate against a largest permitted one. */
  public Shown shownAgainst(double limit) {
    if (upperBound <= limit) {
      return Shown.WITHIN;
    }
    return lowerBound > limit ? Shown.BEYOND : Shown.NEITHER;
  }

  private static double lower(FailureCount count, double tail) {
    int k = count.failures();
    return k == 0
        ? 0
        : BetaDistribution.of(k, count.n() - k + 1.0).inverseCumulativeProbability(tail);
  }

  private static double upper(FailureCount count, double tail) {
    int k = count.failures();
    return k == count.n()
        ? 1
        : BetaDistribution.of(k + 1.0, count.n() - k).inverseSurvivalProbability(tail);
  }

  private static Interval wilson(FailureCount count, double alpha) {
    double n = count.n();
    double k = count.failures();
    double z = StandardNormal.quantileOfUpperTail(alpha / 2);
    double square = z * z;
    double root = z * Math.sqrt(k * (n - k) / n + square / 4);
    double low = k == 0 ? 0 : (k + square / 2 - root) / (n + square);
    double high = k == n ? 1 : (k + square / 2 + root) / (n + square);
    return new Interval(low, high);
  }
}
