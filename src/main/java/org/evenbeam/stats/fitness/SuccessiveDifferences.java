package org.evenbeam.stats.fitness;

import org.evenbeam.stats.StandardNormal;

/**
 * The distribution, for independent normal readings, of the sum of squared successive differences
 * over the sum of squares about the mean. It is a ratio of quadratic forms with the eigenvalues
 * {@code 4 sin^2(pi j / 2n)}, j = 1 to n - 1.
 */
final class SuccessiveDifferences {
  /** Up to here Imhof's integral; it costs the number of readings times that of points. */
  static final int LARGEST_EXACT = 1000;

  private static final double STEP = 0.1;
  private static final double NEGLIGIBLE = 1e-18;

  private SuccessiveDifferences() {}

  /**
   * The probability of a ratio of {@code r} or less. Up to 1000 readings the absolute error is
   * below 1e-12, above it below 1e-6.
   */
  static double lowerTail(int n, double r) {
    double smallest = eigenvalue(n, 1);
    if (r <= smallest) {
      return 0;
    }
    if (r >= 4 - smallest) {
      return 1;
    }
    return n <= LARGEST_EXACT ? imhof(n, r) : edgeworth(n, r);
  }

  private static double eigenvalue(int n, int j) {
    double sine = Math.sin(Math.PI * j / (2.0 * n));
    return 4 * sine * sine;
  }

  /**
   * Imhof's inversion, {@code P = 1/2 - (1/pi) integral of sin(theta(u)) / (u rho(u)) du}, theta
   * and rho being half the sum of arctangents and the product of fourth roots: Biometrika 48 (1961)
   * 419, doi:10.1093/biomet/48.3-4.419. With the logarithm of u as variable the integrand is
   * analytic in a strip and falls off exponentially, so that the trapezium rule has all digits.
   */
  private static double imhof(int n, double r) {
    double[] weights = new double[n - 1];
    for (int j = 1; j < n; j++) {
      weights[j - 1] = eigenvalue(n, j) - r;
    }
    // Outside this range of log u one of the two factors is negligible.
    double from = Math.log(NEGLIGIBLE / n);
    double sum = 0;
    double size = 1;
    for (double y = from; size > NEGLIGIBLE || y < 0; y += STEP) {
      double u = Math.exp(y);
      size = 1 / rho(weights, u);
      sum += Math.sin(theta(weights, u)) * size;
    }
    return Math.min(1, Math.max(0, 0.5 - sum * STEP / Math.PI));
  }

  private static double theta(double[] weights, double u) {
    double sum = 0;
    for (double weight : weights) {
      sum += Math.atan(weight * u);
    }
    return sum / 2;
  }

  private static double rho(double[] weights, double u) {
    double sum = 0;
    for (double weight : weights) {
      sum += Math.log1p(weight * u * weight * u);
    }
    return Math.exp(sum / 4);
  }

  /**
   * The normal approximation with the term of the fourth cumulant (Edgeworth); the third is zero by
   * symmetry. The moments are exact: those of the form divided by those of the sum of squares,
   * which is independent of the ratio.
   */
  static double edgeworth(int n, double r) {
    double freedom = n - 1.0;
    double variance = 4 * (n - 2.0) / (freedom * (freedom + 2));
    double fourth =
        (48 * (6.0 * n - 16) + 48 * (n - 2.0) * (n - 2.0))
            / (freedom * (freedom + 2) * (freedom + 4) * (freedom + 6));
    double excess = fourth / (variance * variance) - 3;
    double z = (r - 2) / Math.sqrt(variance);
    double density = Math.exp(-z * z / 2) / Math.sqrt(2 * Math.PI);
    double corrected = StandardNormal.lowerTail(z) - density * excess / 24 * (z * z - 3) * z;
    return Math.min(1, Math.max(0, corrected));
  }
}
