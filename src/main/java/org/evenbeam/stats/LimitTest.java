package org.evenbeam.stats;

/**
 * Two one-sided t tests of a bias against its limits. Source: Schuirmann, J. Pharmacokinet.
 * Biopharm. 15 (1987) 657, doi:10.1007/BF01068419; the standard uncertainty takes the place of
 * {@code s / sqrt(n)}, its effective degrees of freedom that of n - 1 (JCGM 100:2008, G.4).
 *
 * <p>The decision is taken on the bounds, so that what is drawn and what is decided cannot differ:
 * within where the interval at level 1 - 2 alpha lies in the limits, their ends included; beyond
 * where it lies wholly outside, since its ends are the one-sided bounds at level 1 - alpha.
 *
 * @param bias the bias tested
 * @param standardUncertainty its standard uncertainty
 * @param degreesOfFreedom the effective degrees of freedom of that
 * @param statisticLower distance of the bias above the lower limit, in standard uncertainties
 * @param statisticUpper distance of the bias above the upper limit, negative where it is below
 * @param pLower p of the hypothesis that the true bias is at or below the lower limit
 * @param pUpper p of the hypothesis that the true bias is at or above the upper limit
 * @param criticalValue t at 1 - alpha
 * @param interval the interval at level 1 - 2 alpha; each end is a one-sided bound at 1 - alpha
 * @param shown what is shown about the limits
 */
public record LimitTest(
    double bias,
    double standardUncertainty,
    double degreesOfFreedom,
    double statisticLower,
    double statisticUpper,
    double pLower,
    double pUpper,
    double criticalValue,
    Interval interval,
    Shown shown) {

  /**
   * Tests a bias against its limits. A standard uncertainty of zero makes the interval a point and
   * each p zero or one; a side without a limit has p zero.
   *
   * @param bias mean of the readings less the reference value
   * @param uncertainty its standard uncertainty with effective degrees of freedom
   * @param limits the limits
   * @param alpha significance level of each one-sided test, 1e-12 to 0.5
   * @throws IllegalArgumentException if an argument is outside its range
   */
  public static LimitTest of(
      double bias, CombinedUncertainty uncertainty, BiasLimits limits, double alpha) {
    Arguments.finite("bias", bias);
    Arguments.significance(alpha);
    double u = Arguments.notNegative("standardUncertainty", uncertainty.standardUncertainty());
    Student t = Student.of(uncertainty.degreesOfFreedom());
    double critical = t.quantileOfUpperTail(alpha);
    Interval interval = Interval.about(bias, critical * u);
    double statisticLower = inUncertainties(bias + limits.below(), u, 1);
    double statisticUpper = inUncertainties(bias - limits.above(), u, -1);
    return new LimitTest(
        bias,
        u,
        uncertainty.degreesOfFreedom(),
        statisticLower,
        statisticUpper,
        t.upperTail(statisticLower),
        t.lowerTail(statisticUpper),
        critical,
        interval,
        shown(interval, limits.permitted()));
  }

  /** The larger p of the two tests: that of the hypothesis that the bias is not within. */
  public double pNotWithin() {
    return Math.max(pLower, pUpper);
  }

  /** Without uncertainty a bias is on one side or the other, and on the limit it is within. */
  private static double inUncertainties(double distance, double u, int inward) {
    if (u > 0) {
      return distance / u;
    }
    double side = distance == 0 ? inward : Math.signum(distance);
    return side * Double.POSITIVE_INFINITY;
  }

  private static Shown shown(Interval interval, Interval permitted) {
    if (interval.liesIn(permitted)) {
      return Shown.WITHIN;
    }
    boolean beyond = interval.low() > permitted.high() || interval.high() < permitted.low();
    return beyond ? Shown.BEYOND : Shown.NEITHER;
  }
}
