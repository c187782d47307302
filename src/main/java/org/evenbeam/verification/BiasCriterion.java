package org.evenbeam.verification;

import java.math.BigDecimal;
import java.util.Collection;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.stream.Stream;
import org.evenbeam.stats.BiasLimits;
import org.evenbeam.stats.CombinedUncertainty;
import org.evenbeam.stats.ExactSample;
import org.evenbeam.stats.Interval;
import org.evenbeam.stats.LimitTest;
import org.evenbeam.stats.UncertaintyComponent;

/**
 * Bias against its limit: u_b² = u_rep² + u_r², u_rep the larger of s/√n with n − 1 degrees of
 * freedom and d/√12 with infinitely many (JCGM 100:2008, F.2.2.1), effective degrees of freedom by
 * Welch–Satterthwaite (JCGM 100:2008, G.4), two one-sided t tests.
 */
final class BiasCriterion {
  private static final double TRADES_THIRD = 3;

  private BiasCriterion() {}

  static BiasFinding judge(
      CheckPointQuestion question, ExactSample sample, Collection<Note> notes) {
    Optional<UncertaintyComponent> repeatability = repeatability(question, sample, notes);
    if (repeatability.isEmpty()) {
      return new BiasFinding(
          Optional.empty(), Optional.empty(), Optional.empty(), Optional.empty());
    }
    UncertaintyComponent reference = reference(question.reference());
    boolean counts = question.criteria().referenceUncertaintyCounts();
    CombinedUncertainty uncertainty =
        counts
            ? CombinedUncertainty.of(repeatability.get(), reference)
            : CombinedUncertainty.of(repeatability.get());
    Interval interval = interval(question, sample, uncertainty);
    if (!question.criteria().asksBias()) {
      return new BiasFinding(
          Optional.of(uncertainty), Optional.of(interval), Optional.empty(), Optional.empty());
    }
    LimitTest test =
        LimitTest.of(
            sample.meanMinus(question.reference().value()),
            uncertainty,
            limits(question.criteria()),
            question.criteria().alpha());
    if (question.criteria().biasRule() == DecisionRule.SIMPLE_ACCEPTANCE) {
      noteLargeUncertainty(
          CombinedUncertainty.of(repeatability.get(), reference), question.criteria(), notes);
    }
    return new BiasFinding(
        Optional.of(uncertainty),
        Optional.of(interval),
        Optional.of(test),
        Optional.of(outcome(question, sample, test, notes)));
  }

  private static Verdict outcome(
      CheckPointQuestion question, ExactSample sample, LimitTest test, Collection<Note> notes) {
    boolean within = estimateWithin(question, sample);
    Verdict verdict = Decision.by(question.criteria().biasRule(), test.shown(), within);
    if (!within && verdict == Verdict.CONFORMS) {
      notes.add(new Note.EstimateBeyondButNotShown(Criterion.BIAS, sample.n()));
    }
    return verdict;
  }

  /** Empty where neither scatter nor resolution says anything. */
  private static Optional<UncertaintyComponent> repeatability(
      CheckPointQuestion question, ExactSample sample, Collection<Note> notes) {
    OptionalDouble s = sample.standardDeviation();
    double resolution = question.resolution().map(d -> d.doubleValue() / Math.sqrt(12)).orElse(0.0);
    if (s.isEmpty() || (s.getAsDouble() == 0 && resolution == 0)) {
      return Optional.empty();
    }
    double scatter = s.getAsDouble() / Math.sqrt(sample.n());
    if (scatter >= resolution) {
      return Optional.of(new UncertaintyComponent(scatter, sample.n() - 1));
    }
    notes.add(new Note.ResolutionCounts(resolution));
    return Optional.of(UncertaintyComponent.known(resolution));
  }

  private static UncertaintyComponent reference(Reference reference) {
    return new UncertaintyComponent(reference.standardUncertainty(), reference.degreesOfFreedom());
  }

  /** The interval does not depend on the limits, so it exists without any. */
  private static Interval interval(
      CheckPointQuestion question, ExactSample sample, CombinedUncertainty uncertainty) {
    return LimitTest.of(
            sample.meanMinus(question.reference().value()),
            uncertainty,
            BiasLimits.symmetric(0),
            question.criteria().alpha())
        .interval();
  }

  private static BiasLimits limits(Criteria criteria) {
    return new BiasLimits(orInfinite(criteria.biasBelow()), orInfinite(criteria.biasAbove()));
  }

  private static double orInfinite(Optional<BigDecimal> limit) {
    return limit.map(BigDecimal::doubleValue).orElse(Double.POSITIVE_INFINITY);
  }

  /** Decided on the decimals: the sign of a difference rounded once is exact. */
  private static boolean estimateWithin(CheckPointQuestion question, ExactSample sample) {
    BigDecimal reference = question.reference().value();
    Criteria criteria = question.criteria();
    boolean low =
        criteria
            .biasBelow()
            .map(limit -> sample.meanMinus(reference.subtract(limit)) >= 0)
            .orElse(true);
    boolean high =
        criteria.biasAbove().map(limit -> sample.meanMinus(reference.add(limit)) <= 0).orElse(true);
    return low && high;
  }

  private static void noteLargeUncertainty(
      CombinedUncertainty uncertainty, Criteria criteria, Collection<Note> notes) {
    double limit =
        Stream.of(criteria.biasBelow(), criteria.biasAbove())
            .flatMap(Optional::stream)
            .mapToDouble(BigDecimal::doubleValue)
            .min()
            .orElseThrow();
    double expanded = 2 * uncertainty.standardUncertainty();
    if (expanded > limit / TRADES_THIRD) {
      notes.add(new Note.UncertaintyLargeForSimpleAcceptance(expanded, limit / TRADES_THIRD));
    }
  }
}
