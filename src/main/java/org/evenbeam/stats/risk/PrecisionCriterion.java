package org.evenbeam.stats.risk;

import org.evenbeam.stats.Arguments;

/**
 * What is asked of the standard deviation.
 *
 * @param limit the maximum permissible standard deviation, above zero
 * @param rule the decision rule
 * @param alpha the significance level of each one-sided bound, 1e-12 to 0.5
 */
public record PrecisionCriterion(double limit, DecisionRule rule, double alpha) {
  /**
   * Makes a criterion.
   *
   * @throws IllegalArgumentException if an argument is outside its range
   */
  public PrecisionCriterion {
    Arguments.positive("limit", limit);
    Arguments.significance(alpha);
  }
}
