package org.evenbeam.metrology;

import java.math.BigDecimal;

/**
 * One line of an uncertainty budget, such as the drift of a weight since its certificate.
 *
 * @param name what it is, in the laboratory's words
 * @param stated the stated half-width or uncertainty, in the unit of the value, not negative
 * @param spread how it is spread
 * @param coverageFactor k of a stated expanded uncertainty (GUM 6.2.1), 1 for any other; above 0
 * @param degreesOfFreedom 0.5 or more, infinite where nothing is known against it
 */
public record UncertaintyTerm(
    String name,
    BigDecimal stated,
    Spread spread,
    BigDecimal coverageFactor,
    double degreesOfFreedom) {
  /** Checks the ranges. */
  public UncertaintyTerm {
    if (stated.signum() < 0) {
      throw new IllegalArgumentException("stated is " + stated + ", allowed: 0 or more");
    }
    if (coverageFactor.signum() <= 0) {
      throw new IllegalArgumentException(
          "coverageFactor is " + coverageFactor + ", allowed: above 0");
    }
    if (!(degreesOfFreedom >= 0.5)) {
      throw new IllegalArgumentException(
          "degreesOfFreedom is " + degreesOfFreedom + ", allowed: 0.5 or more");
    }
  }

  /** A term that is not an expanded uncertainty. */
  public static UncertaintyTerm of(
      String name, BigDecimal stated, Spread spread, double degreesOfFreedom) {
    return new UncertaintyTerm(name, stated, spread, BigDecimal.ONE, degreesOfFreedom);
  }

  /** The standard uncertainty, in the unit of the value. */
  public double standardUncertainty() {
    return stated.doubleValue() / coverageFactor.doubleValue() / spread.divisor();
  }
}
