package org.evenbeam.stats;

/**
 * The one-sample t test of a bias of zero: {@code t = b / (s / sqrt(n))} with n - 1 degrees of
 * freedom. Source: Student, Biometrika 6 (1908) 1, doi:10.1093/biomet/6.1.1; NIST/SEMATECH
 * e-Handbook of Statistical Methods, 7.2.2.
 *
 * @param statistic t
 * @param degreesOfFreedom n - 1
 * @param pTwoSided probability of a t at least as far from zero on either side
 * @param pLess probability of a t at most as large: small where the bias is below zero
 * @param pGreater probability of a t at least as large: small where the bias is above zero
 * @param standardError s / sqrt(n)
 * @param criticalValue the size of t beyond which the two-sided test rejects at alpha
 * @param interval the confidence interval of the bias at level 1 - alpha
 */
public record StudentTTest(
    double statistic,
    double degreesOfFreedom,
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
   * @param standardDeviation s of the readings, above zero: equal readings have no t
   * @param n number of readings, 2 or more
   * @param alpha significance level, 1e-12 to 0.5
   * @throws IllegalArgumentException if an argument is outside its range
   */
  public static StudentTTest of(double bias, double standardDeviation, int n, double alpha) {
    Arguments.finite("bias", bias);
    Arguments.positive("standardDeviation", standardDeviation);
    Arguments.atLeast("n", n, 2);
    Arguments.significance(alpha);
    double standardError = standardDeviation / Math.sqrt(n);
    double statistic = bias / standardError;
    Student t = Student.of(n - 1);
    double critical = t.quantileOfUpperTail(alpha / 2);
    return new StudentTTest(
        statistic,
        n - 1,
        2 * t.upperTail(Math.abs(statistic)),
        t.lowerTail(statistic),
        t.upperTail(statistic),
        standardError,
        critical,
        Interval.about(bias, critical * standardError));
  }
}
