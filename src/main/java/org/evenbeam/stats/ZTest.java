package org.evenbeam.stats;

/**
 * The one-sample z test of a bias of zero where the standard deviation is established beforehand:
 * {@code z = b / (sigma / sqrt(n))}. Source: NIST/SEMATECH e-Handbook of Statistical Methods,
 * 7.2.2, with sigma known.
 *
 * @param statistic z
 * @param pTwoSided probability of a z at least as far from zero on either side
 * @param pLess probability of a z at most as large
 * @param pGreater probability of a z at least as large
 * @param standardError sigma / sqrt(n)
 * @param criticalValue the size of z beyond which the two-sided test rejects at alpha
 * @param interval the confidence interval of the bias at level 1 - alpha
 */
public record ZTest(
    double statistic,
    double pTwoSided,
    double pLess,
    double pGreater,
    double standardError,
    double criticalValue,
    Interval interval) {
  /**
   * Tests a bias.
   *
   * @param bias mean of the readings less the reference value
   * @param sigma the established standard deviation of a single reading, above zero
   * @param n number of readings, 1 or more
   * @param alpha significance level, 1e-12 to 0.5
   * @throws IllegalArgumentException if an argument is outside its range
   */
  public static ZTest of(double bias, double sigma, int n, double alpha) {
    Arguments.finite("bias", bias);
    Arguments.positive("sigma", sigma);
    Arguments.atLeast("n", n, 1);
    Arguments.significance(alpha);
    double standardError = sigma / Math.sqrt(n);
    double statistic = bias / standardError;
    double critical = StandardNormal.quantileOfUpperTail(alpha / 2);
    return new ZTest(
        statistic,
        2 * StandardNormal.upperTail(Math.abs(statistic)),
        StandardNormal.lowerTail(statistic),
        StandardNormal.upperTail(statistic),
        standardError,
        critical,
        Interval.about(bias, critical * standardError));
  }
}
