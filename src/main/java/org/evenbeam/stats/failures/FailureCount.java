package org.evenbeam.stats.failures;

import org.apache.commons.statistics.distribution.BinomialDistribution;
import org.evenbeam.stats.Arguments;

/**
 * Failures counted in independent trials.
 *
 * @param failures k, 0 to n
 * @param n number of trials, 1 or more
 */
public record FailureCount(int failures, int n) {
  /** How far R lets a probability lie above the observed one and still counts it as no greater. */
  private static final double AS_PROBABLE = 1 + 1e-7;

  /**
   * Makes a count.
   *
   * @throws IllegalArgumentException if an argument is outside its range
   */
  public FailureCount {
    Arguments.atLeast("n", n, 1);
    if (failures < 0 || failures > n) {
      throw new IllegalArgumentException("failures is " + failures + ", allowed: 0 to " + n);
    }
  }

  /**
   * The exact binomial test of a failure rate. The two-sided p is the sum over all outcomes no more
   * probable than the one observed, as in R's {@code binom.test} (with its allowance of 1e-7);
   * doubling the smaller tail is another definition, not used here.
   *
   * @param rate the failure rate tested, 0 to 1 exclusive
   * @throws IllegalArgumentException if {@code rate} is outside its range
   */
  public BinomialTest testAgainst(double rate) {
    Arguments.probability("rate", rate);
    BinomialDistribution outcomes = BinomialDistribution.of(n, rate);
    double less = outcomes.cumulativeProbability(failures);
    double greater = atLeast(outcomes, failures);
    return new BinomialTest(twoSided(outcomes, rate), less, greater);
  }

  private double twoSided(BinomialDistribution outcomes, double rate) {
    double mean = n * rate;
    if (failures == mean) {
      return 1;
    }
    double probable = outcomes.probability(failures) * AS_PROBABLE;
    double both =
        failures < mean
            ? outcomes.cumulativeProbability(failures)
                + atLeast(outcomes, firstAbove(outcomes, (int) Math.ceil(mean), probable))
            : atLeast(outcomes, failures)
                + outcomes.cumulativeProbability(
                    lastBelow(outcomes, (int) Math.floor(mean), probable));
    return Math.min(1, both);
  }

  /**
   * The first count from {@code low} up that is no more probable; probabilities fall from there.
   */
  private int firstAbove(BinomialDistribution outcomes, int low, double probable) {
    int from = low;
    int to = n + 1;
    while (from < to) {
      int middle = from + (to - from) / 2;
      if (outcomes.probability(middle) <= probable) {
        to = middle;
      } else {
        from = middle + 1;
      }
    }
    return from;
  }

  /** The last count from {@code high} down that is no more probable; -1 where there is none. */
  private static int lastBelow(BinomialDistribution outcomes, int high, double probable) {
    int from = -1;
    int to = high;
    while (from < to) {
      int middle = from + (to - from + 1) / 2;
      if (outcomes.probability(middle) <= probable) {
        from = middle;
      } else {
        to = middle - 1;
      }
    }
    return from;
  }

  private static double atLeast(BinomialDistribution outcomes, int count) {
    return outcomes.survivalProbability(count - 1);
  }

  /**
   * The normal approximation of the same test, {@code z = (k / n - p) / sqrt(p (1 - p) / n)}: NIST/
   * SEMATECH e-Handbook of Statistical Methods, 7.2.4.
   *
   * @throws IllegalArgumentException if {@code rate} is not above 0 and below 1
   */
  public ProportionZ approximateTestAgainst(double rate) {
    Arguments.probability("rate", rate);
    return ProportionZ.of(this, rate);
  }

  /**
   * Bounds of the true failure rate.
   *
   * @param alpha 1 - alpha is the level of each interval and of each one-sided bound
   * @throws IllegalArgumentException if {@code alpha} is outside 1e-12 to 0.5
   */
  public FailureBounds bounds(double alpha) {
    return FailureBounds.of(this, alpha);
  }
}
