package org.evenbeam.stats.rounding;

import java.util.Optional;
import java.util.function.DoubleUnaryOperator;
import org.apache.commons.math3.analysis.solvers.BrentSolver;
import org.evenbeam.stats.Arguments;
import org.evenbeam.stats.ExactSample;
import org.evenbeam.stats.Interval;

/**
 * Intervals by profile likelihood of normal readings rounded to their resolution: all values whose
 * likelihood, the other parameter being as favourable as it can be, is not too far below the
 * largest. Source: Kulldorff, Contributions to the Theory of Estimation from Grouped and Partially
 * Grouped Samples (1961), for the likelihood; Venzon and Moolgavkar, Applied Statistics 37 (1988)
 * 87, doi:10.2307/2347496, for the intervals. How far is too far is taken such that unrounded
 * readings would have exactly the level: for the mean it is then the interval of the t test.
 *
 * @param mean interval of the true mean less the exact mean of the readings
 * @param standardDeviation interval of the true standard deviation; its lower end is 0 where
 *     rounding alone explains the readings
 */
public record RoundedProfile(Interval mean, Interval standardDeviation) {
  /** With more values than this the readings are not coarse, and nothing is gained. */
  public static final int MOST_VALUES = 200;

  private static final double ACCURACY = 1e-10;
  private static final int MOST_EVALUATIONS = 300;
  private static final int MOST_DOUBLINGS = 200;

  /**
   * Finds both intervals; empty where there are more than 200 different values.
   *
   * @param sample 2 readings or more
   * @param resolution the step of the readings, above zero
   * @param alpha 1 - alpha is the level of each interval
   * @throws IllegalArgumentException if an argument is outside its range
   */
  public static Optional<RoundedProfile> of(ExactSample sample, double resolution, double alpha) {
    Arguments.atLeast("number of readings", sample.n(), 2);
    Arguments.positive("resolution", resolution);
    Arguments.significance(alpha);
    if (sample.distinctValues() > MOST_VALUES) {
      return Optional.empty();
    }
    RoundedLikelihood likelihood = RoundedLikelihood.of(sample, resolution);
    double bestMean = likelihood.bestMean();
    double largest = likelihood.atMean(bestMean);
    double farMean = largest - Thresholds.ofMean(sample.n(), alpha);
    double farSigma = largest - Thresholds.ofStandardDeviation(sample.n(), alpha);
    Interval mean =
        new Interval(
            end(mu -> likelihood.atMean(mu) - farMean, bestMean, -1),
            end(mu -> likelihood.atMean(mu) - farMean, bestMean, 1));
    Interval sigma = sigma(likelihood, farSigma, likelihood.bestSigma(bestMean));
    return Optional.of(new RoundedProfile(scaled(mean, resolution), scaled(sigma, resolution)));
  }

  private static Interval sigma(RoundedLikelihood likelihood, double far, double best) {
    DoubleUnaryOperator above = log -> likelihood.atSigma(Math.exp(log)) - far;
    double from = Math.log(best);
    double least = Math.log(RoundedLikelihood.LEAST_SIGMA);
    double low =
        above.applyAsDouble(least) >= 0 ? 0 : Math.exp(root(above, least, Math.max(least, from)));
    return new Interval(low, Math.exp(end(above, from, 1)));
  }

  /** Where a function falls through zero on one side of a point at which it is positive. */
  private static double end(DoubleUnaryOperator above, double inside, int side) {
    double near = inside;
    double step = 1;
    for (int i = 0; i < MOST_DOUBLINGS; i++) {
      double next = inside + side * step;
      if (above.applyAsDouble(next) < 0) {
        return root(above, near, next);
      }
      near = next;
      step *= 2;
    }
    return side * Double.POSITIVE_INFINITY;
  }

  private static double root(DoubleUnaryOperator function, double one, double other) {
    return new BrentSolver(ACCURACY, ACCURACY)
        .solve(
            MOST_EVALUATIONS, function::applyAsDouble, Math.min(one, other), Math.max(one, other));
  }

  private static Interval scaled(Interval interval, double unit) {
    return new Interval(interval.low() * unit, interval.high() * unit);
  }
}
