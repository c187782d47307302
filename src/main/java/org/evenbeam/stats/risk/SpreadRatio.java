package org.evenbeam.stats.risk;

import org.apache.commons.statistics.distribution.ChiSquaredDistribution;
import org.evenbeam.stats.Interval;

/**
 * The distribution of v = s / sigma for normal readings, {@code nu v^2} being chi-square with nu =
 * n - 1 degrees of freedom.
 */
final class SpreadRatio {
  /** What is left out of an integral on either side. */
  private static final double NEGLIGIBLE = 1e-17;

  /** Panels of this many standard deviations keep all digits with the points that they have. */
  private static final double PANEL_DEVIATIONS = 3;

  private final double degreesOfFreedom;
  private final ChiSquaredDistribution chi;
  private final Interval support;

  SpreadRatio(double degreesOfFreedom) {
    this.degreesOfFreedom = degreesOfFreedom;
    this.chi = ChiSquaredDistribution.of(degreesOfFreedom);
    this.support =
        new Interval(
            Math.sqrt(chi.inverseCumulativeProbability(NEGLIGIBLE) / degreesOfFreedom),
            Math.sqrt(chi.inverseSurvivalProbability(NEGLIGIBLE) / degreesOfFreedom));
  }

  /** The range outside which there is next to nothing. */
  Interval support() {
    return support;
  }

  double density(double v) {
    return 2 * degreesOfFreedom * v * chi.density(degreesOfFreedom * v * v);
  }

  /** The probability of a ratio of {@code v} or less. */
  double lowerTail(double v) {
    return chi.cumulativeProbability(degreesOfFreedom * v * v);
  }

  /** The width of a panel on which the density is smooth. */
  double smoothWidth() {
    return PANEL_DEVIATIONS / Math.sqrt(2 * degreesOfFreedom);
  }
}
