package org.evenbeam.stats.samplesize;

import org.evenbeam.stats.Arguments;
import org.evenbeam.stats.StandardNormal;
import org.evenbeam.stats.Student;
import org.evenbeam.stats.risk.NoncentralT;

/** Readings needed for a mean: half-width of its interval, and power of the t test. */
public final class ReadingsForMean {
  private ReadingsForMean() {}

  /**
   * For the half-width of the interval of the bias where sigma is known: {@code (z sigma / E)^2}, z
   * at 1 - alpha / 2. Source: NIST/SEMATECH e-Handbook of Statistical Methods, 7.2.2.2.
   *
   * @throws IllegalArgumentException if an argument is outside its range
   */
  public static ReadingsNeeded forHalfWidth(double sigma, double halfWidth, double alpha) {
    double ratio = ratio(sigma, halfWidth);
    double z = StandardNormal.quantileOfUpperTail(Arguments.significance(alpha) / 2);
    return ReadingsNeeded.roundedUp(z * ratio * z * ratio, 1);
  }

  /**
   * The same where s has to be found from the readings and is expected to be sigma: the first n
   * with {@code t sigma / sqrt(n) <= E}, t at n - 1 degrees of freedom.
   *
   * @throws IllegalArgumentException if an argument is outside its range
   */
  public static ReadingsNeeded forHalfWidthByT(double sigma, double halfWidth, double alpha) {
    double ratio = ratio(sigma, halfWidth);
    Arguments.significance(alpha);
    return ReadingsNeeded.first(
        2,
        ReadingsNeeded.CAP,
        n -> Student.of(n - 1).quantileOfUpperTail(alpha / 2) * ratio <= Math.sqrt(n));
  }

  /**
   * For the two-sided t test at alpha to reject, with at least the given power, a bias of {@code
   * bias} with a standard deviation {@code sigma}; rejections on either side count.
   *
   * @throws IllegalArgumentException if an argument is outside its range
   */
  public static ReadingsNeeded forTwoSidedPower(
      double bias, double sigma, double alpha, double power) {
    double effect = Arguments.positive("bias", bias) / Arguments.positive("sigma", sigma);
    Arguments.probability("power", power);
    Arguments.significance(alpha);
    return ReadingsNeeded.first(
        2, ReadingsNeeded.CAP, n -> twoSidedPower(effect, n, alpha) >= power);
  }

  /**
   * For the one-sided t test at alpha; see {@link #forTwoSidedPower}.
   *
   * @throws IllegalArgumentException if an argument is outside its range
   */
  public static ReadingsNeeded forOneSidedPower(
      double bias, double sigma, double alpha, double power) {
    double effect = Arguments.positive("bias", bias) / Arguments.positive("sigma", sigma);
    Arguments.probability("power", power);
    Arguments.significance(alpha);
    return ReadingsNeeded.first(
        2, ReadingsNeeded.CAP, n -> oneSidedPower(effect, n, alpha) >= power);
  }

  private static double twoSidedPower(double effect, int n, double alpha) {
    double critical = Student.of(n - 1).quantileOfUpperTail(alpha / 2);
    NoncentralT t = NoncentralT.of(n - 1, effect * Math.sqrt(n));
    return t.upperTail(critical) + t.lowerTail(-critical);
  }

  private static double oneSidedPower(double effect, int n, double alpha) {
    double critical = Student.of(n - 1).quantileOfUpperTail(alpha);
    return NoncentralT.of(n - 1, effect * Math.sqrt(n)).upperTail(critical);
  }

  private static double ratio(double sigma, double halfWidth) {
    return Arguments.positive("sigma", sigma) / Arguments.positive("halfWidth", halfWidth);
  }
}
