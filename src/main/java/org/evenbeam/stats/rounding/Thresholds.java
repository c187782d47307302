package org.evenbeam.stats.rounding;

import java.util.function.DoubleUnaryOperator;
import org.apache.commons.math3.analysis.solvers.BrentSolver;
import org.apache.commons.statistics.distribution.ChiSquaredDistribution;
import org.evenbeam.stats.Student;

/**
 * How far below its maximum a profile log-likelihood of n unrounded normal readings may lie in an
 * interval of level 1 - alpha; exact, since both ratios are functions of a pivot.
 */
final class Thresholds {
  private Thresholds() {}

  /** For the mean: {@code (n/2) log(1 + t^2 / (n - 1))}, t at 1 - alpha / 2. */
  static double ofMean(int n, double alpha) {
    double t = Student.of(n - 1).quantileOfUpperTail(alpha / 2);
    return n / 2.0 * Math.log1p(t * t / (n - 1));
  }

  /**
   * For the standard deviation: {@code (n/2)(r - 1 - log r)}, where r = sum of squares / (n
   * sigma^2) is chi-square over n and lies outside the two r of that value with probability alpha.
   */
  static double ofStandardDeviation(int n, double alpha) {
    ChiSquaredDistribution chi = ChiSquaredDistribution.of(n - 1);
    DoubleUnaryOperator outside =
        logW -> {
          double w = Math.exp(logW);
          double below = Math.exp(solve(y -> Math.expm1(y) - y - w, -w - 1, 0));
          double above = Math.exp(solve(y -> Math.expm1(y) - y - w, 0, Math.log(2 * w + 4)));
          double tails = chi.cumulativeProbability(n * below) + chi.survivalProbability(n * above);
          return Math.log(tails / alpha);
        };
    return n / 2.0 * Math.exp(solve(outside, Math.log(1e-9 / n), Math.log(1e3)));
  }

  private static double solve(DoubleUnaryOperator function, double low, double high) {
    return new BrentSolver(1e-14, 1e-14).solve(300, function::applyAsDouble, low, high);
  }
}
