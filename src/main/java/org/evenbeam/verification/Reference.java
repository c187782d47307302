package org.evenbeam.verification;

import java.math.BigDecimal;

/**
 * The value that the readings are held against.
 *
 * @param value the reference value, in the unit of the readings
 * @param standardUncertainty from its budget, in the same unit, 0 or more
 * @param degreesOfFreedom of that uncertainty, 0.5 or more, infinite when a certificate gives only
 *     U and k
 * @param uncertaintyStated false when none was given and the value is taken as exact
 */
public record Reference(
    BigDecimal value,
    double standardUncertainty,
    double degreesOfFreedom,
    boolean uncertaintyStated) {
  /** Checks the ranges. */
  public Reference {
    if (!(standardUncertainty >= 0) || Double.isInfinite(standardUncertainty)) {
      throw new IllegalArgumentException(
          "standardUncertainty is " + standardUncertainty + ", allowed: 0 or more, finite");
    }
    if (!(degreesOfFreedom >= 0.5)) {
      throw new IllegalArgumentException(
          "degreesOfFreedom is " + degreesOfFreedom + ", allowed: 0.5 or more");
    }
  }

  /** A reference value without a stated uncertainty. */
  public static Reference takenAsExact(BigDecimal value) {
    return new Reference(value, 0, Double.POSITIVE_INFINITY, false);
  }
}
