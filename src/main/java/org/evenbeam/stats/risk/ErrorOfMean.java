package org.evenbeam.stats.risk;

import org.evenbeam.stats.StandardNormal;

/**
 * The error that moves an observed bias about the true one: normal, uniform over a step, or the sum
 * of both.
 *
 * @param deviation standard deviation of the normal part, 0 or more
 * @param step width of the uniform part, 0 or more; not zero where {@code deviation} is
 */
record ErrorOfMean(double deviation, double step) {
  static ErrorOfMean normal(double deviation) {
    return new ErrorOfMean(deviation, 0);
  }

  /** The probability of an error of {@code x} or less. */
  double lowerTail(double x) {
    if (deviation >= step) {
      // A normal part that is the wider of the two leaves only the variance of the other to be
      // seen.
      return StandardNormal.lowerTail(x / Math.hypot(deviation, step / Math.sqrt(12)));
    }
    if (Double.isInfinite(x)) {
      return x > 0 ? 1 : 0;
    }
    if (deviation == 0) {
      return Math.min(1, Math.max(0, x / step + 0.5));
    }
    double upper = integral((x + step / 2) / deviation);
    double lower = integral((x - step / 2) / deviation);
    return Math.min(1, Math.max(0, deviation / step * (upper - lower)));
  }

  /** The integral of Phi up to z, {@code z Phi(z) + phi(z)}. */
  private static double integral(double z) {
    return z * StandardNormal.lowerTail(z) + Math.exp(-z * z / 2) / Math.sqrt(2 * Math.PI);
  }
}
