package org.evenbeam.stats.failures;

import java.util.Optional;
import java.util.OptionalInt;
import org.apache.commons.statistics.distribution.BinomialDistribution;
import org.evenbeam.stats.Arguments;

/**
 * A plan by attributes: n trials pass with at most c failures. Source: ISO 2859-1 uses such plans;
 * the chances are sums of the binomial distribution.
 *
 * @param n number of trials, 1 or more
 * @param acceptance the acceptance number c, 0 to n
 */
public record AcceptancePlan(int n, int acceptance) {
  /** The most trials that a search looks at. */
  public static final int MOST = 1_000_000;

  /**
   * Makes a plan.
   *
   * @throws IllegalArgumentException if an argument is outside its range
   */
  public AcceptancePlan {
    Arguments.atLeast("n", n, 1);
    if (acceptance < 0 || acceptance > n) {
      throw new IllegalArgumentException("acceptance is " + acceptance + ", allowed: 0 to " + n);
    }
  }

  /** The chance that an instrument of the given failure rate, 0 to 1, passes. */
  public double passes(double rate) {
    return BinomialDistribution.of(n, rate).cumulativeProbability(acceptance);
  }

  /**
   * The failure rate at which the chance to pass has fallen to {@code missed}: Clopper and
   * Pearson's upper bound for c failures.
   *
   * @param missed 1e-12 to 0.5
   * @throws IllegalArgumentException if {@code missed} is outside its range
   */
  public double detectableRate(double missed) {
    return new FailureCount(acceptance, n).bounds(missed).upperBound();
  }

  /**
   * The fewest trials with which c failures show, at level 1 - alpha, a rate within its limit;
   * absent where a million are too few.
   *
   * @param acceptance c, 0 or more
   * @param limit the maximum permissible failure rate, above 0 and below 1
   * @param alpha 1e-12 to 0.5
   * @throws IllegalArgumentException if an argument is outside its range
   */
  public static OptionalInt fewestTrials(int acceptance, double limit, double alpha) {
    Arguments.atLeast("acceptance", acceptance, 0);
    Arguments.probability("limit", limit);
    Arguments.significance(alpha);
    return fewestTrials(acceptance, limit, alpha, acceptance);
  }

  /**
   * The plan with the fewest trials that passes an instrument of the good rate with a chance of at
   * least 1 - alpha and one of the bad rate with a chance of at most beta; empty where a million
   * trials are too few.
   *
   * @throws IllegalArgumentException if an argument is outside its range, or the good rate is not
   *     the smaller
   */
  public static Optional<AcceptancePlan> fewest(
      double goodRate, double alpha, double badRate, double beta) {
    Arguments.probability("goodRate", goodRate);
    Arguments.probability("badRate", badRate);
    Arguments.significance(alpha);
    if (goodRate >= badRate) {
      throw new IllegalArgumentException(
          "goodRate is " + goodRate + ", allowed: below badRate " + badRate);
    }
    OptionalInt n = fewestTrials(0, badRate, beta);
    for (int c = 0; n.isPresent(); c++) {
      AcceptancePlan plan = new AcceptancePlan(n.getAsInt(), c);
      if (plan.passes(goodRate) >= 1 - alpha) {
        return Optional.of(plan);
      }
      n = fewestTrials(c + 1, badRate, beta, n.getAsInt());
    }
    return Optional.empty();
  }

  /** The same, known to be more than {@code tooFew}: more failures allowed need more trials. */
  private static OptionalInt fewestTrials(int acceptance, double limit, double alpha, int tooFew) {
    int low = tooFew;
    int high = tooFew;
    for (int step = 1; high == low || !shows(high, acceptance, limit, alpha); step *= 2) {
      if (high >= MOST) {
        return OptionalInt.empty();
      }
      low = high;
      high = Math.min(MOST, high + step);
    }
    while (high - low > 1) {
      int middle = low + (high - low) / 2;
      if (shows(middle, acceptance, limit, alpha)) {
        high = middle;
      } else {
        low = middle;
      }
    }
    return OptionalInt.of(high);
  }

  private static boolean shows(int n, int acceptance, double limit, double alpha) {
    return new AcceptancePlan(n, acceptance).passes(limit) <= alpha;
  }
}
