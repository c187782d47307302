package org.evenbeam.certificate;

import static org.evenbeam.wording.Words.Bundle.CERTIFICATE;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.evenbeam.logbook.run.SheetCheckPoint;
import org.evenbeam.verification.CheckPointFindings;
import org.evenbeam.verification.CheckRisk;
import org.evenbeam.wording.Figures;
import org.evenbeam.wording.Sentences;
import org.evenbeam.wording.UnitSymbols;
import org.evenbeam.wording.Words;

/** What a template can place about one check point. */
final class CheckPointModel {
  private final Words words;
  private final Figures figures;
  private final Sentences sentences;
  private final CriteriaRows criteria;
  private final StatisticsRows statistics;
  private final ReadingsTable readings;

  CheckPointModel(Words words, Figures figures, CertificateTimes times) {
    this.words = words;
    this.figures = figures;
    this.sentences = new Sentences(words, figures);
    this.criteria = new CriteriaRows(words, figures, sentences);
    this.statistics = new StatisticsRows(words, figures);
    this.readings = new ReadingsTable(words, times);
  }

  Map<String, Object> values(int index, SheetCheckPoint point, String ucum) {
    String unit = UnitSymbols.of(ucum);
    Optional<CheckPointFindings> findings = point.findings();
    Map<String, Object> values = new LinkedHashMap<>();
    values.put("title", words.text(CERTIFICATE, "check-point", point.planned().label()));
    values.put("verdict", sentences.verdict(findings.flatMap(CheckPointFindings::verdict)));
    values.put(
        "beamTitle",
        words.text(
            CERTIFICATE,
            "beam-title",
            figures.withUnit(figures.exact(point.certified().value()), unit)));
    values.put("spreadTitle", words.text(CERTIFICATE, "spread-title"));
    values.put("beam", CertificatePictures.beam(index));
    values.put("spread", CertificatePictures.spread(index));
    values.put(
        "sentences", findings.map(found -> sentences.findings(found, unit)).orElse(List.of()));
    values.put("notes", findings.map(found -> notes(found, unit)).orElse(List.of()));
    values.put("criteria", findings.map(found -> criteria.of(found, unit)).orElse(List.of()));
    values.put("statistics", findings.map(found -> statistics.of(found, unit)).orElse(List.of()));
    values.put("missed", findings.map(found -> missed(found, unit)).orElse(List.of()));
    values.put("readingsTitle", readings.title(point));
    values.put("readings", readings.rows(point));
    values.put("changes", readings.changes(point));
    return values;
  }

  private List<String> notes(CheckPointFindings found, String unit) {
    return found.notes().stream().map(note -> sentences.notes().sentence(note, unit)).toList();
  }

  private List<String> missed(CheckPointFindings found, String unit) {
    List<String> missed = new ArrayList<>();
    CheckRisk.of(found.question(), found.n(), found.standardDeviation())
        .ifPresent(risk -> missed.addAll(sentences.couldHaveMissed(risk, unit)));
    return missed;
  }
}
