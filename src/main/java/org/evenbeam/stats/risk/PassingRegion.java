package org.evenbeam.stats.risk;

import org.apache.commons.statistics.distribution.ChiSquaredDistribution;
import org.evenbeam.stats.EqualReadingsBound;
import org.evenbeam.stats.Interval;

/**
 * The outcomes that a decision lets pass: the bias inside limits that the guard band narrows or
 * widens, and the standard deviation s up to a largest one.
 *
 * @param limits the limits of the bias, infinite where none is asked
 * @param guard -1 where the guard band narrows the limits, 1 where it widens them, 0 without
 * @param largestSpread the largest s that passes; negative where none does
 */
record PassingRegion(Interval limits, int guard, double largestSpread) {
  private static final Interval EVERYTHING =
      new Interval(Double.NEGATIVE_INFINITY, Double.POSITIVE_INFINITY);

  /** The outcomes with the verdict CONFORMS. */
  static PassingRegion conforming(CheckDesign design) {
    int guard = design.bias().map(bias -> guard(bias.rule(), -1)).orElse(0);
    return new PassingRegion(limits(design), guard, largestSpread(design, true));
  }

  /** The outcomes without the verdict DOES NOT CONFORM. */
  static PassingRegion notRejected(CheckDesign design) {
    int guard = design.bias().map(bias -> guard(bias.rule(), 1)).orElse(0);
    return new PassingRegion(limits(design), guard, largestSpread(design, false));
  }

  private static Interval limits(CheckDesign design) {
    return design.bias().map(bias -> bias.limits().permitted()).orElse(EVERYTHING);
  }

  private static int guard(DecisionRule rule, int ofGuardedAcceptance) {
    return switch (rule) {
      case GUARDED_ACCEPTANCE -> ofGuardedAcceptance;
      case GUARDED_REJECTION -> 1;
      case SIMPLE_ACCEPTANCE -> 0;
    };
  }

  private static double largestSpread(CheckDesign design, boolean toConform) {
    if (design.precision().isEmpty() || design.establishedSigma().isPresent()) {
      return Double.POSITIVE_INFINITY;
    }
    PrecisionCriterion criterion = design.precision().get();
    boolean mustBeShown = toConform && criterion.rule() == DecisionRule.GUARDED_ACCEPTANCE;
    if (mustBeShown && resolutionHides(design, criterion)) {
      return -1;
    }
    return criterion.limit() * allowance(design.n() - 1, criterion, mustBeShown);
  }

  /** Whether even equal readings would not show the standard deviation within its limit. */
  private static boolean resolutionHides(CheckDesign design, PrecisionCriterion criterion) {
    return design.resolution() > 0
        && EqualReadingsBound.of(design.n(), design.resolution(), criterion.alpha()).upperBound()
            > criterion.limit();
  }

  /** The largest passing s in units of its limit; see {@code StandardDeviationBounds}. */
  private static double allowance(
      int degreesOfFreedom, PrecisionCriterion criterion, boolean mustBeShown) {
    if (criterion.rule() == DecisionRule.SIMPLE_ACCEPTANCE) {
      return 1;
    }
    ChiSquaredDistribution chi = ChiSquaredDistribution.of(degreesOfFreedom);
    double quantile =
        mustBeShown
            ? chi.inverseCumulativeProbability(criterion.alpha())
            : chi.inverseSurvivalProbability(criterion.alpha());
    return Math.sqrt(quantile / degreesOfFreedom);
  }
}
