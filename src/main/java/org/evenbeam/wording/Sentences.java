package org.evenbeam.wording;

import static org.evenbeam.wording.Words.Bundle.FINDING;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.evenbeam.stats.Interval;
import org.evenbeam.stats.Shown;
import org.evenbeam.verification.BiasFinding;
import org.evenbeam.verification.CheckPointFindings;
import org.evenbeam.verification.CheckRisk;
import org.evenbeam.verification.Criteria;
import org.evenbeam.verification.Criterion;
import org.evenbeam.verification.DecisionRule;
import org.evenbeam.verification.PrecisionFinding;
import org.evenbeam.verification.Verdict;

/** Findings in words that a technician would use. */
public final class Sentences {
  private final Words words;
  private final Figures figures;
  private final Notes notes;

  /** Writes in those words and figures. */
  public Sentences(Words words, Figures figures) {
    this.words = words;
    this.figures = figures;
    this.notes = new Notes(words, figures);
  }

  /** The notes beside findings. */
  public Notes notes() {
    return notes;
  }

  /** The verdict in capitals, or that there is none. */
  public String verdict(Optional<Verdict> verdict) {
    return verdict
        .map(v -> words.name(FINDING, "verdict", v))
        .orElseGet(() -> words.text(FINDING, "verdict.none"));
  }

  /** That degrees of freedom are infinite, where a figure cannot say it. */
  public String infiniteDegreesOfFreedom() {
    return words.text(FINDING, "infinite-degrees-of-freedom");
  }

  /** That normality and outliers are not asked of readings so coarse. */
  public String notAskedTooCoarse() {
    return words.text(FINDING, "not-asked-too-coarse");
  }

  /** The name of a decision rule. */
  public String rule(DecisionRule rule) {
    return words.name(FINDING, "rule", rule);
  }

  /** The name of a criterion. */
  public String criterion(Criterion criterion) {
    return words.name(FINDING, "criterion", criterion);
  }

  /** The bias limits, such as ±0.0005 g or −0.002 g to +0.001 g. */
  public String biasLimits(Criteria criteria, String unit) {
    Optional<BigDecimal> below = criteria.biasBelow();
    Optional<BigDecimal> above = criteria.biasAbove();
    if (below.isPresent() && above.isPresent()) {
      return below.get().compareTo(above.get()) == 0
          ? "±" + amount(above.get(), unit)
          : words.text(
              FINDING,
              "limits.two-sided",
              amount(below.get().negate(), unit),
              "+" + amount(above.get(), unit));
    }
    return above
        .map(limit -> words.text(FINDING, "limits.above", "+" + amount(limit, unit)))
        .or(
            () ->
                below.map(
                    limit -> words.text(FINDING, "limits.below", amount(limit.negate(), unit))))
        .orElseGet(() -> words.text(FINDING, "limits.none"));
  }

  /** The permitted standard deviation. */
  public String precisionLimit(Criteria criteria, String unit) {
    return criteria
        .maximumStandardDeviation()
        .map(limit -> amount(limit, unit))
        .orElseGet(() -> words.text(FINDING, "limits.none"));
  }

  /**
   * What was found about bias and precision, a sentence for each; while readings are still to come
   * they begin with "so far".
   */
  public List<String> findings(CheckPointFindings found, String unit) {
    List<String> sentences = new ArrayList<>();
    bias(found, unit).ifPresent(sentences::add);
    precision(found, unit).ifPresent(sentences::add);
    return sentences;
  }

  /** What was found about the bias; empty where nothing was asked. */
  public Optional<String> bias(CheckPointFindings found, String unit) {
    Criteria criteria = found.question().criteria();
    if (!criteria.asksBias()) {
      return Optional.empty();
    }
    BiasFinding finding = found.biasFinding();
    if (finding.test().isEmpty()) {
      return Optional.of(words.text(FINDING, "bias.cannot"));
    }
    Shown shown = finding.shown().orElseThrow();
    int places = figures.biasPlaces(found);
    Interval interval = finding.interval().orElseThrow();
    String said =
        words.text(
            FINDING,
            "bias." + shown.name(),
            figures.withUnit(figures.signedToPlaces(found.bias(), places), unit),
            figures.percent(1 - 2 * criteria.alpha()),
            figures.withUnit(figures.signedToPlaces(interval.low(), places), unit),
            figures.withUnit(figures.signedToPlaces(interval.high(), places), unit),
            biasLimits(criteria, unit));
    return Optional.of(decided(found, said, criteria.biasRule(), finding.outcome()));
  }

  /** What was found about the precision; empty where nothing was asked. */
  public Optional<String> precision(CheckPointFindings found, String unit) {
    Criteria criteria = found.question().criteria();
    if (!criteria.asksPrecision()) {
      return Optional.empty();
    }
    PrecisionFinding finding = found.precisionFinding();
    if (finding.shown().isEmpty()) {
      return Optional.of(words.text(FINDING, "precision.cannot"));
    }
    String said =
        words.text(
            FINDING,
            "precision." + finding.shown().get().name(),
            figures.withUnit(figures.uncertainty(found.standardDeviation().orElseThrow()), unit),
            figures.percent(1 - criteria.alpha()),
            spread(finding.lowerBound().orElseThrow(), unit),
            spread(finding.upperBound().orElseThrow(), unit),
            precisionLimit(criteria, unit));
    return Optional.of(decided(found, said, criteria.precisionRule(), finding.outcome()));
  }

  /** What the check could have missed, in one or more sentences. */
  public List<String> couldHaveMissed(CheckRisk risk, String unit) {
    List<String> sentences = new ArrayList<>();
    String readings = Integer.toString(risk.readings());
    risk.detectableBias()
        .ifPresent(
            bias -> sentences.add(words.text(FINDING, "risk.bias", readings, spread(bias, unit))));
    risk.detectableStandardDeviation()
        .ifPresent(
            sd -> sentences.add(words.text(FINDING, "risk.precision", readings, spread(sd, unit))));
    sentences.add(
        words.text(
            FINDING,
            "risk.assumed." + risk.origin().name(),
            spread(risk.assumedStandardDeviation(), unit),
            figures.percent(Math.rint(risk.conformsWithoutBias() * 1000) / 1000)));
    return sentences;
  }

  private String spread(double value, String unit) {
    return figures.withUnit(figures.uncertainty(value), unit);
  }

  private String decided(
      CheckPointFindings found, String said, DecisionRule rule, Optional<Verdict> outcome) {
    int planned = found.question().plannedReadings().orElse(0);
    if (found.n() < planned) {
      return words.text(FINDING, "so-far", said);
    }
    String sentence = said.substring(0, 1).toUpperCase(words.locale()) + said.substring(1);
    return words.text(FINDING, "decided", sentence, rule(rule), verdict(outcome));
  }

  private String amount(BigDecimal value, String unit) {
    return figures.withUnit(figures.exact(value), unit);
  }
}
