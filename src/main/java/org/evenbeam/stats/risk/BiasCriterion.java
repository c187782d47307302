package org.evenbeam.stats.risk;

import org.evenbeam.stats.Arguments;
import org.evenbeam.stats.BiasLimits;

/**
 * What is asked of the bias.
 *
 * @param limits the maximum permissible bias on either side
 * @param rule the decision rule
 * @param alpha the significance level of each one-sided test, 1e-12 to 0.5
 */
public record BiasCriterion(BiasLimits limits, DecisionRule rule, double alpha) {
  /**
   * Makes a criterion.
   *
   * @throws IllegalArgumentException if {@code alpha} is outside its range
   */
  public BiasCriterion {
    Arguments.significance(alpha);
  }
}
