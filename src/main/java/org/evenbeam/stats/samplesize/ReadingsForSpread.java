package org.evenbeam.stats.samplesize;

import org.apache.commons.statistics.distribution.ChiSquaredDistribution;
import org.evenbeam.stats.Arguments;
import org.evenbeam.stats.Interval;
import org.evenbeam.stats.StandardDeviationBounds;

/** Readings needed for a standard deviation: width of its interval, and power of its test. */
public final class ReadingsForSpread {
  private ReadingsForSpread() {}

  /**
   * For the two-sided interval of sigma to have no end further from s than a share of s.
   *
   * @param share the share of s, above 0
   * @param alpha 1 - alpha is the level of the interval
   * @throws IllegalArgumentException if an argument is outside its range
   */
  public static ReadingsNeeded forInterval(double share, double alpha) {
    Arguments.positive("share", share);
    return ReadingsNeeded.first(
        2,
        ReadingsNeeded.CAP,
        n -> {
          Interval interval = StandardDeviationBounds.of(1, n, alpha).interval();
          return interval.high() <= 1 + share && interval.low() >= 1 - share;
        });
  }

  /**
   * For the one-sided chi-square test at alpha to show, with at least the given power, that sigma
   * lies above its limit, or below it, when it is {@code ratio} times the limit.
   *
   * @param ratio true sigma over its limit: above 1 to show it beyond, below 1 to show it within
   * @throws IllegalArgumentException if an argument is outside its range, or the ratio is 1
   */
  public static ReadingsNeeded forPower(double ratio, double alpha, double power) {
    Arguments.positive("ratio", ratio);
    Arguments.significance(alpha);
    Arguments.probability("power", power);
    if (ratio == 1) {
      throw new IllegalArgumentException("ratio is 1.0, allowed: above or below 1");
    }
    return ReadingsNeeded.first(2, ReadingsNeeded.CAP, n -> power(ratio, n, alpha) >= power);
  }

  private static double power(double ratio, int n, double alpha) {
    ChiSquaredDistribution chi = ChiSquaredDistribution.of(n - 1);
    double square = ratio * ratio;
    return ratio > 1
        ? chi.survivalProbability(chi.inverseSurvivalProbability(alpha) / square)
        : chi.cumulativeProbability(chi.inverseCumulativeProbability(alpha) / square);
  }
}
