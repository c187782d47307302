package org.evenbeam.stats.risk;

import java.util.OptionalDouble;
import java.util.function.DoubleUnaryOperator;
import java.util.stream.DoubleStream;
import org.apache.commons.math3.analysis.solvers.BrentSolver;
import org.evenbeam.stats.BiasLimits;

/**
 * The smallest fault that a check is unlikely to miss: the bias, or the standard deviation, at
 * which the chance of CONFORMS has fallen to a tenth. The tenth is the complement of a power of
 * 0.9: common practice.
 */
public final class DetectableChange {
  /** The chance of CONFORMS at the detectable fault. */
  public static final double MISSED = 0.10;

  private static final double RELATIVE_ACCURACY = 1e-13;
  private static final int MOST_EVALUATIONS = 300;
  private static final int MOST_DOUBLINGS = 100;

  private final OperatingCharacteristic characteristic;

  private DetectableChange(OperatingCharacteristic characteristic) {
    this.characteristic = characteristic;
  }

  /** For the check that {@code characteristic} describes. */
  public static DetectableChange of(OperatingCharacteristic characteristic) {
    return new DetectableChange(characteristic);
  }

  /**
   * The detectable bias above the reference value, at a true standard deviation. It is 0 where even
   * an instrument without bias hardly passes, and absent where no such bias is ever found.
   *
   * @throws IllegalArgumentException if {@code sigma} is not above zero
   */
  public OptionalDouble biasAbove(double sigma) {
    return bias(sigma, 1);
  }

  /** The detectable bias below the reference value, as a size; see {@link #biasAbove(double)}. */
  public OptionalDouble biasBelow(double sigma) {
    return bias(sigma, -1);
  }

  private OptionalDouble bias(double sigma, int side) {
    BiasCharacteristic curve = characteristic.atSigma(sigma);
    if (curve.at(0).conforms() <= MISSED) {
      return OptionalDouble.of(0);
    }
    // Above a tenth at zero, the chance falls through it once: it has one maximum over the bias.
    double limit = limitOn(side);
    return Double.isInfinite(limit)
        ? OptionalDouble.empty()
        : fallen(size -> curve.at(side * size).conforms(), 0, Math.max(limit, sigma));
  }

  private double limitOn(int side) {
    return characteristic
        .design()
        .bias()
        .map(BiasCriterion::limits)
        .map(limits -> side > 0 ? limits.above() : limits.below())
        .orElse(Double.POSITIVE_INFINITY);
  }

  /**
   * The detectable standard deviation of an instrument of the given true bias; 0 and absence as for
   * the bias.
   *
   * @throws IllegalArgumentException if {@code bias} is not finite
   */
  public OptionalDouble standardDeviation(double bias) {
    double scale = scale();
    double tiny = scale / 1024;
    return characteristic.at(bias, tiny).conforms() <= MISSED
        ? OptionalDouble.of(0)
        : fallen(sigma -> characteristic.at(bias, sigma).conforms(), tiny, scale);
  }

  /** The smallest of what the design compares a standard deviation with. */
  private double scale() {
    CheckDesign design = characteristic.design();
    double below = design.bias().map(BiasCriterion::limits).map(BiasLimits::below).orElse(0.0);
    double above = design.bias().map(BiasCriterion::limits).map(BiasLimits::above).orElse(0.0);
    double precision = design.precision().map(PrecisionCriterion::limit).orElse(0.0);
    return DoubleStream.of(below, above, precision)
        .filter(value -> value > 0 && Double.isFinite(value))
        .min()
        .orElse(1);
  }

  private static OptionalDouble fallen(DoubleUnaryOperator chance, double from, double scale) {
    double low = from;
    double high = Math.max(2 * from, scale);
    for (int i = 0; i < MOST_DOUBLINGS && chance.applyAsDouble(high) > MISSED; i++) {
      low = high;
      high *= 2;
    }
    if (chance.applyAsDouble(high) > MISSED) {
      return OptionalDouble.empty();
    }
    BrentSolver solver = new BrentSolver(RELATIVE_ACCURACY, 0);
    return OptionalDouble.of(
        solver.solve(MOST_EVALUATIONS, value -> chance.applyAsDouble(value) - MISSED, low, high));
  }
}
