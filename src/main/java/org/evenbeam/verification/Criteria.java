package org.evenbeam.verification;

import java.math.BigDecimal;
import java.util.Optional;
import org.evenbeam.stats.Arguments;

/**
 * The limits of one check point in the unit of its readings, and the rules that hold readings
 * against them. An absent limit is a criterion not asked, not one missing.
 *
 * @param biasBelow how far the bias may lie below zero, greater than 0
 * @param biasAbove how far the bias may lie above zero, greater than 0
 * @param maximumStandardDeviation the permitted standard deviation, greater than 0
 * @param alpha the risk accepted in each one-sided test, 1e-12 to 0.5
 * @param biasRule how the bias is decided
 * @param precisionRule how the precision is decided
 * @param referenceUncertaintyCounts false when the plan leaves the reference's uncertainty out of
 *     the bias criterion
 */
public record Criteria(
    Optional<BigDecimal> biasBelow,
    Optional<BigDecimal> biasAbove,
    Optional<BigDecimal> maximumStandardDeviation,
    double alpha,
    DecisionRule biasRule,
    DecisionRule precisionRule,
    boolean referenceUncertaintyCounts) {
  /** Checks the ranges. */
  public Criteria {
    positive("biasBelow", biasBelow);
    positive("biasAbove", biasAbove);
    positive("maximumStandardDeviation", maximumStandardDeviation);
    Arguments.significance(alpha);
  }

  private static void positive(String name, Optional<BigDecimal> limit) {
    limit
        .filter(value -> value.signum() <= 0)
        .ifPresent(
            value -> {
              throw new IllegalArgumentException(
                  name + " is " + value + ", allowed: greater than 0");
            });
  }

  /** Whether a limit for the bias is set on either side. */
  public boolean asksBias() {
    return biasBelow.isPresent() || biasAbove.isPresent();
  }

  /** Whether a limit for the standard deviation is set. */
  public boolean asksPrecision() {
    return maximumStandardDeviation.isPresent();
  }
}
