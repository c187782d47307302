package org.evenbeam.stats;

import java.math.BigDecimal;
import java.math.BigInteger;
import java.math.MathContext;
import java.util.List;
import java.util.OptionalDouble;

/**
 * Readings taken as the decimals that were typed. Sums are exact integers on the readings' finest
 * decimal place, so that {@code n * sum(x^2) - sum(x)^2} has no cancellation, and each result is
 * rounded once, to the nearest double.
 *
 * <p>Mean and standard deviation as in ISO 3534-1:2006, 1.15 and 1.17 (divisor n - 1).
 */
public final class ExactSample {
  /** Readings are below ten to this power in size, and have at most this many decimal places. */
  public static final int LARGEST_EXPONENT = 150;

  private final List<BigDecimal> readings;
  private final int scale;
  private final BigInteger count;
  private final BigInteger sum;
  private final BigInteger sumOfSquares;

  private ExactSample(List<BigDecimal> readings) {
    this.readings = List.copyOf(readings);
    this.count = BigInteger.valueOf(readings.size());
    this.scale = readings.stream().mapToInt(BigDecimal::scale).max().orElseThrow();
    BigInteger total = BigInteger.ZERO;
    BigInteger squares = BigInteger.ZERO;
    for (BigDecimal reading : this.readings) {
      BigInteger unscaled = Ratio.unscaled(reading, scale);
      total = total.add(unscaled);
      squares = squares.add(unscaled.multiply(unscaled));
    }
    this.sum = total;
    this.sumOfSquares = squares;
  }

  /**
   * Takes readings in the order in which they were made.
   *
   * @throws IllegalArgumentException if there is none, or one is absent, or is 1e150 or more in
   *     size, or has more than 150 decimal places
   */
  public static ExactSample of(List<BigDecimal> readings) {
    Arguments.atLeast("number of readings", readings.size(), 1);
    int position = 1;
    for (BigDecimal reading : readings) {
      requireSane("reading " + position++, reading);
    }
    return new ExactSample(readings);
  }

  /** The number of readings, n. */
  public int n() {
    return readings.size();
  }

  /** The readings, in their order. */
  public List<BigDecimal> readings() {
    return readings;
  }

  /** The mean, right to the last bit. */
  public double mean() {
    return Ratio.ofScaled(sum, count, scale).toDouble();
  }

  /** The mean as a decimal of the asked precision. */
  public BigDecimal mean(MathContext precision) {
    return new BigDecimal(sum, scale).divide(new BigDecimal(count), precision);
  }

  /**
   * The bias {@code mean - reference}, formed exactly and rounded once: no digit is lost however
   * close the two are.
   *
   * @throws IllegalArgumentException if the reference is out of the range of readings
   */
  public double meanMinus(BigDecimal reference) {
    requireSane("reference", reference);
    int common = Math.max(scale, reference.scale());
    BigInteger total = Ratio.unscaled(new BigDecimal(sum, scale), common);
    BigInteger expected = Ratio.unscaled(reference, common).multiply(count);
    return Ratio.ofScaled(total.subtract(expected), count, common).toDouble();
  }

  /** The standard deviation s with n - 1, right to the last bit; empty for a single reading. */
  public OptionalDouble standardDeviation() {
    if (n() == 1) {
      return OptionalDouble.empty();
    }
    BigInteger divisor = count.multiply(count.subtract(BigInteger.ONE));
    return OptionalDouble.of(Ratio.ofScaled(spread(), divisor, 2 * scale).sqrtToDouble());
  }

  /** The sum of squared deviations from the mean, right to the last bit. */
  public double sumOfSquaresAboutMean() {
    return Ratio.ofScaled(spread(), count, 2 * scale).toDouble();
  }

  /** Each reading less the exact mean, right to the last bit, in the readings' order. */
  public double[] deviations() {
    double[] deviations = new double[n()];
    for (int i = 0; i < deviations.length; i++) {
      BigInteger scaled = Ratio.unscaled(readings.get(i), scale).multiply(count);
      deviations[i] = Ratio.ofScaled(scaled.subtract(sum), count, scale).toDouble();
    }
    return deviations;
  }

  /** The sum of squared differences between successive readings, right to the last bit. */
  public double sumOfSquaredDifferences() {
    BigInteger squares = BigInteger.ZERO;
    for (int i = 1; i < n(); i++) {
      BigDecimal difference = readings.get(i).subtract(readings.get(i - 1));
      BigInteger unscaled = Ratio.unscaled(difference, scale);
      squares = squares.add(unscaled.multiply(unscaled));
    }
    return Ratio.ofScaled(squares, BigInteger.ONE, 2 * scale).toDouble();
  }

  /** Whether all readings have the same value, whatever zeros were typed after it. */
  public boolean allEqual() {
    return spread().signum() == 0;
  }

  /** How many different values there are. */
  public int distinctValues() {
    return (int)
        readings.stream().map(reading -> Ratio.unscaled(reading, scale)).distinct().count();
  }

  /** {@code n * sum(x^2) - sum(x)^2}, which is n times the sum of squares about the mean. */
  private BigInteger spread() {
    return sumOfSquares.multiply(count).subtract(sum.multiply(sum));
  }

  private static void requireSane(String name, BigDecimal value) {
    if (value == null) {
      throw new IllegalArgumentException(name + " is absent");
    }
    long leading = (long) value.precision() - value.scale();
    if (leading > LARGEST_EXPONENT || value.scale() > LARGEST_EXPONENT) {
      throw new IllegalArgumentException(
          name + " has its digits outside 1e-150 to 1e150, which no instrument reads");
    }
  }
}
