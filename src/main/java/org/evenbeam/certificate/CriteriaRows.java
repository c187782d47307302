package org.evenbeam.certificate;

import static org.evenbeam.wording.Words.Bundle.CERTIFICATE;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.evenbeam.verification.CheckPointFindings;
import org.evenbeam.verification.Criteria;
import org.evenbeam.verification.Criterion;
import org.evenbeam.verification.DecisionRule;
import org.evenbeam.verification.Verdict;
import org.evenbeam.wording.Figures;
import org.evenbeam.wording.Sentences;
import org.evenbeam.wording.Words;

/** What was required and what was found, a row for each criterion asked. */
final class CriteriaRows {
  private final Words words;
  private final Figures figures;
  private final Sentences sentences;

  CriteriaRows(Words words, Figures figures, Sentences sentences) {
    this.words = words;
    this.figures = figures;
    this.sentences = sentences;
  }

  List<Map<String, String>> of(CheckPointFindings found, String unit) {
    Criteria asked = found.question().criteria();
    List<Map<String, String>> rows = new ArrayList<>();
    if (asked.asksBias()) {
      rows.add(
          row(
              Criterion.BIAS,
              sentences.biasLimits(asked, unit),
              bias(found, unit),
              biasInterval(found, unit),
              asked.biasRule(),
              asked.alpha(),
              found.biasFinding().outcome()));
    }
    if (asked.asksPrecision()) {
      rows.add(
          row(
              Criterion.PRECISION,
              "≤ " + sentences.precisionLimit(asked, unit),
              spread(found, unit),
              spreadBound(found, unit),
              asked.precisionRule(),
              asked.alpha(),
              found.precisionFinding().outcome()));
    }
    return rows;
  }

  private Map<String, String> row(
      Criterion criterion,
      String limit,
      String found,
      String interval,
      DecisionRule rule,
      double alpha,
      Optional<Verdict> outcome) {
    return Map.of(
        "criterion",
        sentences.criterion(criterion),
        "limit",
        limit,
        "found",
        found,
        "interval",
        interval,
        "rule",
        sentences.rule(rule) + ", " + words.text(CERTIFICATE, "risk", figures.percent(alpha)),
        "outcome",
        sentences.verdict(outcome));
  }

  private String bias(CheckPointFindings found, String unit) {
    return figures.withUnit(figures.signedToPlaces(found.bias(), figures.biasPlaces(found)), unit);
  }

  private String biasInterval(CheckPointFindings found, String unit) {
    int places = figures.biasPlaces(found);
    return found
        .biasFinding()
        .interval()
        .map(interval -> figures.signedInterval(interval, places, unit))
        .orElse("");
  }

  private String spread(CheckPointFindings found, String unit) {
    return found.standardDeviation().isPresent()
        ? "s = "
            + figures.withUnit(figures.uncertainty(found.standardDeviation().getAsDouble()), unit)
        : "";
  }

  private String spreadBound(CheckPointFindings found, String unit) {
    if (found.precisionFinding().upperBound().isEmpty()) {
      return "";
    }
    double upper = found.precisionFinding().upperBound().getAsDouble();
    double confidence = 1 - found.question().criteria().alpha();
    return words.text(
        CERTIFICATE,
        "bound.upper",
        figures.withUnit(figures.uncertainty(upper), unit),
        figures.percent(confidence));
  }
}
