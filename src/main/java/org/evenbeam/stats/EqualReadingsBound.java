package org.evenbeam.stats;

/**
 * What n equal readings at a resolution d say about the standard deviation: the largest sigma at
 * which an unlucky instrument would still show n equal readings with probability alpha. It takes
 * the place of the chi-square bound, since s = 0 says nothing below the resolution, and is the
 * floor of that bound for any other readings.
 *
 * <p>Formula: the sigma at which {@code max over delta of sum over k of [Phi(((k + 1/2) d - delta)
 * / sigma) - Phi(((k - 1/2) d - delta) / sigma)]^n = alpha}, delta being where the true value lies
 * between two digits: the exact one-sided bound by inverting the test that rejects on equal
 * readings (the inversion as for Clopper and Pearson, Biometrika 26 (1934) 404,
 * doi:10.1093/biomet/26.4.404).
 *
 * @param n number of readings
 * @param resolution d
 * @param alpha 1 - alpha is the level of the bound
 * @param upperBound the one-sided upper bound of sigma
 */
public record EqualReadingsBound(int n, double resolution, double alpha, double upperBound) {

  /**
   * Bounds the true standard deviation of equal readings.
   *
   * @param n number of readings, 2 or more
   * @param resolution the step of the readings, above zero
   * @param alpha 1e-12 to 0.5
   * @throws IllegalArgumentException if an argument is outside its range
   */
  public static EqualReadingsBound of(int n, double resolution, double alpha) {
    Arguments.atLeast("n", n, 2);
    Arguments.positive("resolution", resolution);
    Arguments.significance(alpha);
    double relative = EqualReadings.sigmaOfProbability(n, alpha);
    return new EqualReadingsBound(n, resolution, alpha, relative * resolution);
  }

  /**
   * What the bound shows against a largest permitted standard deviation: within or neither, since
   * equal readings never show that it is exceeded.
   */
  public Shown shownAgainst(double limit) {
    return upperBound <= limit ? Shown.WITHIN : Shown.NEITHER;
  }
}
