package org.evenbeam.verification;

import java.math.BigDecimal;
import java.util.Collection;
import java.util.Optional;
import java.util.OptionalDouble;
import org.evenbeam.stats.EqualReadingsBound;
import org.evenbeam.stats.ExactSample;
import org.evenbeam.stats.Shown;
import org.evenbeam.stats.StandardDeviationBounds;
import org.evenbeam.stats.VarianceTest;

/**
 * Within-run repeatability against its limit: chi-square with n − 1 degrees of freedom, and for
 * equal readings the bound that the resolution allows, which is also the floor of the upper bound.
 */
final class PrecisionCriterion {
  private static final PrecisionFinding NOTHING =
      new PrecisionFinding(
          Optional.empty(),
          Optional.empty(),
          OptionalDouble.empty(),
          OptionalDouble.empty(),
          Optional.empty(),
          Optional.empty());

  private PrecisionCriterion() {}

  static PrecisionFinding judge(
      CheckPointQuestion question, ExactSample sample, Collection<Note> notes) {
    if (sample.n() == 1 || (sample.allEqual() && question.resolution().isEmpty())) {
      return NOTHING;
    }
    OptionalDouble floor = floor(question, sample.n());
    return sample.allEqual()
        ? equal(question, floor.orElseThrow(), notes)
        : scattered(question, sample, floor, notes);
  }

  private static OptionalDouble floor(CheckPointQuestion question, int n) {
    return question
        .resolution()
        .map(d -> EqualReadingsBound.of(n, d.doubleValue(), question.criteria().alpha()))
        .map(bound -> OptionalDouble.of(bound.upperBound()))
        .orElse(OptionalDouble.empty());
  }

  private static PrecisionFinding equal(
      CheckPointQuestion question, double upperBound, Collection<Note> notes) {
    notes.add(new Note.ResolutionBoundsSpread(upperBound));
    Optional<Shown> shown =
        limit(question).map(limit -> upperBound <= limit ? Shown.WITHIN : Shown.NEITHER);
    return new PrecisionFinding(
        Optional.empty(),
        Optional.empty(),
        OptionalDouble.of(0),
        OptionalDouble.of(upperBound),
        shown,
        shown.map(s -> Decision.by(question.criteria().precisionRule(), s, true)));
  }

  private static PrecisionFinding scattered(
      CheckPointQuestion question,
      ExactSample sample,
      OptionalDouble floor,
      Collection<Note> notes) {
    double s = sample.standardDeviation().orElseThrow();
    StandardDeviationBounds bounds =
        StandardDeviationBounds.of(s, sample.n(), question.criteria().alpha());
    if (floor.isPresent() && floor.getAsDouble() > bounds.upperBound()) {
      notes.add(new Note.ResolutionBoundsSpread(floor.getAsDouble()));
      bounds = bounds.raisedTo(floor.getAsDouble());
    }
    StandardDeviationBounds raised = bounds;
    Optional<VarianceTest> test = limit(question).map(limit -> VarianceTest.of(raised, limit));
    return new PrecisionFinding(
        Optional.of(raised),
        test,
        OptionalDouble.of(raised.lowerBound()),
        OptionalDouble.of(raised.upperBound()),
        test.map(VarianceTest::shown),
        test.map(t -> outcome(question, sample.n(), t, notes)));
  }

  private static Verdict outcome(
      CheckPointQuestion question, int n, VarianceTest test, Collection<Note> notes) {
    boolean within = test.bounds().standardDeviation() <= test.limit();
    Verdict verdict = Decision.by(question.criteria().precisionRule(), test.shown(), within);
    if (!within && verdict == Verdict.CONFORMS) {
      notes.add(new Note.EstimateBeyondButNotShown(Criterion.PRECISION, n));
    }
    return verdict;
  }

  private static Optional<Double> limit(CheckPointQuestion question) {
    return question.criteria().maximumStandardDeviation().map(BigDecimal::doubleValue);
  }
}
