package org.evenbeam.stats;

import org.apache.commons.statistics.distribution.ChiSquaredDistribution;

/**
 * The chi-square test of a standard deviation against a largest permitted one, {@code chi2 = (n -
 * 1) s^2 / sigma0^2}. Source: NIST/SEMATECH e-Handbook of Statistical Methods, 1.3.5.8 and 7.2.3.
 *
 * @param bounds s, degrees of freedom, interval and bounds of sigma
 * @param limit sigma0
 * @param statistic chi2
 * @param pLower probability of a chi2 at most as large: small where sigma is below sigma0
 * @param pUpper probability of a chi2 at least as large: small where sigma is above sigma0
 * @param pTwoSided twice the smaller of the two, at most 1
 * @param criticalLower chi2 at alpha: a chi2 at or below it shows sigma within
 * @param criticalUpper chi2 at 1 - alpha: a chi2 above it shows sigma beyond
 * @param shown what is shown about sigma0, taken from the one-sided bounds
 */
public record VarianceTest(
    StandardDeviationBounds bounds,
    double limit,
    double statistic,
    double pLower,
    double pUpper,
    double pTwoSided,
    double criticalLower,
    double criticalUpper,
    Shown shown) {

  /**
   * Tests a standard deviation.
   *
   * @param bounds what the readings say about sigma, raised to a floor where there is one
   * @param limit sigma0, above zero
   * @throws IllegalArgumentException if {@code limit} is outside its range
   */
  public static VarianceTest of(StandardDeviationBounds bounds, double limit) {
    Arguments.positive("limit", limit);
    int degreesOfFreedom = bounds.degreesOfFreedom();
    ChiSquaredDistribution chi = ChiSquaredDistribution.of(degreesOfFreedom);
    double ratio = bounds.standardDeviation() / limit;
    double statistic = degreesOfFreedom * ratio * ratio;
    double lower = chi.cumulativeProbability(statistic);
    double upper = chi.survivalProbability(statistic);
    return new VarianceTest(
        bounds,
        limit,
        statistic,
        lower,
        upper,
        Math.min(1, 2 * Math.min(lower, upper)),
        chi.inverseCumulativeProbability(bounds.alpha()),
        chi.inverseSurvivalProbability(bounds.alpha()),
        bounds.shownAgainst(limit));
  }

  /**
   * Tests a standard deviation of n readings without a floor.
   *
   * @throws IllegalArgumentException if an argument is outside its range
   */
  public static VarianceTest of(double standardDeviation, int n, double limit, double alpha) {
    return of(StandardDeviationBounds.of(standardDeviation, n, alpha), limit);
  }
}
