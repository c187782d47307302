package org.evenbeam.stats;

import org.apache.commons.statistics.distribution.NormalDistribution;

/** The normal distribution of mean zero and standard deviation one. */
public final class StandardNormal {
  private static final NormalDistribution NORMAL = NormalDistribution.of(0, 1);

  private StandardNormal() {}

  /** The probability of a value of {@code z} or less. */
  public static double lowerTail(double z) {
    return NORMAL.cumulativeProbability(z);
  }

  /** The probability of a value of {@code z} or more. */
  public static double upperTail(double z) {
    return NORMAL.survivalProbability(z);
  }

  /** The probability of a value between {@code low} and {@code high}, also far from zero. */
  public static double between(double low, double high) {
    return NORMAL.probability(low, high);
  }

  /** The value exceeded with the probability {@code upperTail}. */
  public static double quantileOfUpperTail(double upperTail) {
    return NORMAL.inverseSurvivalProbability(upperTail);
  }
}
