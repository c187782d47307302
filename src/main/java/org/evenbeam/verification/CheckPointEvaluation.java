package org.evenbeam.verification;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.Collection;
import java.util.List;
import java.util.Optional;
import org.evenbeam.stats.ExactSample;
import org.evenbeam.stats.StudentTTest;

/** Holds the readings of one check point against its question. */
public final class CheckPointEvaluation {
  /** The version of the rules and formulas, kept with every finding. */
  public static final int RULES_VERSION = 1;

  private CheckPointEvaluation() {}

  /**
   * Evaluates a check point.
   *
   * @param question what is asked
   * @param readings those that count, in their order, as typed; at least one
   * @throws IllegalArgumentException when there is no reading
   */
  public static CheckPointFindings of(CheckPointQuestion question, List<BigDecimal> readings) {
    ExactSample sample = ExactSample.of(readings);
    List<Note> notes = new ArrayList<>();
    noteWhatIsAsked(question, notes);
    noteSample(question, sample, notes);
    BiasFinding bias = BiasCriterion.judge(question, sample, notes);
    PrecisionFinding precision = PrecisionCriterion.judge(question, sample, notes);
    Fitness fitness = Fitness.of(sample, question.resolution());
    fitness.noteFlags(notes);
    return new CheckPointFindings(
        question,
        sample.n(),
        sample.mean(),
        sample.standardDeviation(),
        sample.meanMinus(question.reference().value()),
        tTest(question, sample),
        bias,
        precision,
        fitness,
        verdict(question, sample.n(), bias, precision),
        notes);
  }

  private static Optional<StudentTTest> tTest(CheckPointQuestion question, ExactSample sample) {
    if (sample.allEqual()) {
      return Optional.empty();
    }
    return Optional.of(
        StudentTTest.of(
            sample.meanMinus(question.reference().value()),
            sample.standardDeviation().orElseThrow(),
            sample.n(),
            question.criteria().alpha()));
  }

  private static void noteWhatIsAsked(CheckPointQuestion question, Collection<Note> notes) {
    Criteria criteria = question.criteria();
    if (!question.reference().uncertaintyStated()) {
      notes.add(new Note.ReferenceTakenAsExact());
    } else if (criteria.asksBias() && !criteria.referenceUncertaintyCounts()) {
      notes.add(new Note.ReferenceUncertaintyLeftOut());
    }
    if (!criteria.asksBias()) {
      notes.add(new Note.NotAsked(Criterion.BIAS));
    }
    if (!criteria.asksPrecision()) {
      notes.add(new Note.NotAsked(Criterion.PRECISION));
    }
  }

  private static void noteSample(
      CheckPointQuestion question, ExactSample sample, Collection<Note> notes) {
    int n = sample.n();
    if (n == 1) {
      notes.add(new Note.OneReading());
    } else if (sample.allEqual()) {
      notes.add(new Note.ReadingsEqual(n));
      if (question.resolution().isEmpty()) {
        notes.add(new Note.ResolutionMissing());
      }
    }
    question
        .plannedReadings()
        .ifPresent(
            planned -> {
              if (n < planned) {
                notes.add(new Note.ReadingsToGo(n, planned));
              } else if (n > planned) {
                notes.add(new Note.MoreReadingsThanPlanned(n, planned));
              }
            });
  }

  private static Optional<Verdict> verdict(
      CheckPointQuestion question, int n, BiasFinding bias, PrecisionFinding precision) {
    Criteria criteria = question.criteria();
    List<Optional<Verdict>> outcomes = new ArrayList<>();
    if (criteria.asksBias()) {
      outcomes.add(bias.outcome());
    }
    if (criteria.asksPrecision()) {
      outcomes.add(precision.outcome());
    }
    boolean toCome = question.plannedReadings().orElse(0) > n;
    boolean undecidable = outcomes.isEmpty() || outcomes.stream().anyMatch(Optional::isEmpty);
    return toCome || undecidable
        ? Optional.empty()
        : Optional.of(Verdict.worst(outcomes.stream().map(Optional::orElseThrow).toList()));
  }
}
