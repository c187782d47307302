package org.evenbeam.stats;

import org.apache.commons.statistics.distribution.ChiSquaredDistribution;

/**
 * What n normal readings say about the true standard deviation sigma: {@code s * sqrt(nu / q)} with
 * q a quantile of chi-square with nu = n - 1. Source: NIST/SEMATECH e-Handbook of Statistical
 * Methods, 1.3.5.8 and 7.2.3.
 *
 * @param standardDeviation s
 * @param degreesOfFreedom n - 1
 * @param alpha the level: 1 - alpha is that of the interval and of each one-sided bound
 * @param interval the two-sided interval of sigma
 * @param lowerBound the one-sided lower bound of sigma
 * @param upperBound the one-sided upper bound of sigma
 */
public record StandardDeviationBounds(
    double standardDeviation,
    int degreesOfFreedom,
    double alpha,
    Interval interval,
    double lowerBound,
    double upperBound) {

  /**
   * Bounds the true standard deviation.
   *
   * @param standardDeviation s of the readings, above zero: for equal readings see {@link
   *     EqualReadingsBound}
   * @param n number of readings, 2 or more
   * @param alpha 1e-12 to 0.5
   * @throws IllegalArgumentException if an argument is outside its range
   */
  public static StandardDeviationBounds of(double standardDeviation, int n, double alpha) {
    Arguments.positive("standardDeviation", standardDeviation);
    Arguments.atLeast("n", n, 2);
    Arguments.significance(alpha);
    ChiSquaredDistribution chi = ChiSquaredDistribution.of(n - 1);
    return new StandardDeviationBounds(
        standardDeviation,
        n - 1,
        alpha,
        new Interval(
            bound(standardDeviation, n - 1, chi.inverseSurvivalProbability(alpha / 2)),
            bound(standardDeviation, n - 1, chi.inverseCumulativeProbability(alpha / 2))),
        bound(standardDeviation, n - 1, chi.inverseSurvivalProbability(alpha)),
        bound(standardDeviation, n - 1, chi.inverseCumulativeProbability(alpha)));
  }

  /**
   * The same with the one-sided upper bound not below {@code floor}, the {@link EqualReadingsBound}
   * at this n: readings that nearly all agree say no more than readings that all agree. The
   * two-sided interval stays that of chi-square.
   *
   * @throws IllegalArgumentException if {@code floor} is negative or not finite
   */
  public StandardDeviationBounds raisedTo(double floor) {
    Arguments.notNegative("floor", floor);
    return new StandardDeviationBounds(
        standardDeviation,
        degreesOfFreedom,
        alpha,
        interval,
        lowerBound,
        Math.max(upperBound, floor));
  }

  /** What the one-sided bounds show about sigma against a largest permitted value. */
  public Shown shownAgainst(double limit) {
    if (upperBound <= limit) {
      return Shown.WITHIN;
    }
    return lowerBound > limit ? Shown.BEYOND : Shown.NEITHER;
  }

  private static double bound(double standardDeviation, int degreesOfFreedom, double quantile) {
    return standardDeviation * Math.sqrt(degreesOfFreedom / quantile);
  }
}
