package org.evenbeam.stats;

import java.math.BigDecimal;
import java.math.BigInteger;

/**
 * An exact ratio of two integers, and its one rounding to a double. The values stay far inside the
 * range of normal doubles ({@link ExactSample} bounds its readings), so nothing here underflows.
 *
 * @param numerator any integer
 * @param denominator above zero
 */
record Ratio(BigInteger numerator, BigInteger denominator) {
  /** Enough bits that the rounding to 53 is decided by them and the sticky bit. */
  private static final int QUOTIENT_BITS = 64;

  /** {@code numerator / (count * 10^scale)}, for a scale of either sign. */
  static Ratio ofScaled(BigInteger numerator, BigInteger count, int scale) {
    BigInteger power = BigInteger.TEN.pow(Math.abs(scale));
    return scale >= 0
        ? new Ratio(numerator, count.multiply(power))
        : new Ratio(numerator.multiply(power), count);
  }

  /** The nearest double, ties to even. */
  double toDouble() {
    int shift = QUOTIENT_BITS - (numerator.bitLength() - denominator.bitLength());
    BigInteger[] parts = shiftLeft(shift).divided();
    return scaled(parts[0], parts[1].signum() != 0, -shift) * numerator.signum();
  }

  /** The double nearest to the square root of a ratio that is not negative. */
  double sqrtToDouble() {
    int shift = 2 * QUOTIENT_BITS - (numerator.bitLength() - denominator.bitLength());
    int even = shift + (shift & 1);
    BigInteger[] parts = shiftLeft(even).divided();
    BigInteger[] root = parts[0].sqrtAndRemainder();
    boolean inexact = parts[1].signum() != 0 || root[1].signum() != 0;
    return scaled(root[0], inexact, -even / 2);
  }

  /** The unscaled integer of a decimal at a scale that holds it without rounding. */
  static BigInteger unscaled(BigDecimal value, int scale) {
    return value.setScale(scale).unscaledValue();
  }

  private Ratio shiftLeft(int bits) {
    return bits >= 0
        ? new Ratio(numerator.shiftLeft(bits), denominator)
        : new Ratio(numerator, denominator.shiftLeft(-bits));
  }

  private BigInteger[] divided() {
    return numerator.abs().divideAndRemainder(denominator);
  }

  /** The sticky bit stands for all that was cut off, so that a half is never taken for a tie. */
  private static double scaled(BigInteger truncated, boolean inexact, int exponent) {
    BigInteger sticky = inexact ? truncated.setBit(0) : truncated;
    return Math.scalb(sticky.doubleValue(), exponent);
  }
}
