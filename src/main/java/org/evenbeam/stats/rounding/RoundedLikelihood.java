package org.evenbeam.stats.rounding;

import java.util.Arrays;
import java.util.function.DoubleUnaryOperator;
import org.apache.commons.math3.optim.MaxEval;
import org.apache.commons.math3.optim.nonlinear.scalar.GoalType;
import org.apache.commons.math3.optim.univariate.BrentOptimizer;
import org.apache.commons.math3.optim.univariate.SearchInterval;
import org.apache.commons.math3.optim.univariate.UnivariateObjectiveFunction;
import org.apache.commons.math3.optim.univariate.UnivariatePointValuePair;
import org.evenbeam.stats.ExactSample;
import org.evenbeam.stats.StandardNormal;

/**
 * The log-likelihood {@code sum of log[Phi((x + d/2 - mu)/sigma) - Phi((x - d/2 - mu)/sigma)]} of
 * rounded normal readings, in units of d and from their exact mean. It is concave in mu / sigma and
 * 1 / sigma (Burridge, J. R. Statist. Soc. B 43 (1981) 41; the logarithm of a normal probability of
 * a convex set being concave), so each profile has one maximum.
 */
final class RoundedLikelihood {
  /** As good as none, in units of the resolution. */
  static final double LEAST_SIGMA = 1e-3;

  private static final double ACCURACY = 1e-9;
  private static final int MOST_EVALUATIONS = 500;

  private final double[] values;
  private final double[] counts;

  private RoundedLikelihood(double[] values, double[] counts) {
    this.values = values;
    this.counts = counts;
  }

  static RoundedLikelihood of(ExactSample sample, double resolution) {
    double[] sorted = Arrays.stream(sample.deviations()).sorted().toArray();
    double[] distinct = Arrays.stream(sorted).distinct().toArray();
    double[] counts = new double[distinct.length];
    int at = 0;
    for (double value : sorted) {
      at += value > distinct[at] ? 1 : 0;
      counts[at]++;
    }
    return new RoundedLikelihood(
        Arrays.stream(distinct).map(value -> value / resolution).toArray(), counts);
  }

  /** The mean with the largest likelihood. */
  double bestMean() {
    return largest(this::atMean, lowest(), highest()).getPoint();
  }

  /** The standard deviation with the largest likelihood for a mean. */
  double bestSigma(double mean) {
    return Math.exp(overSigma(mean).getPoint());
  }

  /** The largest log-likelihood for a mean. */
  double atMean(double mean) {
    return overSigma(mean).getValue();
  }

  /** The largest log-likelihood for a standard deviation. */
  double atSigma(double sigma) {
    return largest(mean -> at(mean, sigma), lowest(), highest()).getValue();
  }

  private UnivariatePointValuePair overSigma(double mean) {
    double reach = Math.max(highest() - mean, mean - lowest());
    return largest(log -> at(mean, Math.exp(log)), Math.log(LEAST_SIGMA), Math.log(2 * reach + 2));
  }

  private double lowest() {
    return values[0] - 0.5;
  }

  private double highest() {
    return values[values.length - 1] + 0.5;
  }

  private static UnivariatePointValuePair largest(
      DoubleUnaryOperator function, double low, double high) {
    return new BrentOptimizer(ACCURACY, ACCURACY)
        .optimize(
            new MaxEval(MOST_EVALUATIONS),
            GoalType.MAXIMIZE,
            new UnivariateObjectiveFunction(function::applyAsDouble),
            new SearchInterval(low, high));
  }

  double at(double mean, double sigma) {
    double sum = 0;
    for (int i = 0; i < values.length; i++) {
      double low = (values[i] - 0.5 - mean) / sigma;
      double high = (values[i] + 0.5 - mean) / sigma;
      sum += counts[i] * logBetween(low, high);
    }
    return sum;
  }

  /** The logarithm of a normal probability; far out, where that underflows, of its leading term. */
  private static double logBetween(double low, double high) {
    double probability = StandardNormal.between(low, high);
    if (probability > 0) {
      return Math.log(probability);
    }
    double nearest = Math.min(Math.abs(low), Math.abs(high));
    return -nearest * nearest / 2 - Math.log(nearest * Math.sqrt(2 * Math.PI));
  }
}
