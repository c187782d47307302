package org.evenbeam.metrology;

import java.math.BigDecimal;

/**
 * One line of an uncertainty budget, such as the drift of a weight since its certificate.
 *
 * @param name what it is, in the laboratory's words
 * @param stated the stated half-width or standard uncertainty, in the unit of the value, not
 *     negative
 * @param spread how it is spread
 * @param degreesOfFreedom 0.5 or more, infinite where nothing is known against it
 */
public record UncertaintyTerm(
    String name, BigDecimal stated, Spread spread, double degreesOfFreedom) {
  /** Checks the ranges. */
  public UncertaintyTerm {
    if (stated.signum() < 0) {
      throw new IllegalArgumentException("stated is " + stated + ", allowed: 0 or more");
    }
    if (!(degreesOfFreedom >= 0.5)) {
      throw new IllegalArgumentException(
          "degreesOfFreedom is " + degreesOfFreedom + ", allowed: 0.5 or more");
    }
  }

  /** The standard uncertainty, in the unit of the value. */
  public double standardUncertainty() {
    return stated.doubleValue() / spread.divisor();
  }
}
