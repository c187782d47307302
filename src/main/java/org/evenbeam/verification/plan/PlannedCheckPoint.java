package org.evenbeam.verification.plan;

import java.math.BigDecimal;
import java.util.Optional;
import org.evenbeam.verification.Criteria;
import org.evenbeam.verification.DecisionRule;

/**
 * One check point of a plan.
 *
 * @param label how it is called at the bench, such as 100 g; unique in its plan
 * @param nominal the nominal value, in the instrument's unit
 * @param standardTag the reference standard to measure
 * @param valueLabel which certified value of that standard, for standards with several
 * @param readings how many readings a run takes, 1 or more
 * @param biasBelow how far the bias may lie below zero
 * @param biasAbove how far the bias may lie above zero
 * @param maximumStandardDeviation the permitted standard deviation; a share is of the reference
 *     value
 * @param alpha the risk accepted in each one-sided test, above 0 and at most 0.5
 * @param biasRule how the bias is decided
 * @param precisionRule how the precision is decided
 * @param referenceLeftOutBecause why the reference's uncertainty does not enter the bias criterion;
 *     empty where it does
 */
public record PlannedCheckPoint(
    String label,
    BigDecimal nominal,
    String standardTag,
    String valueLabel,
    int readings,
    Optional<LimitTerms> biasBelow,
    Optional<LimitTerms> biasAbove,
    Optional<LimitTerms> maximumStandardDeviation,
    double alpha,
    DecisionRule biasRule,
    DecisionRule precisionRule,
    Optional<String> referenceLeftOutBecause) {
  /** Checks the number of readings; the rest is checked when the limits are resolved. */
  public PlannedCheckPoint {
    if (readings < 1) {
      throw new IllegalArgumentException("readings is " + readings + ", allowed: 1 or more");
    }
  }

  /**
   * The limits in the unit of the readings.
   *
   * @param reference the reference value
   * @param rangeSpan the span of the instrument's measuring range, greater than 0
   * @throws IllegalArgumentException when a share of a reference value of zero is asked, or alpha
   *     is outside its range
   */
  public Criteria criteria(BigDecimal reference, BigDecimal rangeSpan) {
    return new Criteria(
        biasBelow.map(limit -> limit.resolve(reference, rangeSpan)),
        biasAbove.map(limit -> limit.resolve(reference, rangeSpan)),
        maximumStandardDeviation.map(limit -> limit.resolve(reference, rangeSpan)),
        alpha,
        biasRule,
        precisionRule,
        referenceLeftOutBecause.isEmpty());
  }
}
