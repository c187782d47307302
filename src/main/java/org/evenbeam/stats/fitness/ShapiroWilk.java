package org.evenbeam.stats.fitness;

import java.util.Arrays;
import java.util.Optional;
import org.apache.commons.math3.analysis.polynomials.PolynomialFunction;
import org.evenbeam.stats.ExactSample;
import org.evenbeam.stats.StandardNormal;

/**
 * The Shapiro-Wilk test of normality in Royston's approximation, algorithm AS R94, which has all
 * constants used here: Royston, Applied Statistics 44 (1995) 547, doi:10.2307/2986146.
 *
 * @param statistic W, at most 1
 * @param p small where the readings are not normal
 */
public record ShapiroWilk(double statistic, double p) {
  /** The fewest readings that it takes. */
  public static final int FEWEST = 3;

  /** The most readings for which the approximation was made. */
  public static final int MOST = 5000;

  private static final PolynomialFunction LAST_WEIGHT =
      new PolynomialFunction(new double[] {0, 0.221157, -0.147981, -2.071190, 4.434685, -2.706056});
  private static final PolynomialFunction NEXT_WEIGHT =
      new PolynomialFunction(new double[] {0, 0.042981, -0.293762, -1.752461, 5.682633, -3.582633});
  private static final PolynomialFunction SMALL_SHIFT =
      new PolynomialFunction(new double[] {-2.273, 0.459});
  private static final PolynomialFunction SMALL_MEAN =
      new PolynomialFunction(new double[] {0.5440, -0.39978, 0.025054, -6.714e-4});
  private static final PolynomialFunction SMALL_LOG_DEVIATION =
      new PolynomialFunction(new double[] {1.3822, -0.77857, 0.062767, -0.0020322});
  private static final PolynomialFunction LARGE_MEAN =
      new PolynomialFunction(new double[] {-1.5861, -0.31082, -0.083751, 0.0038915});
  private static final PolynomialFunction LARGE_LOG_DEVIATION =
      new PolynomialFunction(new double[] {-0.4803, -0.082676, 0.0030302});

  /** Tests readings; empty where there are fewer than 3, more than 5000, or all are equal. */
  public static Optional<ShapiroWilk> of(ExactSample sample) {
    int n = sample.n();
    if (n < FEWEST || n > MOST || sample.allEqual()) {
      return Optional.empty();
    }
    double[] sorted = sample.deviations();
    Arrays.sort(sorted);
    double oneMinusW = oneMinusW(sorted, weights(n), sample.sumOfSquaresAboutMean());
    return Optional.of(
        new ShapiroWilk(1 - oneMinusW, n == 3 ? exactP(oneMinusW) : p(oneMinusW, n)));
  }

  /**
   * Weights of the larger half, the largest reading first; those of the smaller half mirror them.
   */
  private static double[] weights(int n) {
    if (n == 3) {
      return new double[] {Math.sqrt(0.5)};
    }
    double[] scores = new double[n / 2];
    for (int i = 0; i < scores.length; i++) {
      scores[i] = StandardNormal.quantileOfUpperTail((i + 1 - 0.375) / (n + 0.25));
    }
    double squares = 2 * Arrays.stream(scores).map(m -> m * m).sum();
    double root = 1 / Math.sqrt(n);
    double[] corrected =
        n > 5
            ? new double[] {
              LAST_WEIGHT.value(root) + scores[0] / Math.sqrt(squares),
              NEXT_WEIGHT.value(root) + scores[1] / Math.sqrt(squares)
            }
            : new double[] {LAST_WEIGHT.value(root) + scores[0] / Math.sqrt(squares)};
    return withRest(scores, corrected, squares);
  }

  /** Scales the other scores so that the squares of all weights add up to one. */
  private static double[] withRest(double[] scores, double[] corrected, double squares) {
    double left = squares;
    double share = 1;
    for (int i = 0; i < corrected.length; i++) {
      left -= 2 * scores[i] * scores[i];
      share -= 2 * corrected[i] * corrected[i];
    }
    double scale = Math.sqrt(share / left);
    double[] weights = Arrays.stream(scores).map(m -> m * scale).toArray();
    System.arraycopy(corrected, 0, weights, 0, corrected.length);
    return weights;
  }

  /** 1 - W without cancellation where W is near 1, never below zero. */
  private static double oneMinusW(double[] sorted, double[] weights, double squares) {
    double sum = 0;
    for (int i = 0; i < weights.length; i++) {
      sum += weights[i] * (sorted[sorted.length - 1 - i] - sorted[i]);
    }
    double root = Math.sqrt(squares);
    return Math.max(0, (root - sum) / root * ((root + sum) / root));
  }

  /**
   * For three readings the distribution of W is known: {@code (6/pi)(asin(sqrt W) - asin(sqrt
   * 3/4))}.
   */
  private static double exactP(double oneMinusW) {
    double angle = Math.atan2(Math.sqrt(1 - oneMinusW), Math.sqrt(oneMinusW));
    return Math.min(1, Math.max(0, 6 / Math.PI * (angle - Math.PI / 3)));
  }

  private static double p(double oneMinusW, int n) {
    double y = Math.log(oneMinusW);
    if (n > 11) {
      double size = Math.log(n);
      return upperTail(y, LARGE_MEAN.value(size), LARGE_LOG_DEVIATION.value(size));
    }
    double shift = SMALL_SHIFT.value(n);
    return y >= shift
        ? 0
        : upperTail(-Math.log(shift - y), SMALL_MEAN.value(n), SMALL_LOG_DEVIATION.value(n));
  }

  private static double upperTail(double value, double mean, double logDeviation) {
    return StandardNormal.upperTail((value - mean) / Math.exp(logDeviation));
  }
}
