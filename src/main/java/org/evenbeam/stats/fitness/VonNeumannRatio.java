package org.evenbeam.stats.fitness;

import java.util.Optional;
import org.evenbeam.stats.ExactSample;

/**
 * The von Neumann ratio of the mean square successive difference to the variance, {@code [sum of
 * (x_(i+1) - x_i)^2 / (n - 1)] / [sum of (x_i - mean)^2 / n]}, about 2 for independent readings.
 * Source: von Neumann, Ann. Math. Statist. 12 (1941) 367, doi:10.1214/aoms/1177731677.
 *
 * @param statistic the ratio
 * @param pLower probability of a ratio at most as large: small where neighbours are alike
 * @param pUpper probability of a ratio at least as large: small where neighbours alternate
 * @param pTwoSided twice the smaller, at most 1
 */
public record VonNeumannRatio(double statistic, double pLower, double pUpper, double pTwoSided) {
  /** The fewest readings that it takes. */
  public static final int FEWEST = 3;

  /** Tests the order of readings; empty below 3 readings or where all are equal. */
  public static Optional<VonNeumannRatio> of(ExactSample sample) {
    int n = sample.n();
    if (n < FEWEST || sample.allEqual()) {
      return Optional.empty();
    }
    double ratio = sample.sumOfSquaredDifferences() / sample.sumOfSquaresAboutMean();
    double lower = SuccessiveDifferences.lowerTail(n, ratio);
    // The ratio of sums is symmetric about 2.
    double upper = SuccessiveDifferences.lowerTail(n, 4 - ratio);
    double two = Math.min(1, 2 * Math.min(lower, upper));
    return Optional.of(new VonNeumannRatio(ratio * n / (n - 1), lower, upper, two));
  }
}
