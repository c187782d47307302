package org.evenbeam.certificate;

import static org.evenbeam.wording.Words.Bundle.CERTIFICATE;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.stream.Collectors;
import org.evenbeam.logbook.run.RunSheet;
import org.evenbeam.logbook.run.SheetCheckPoint;
import org.evenbeam.metrology.UncertaintyTerm;
import org.evenbeam.verification.Reference;
import org.evenbeam.wording.Figures;
import org.evenbeam.wording.UnitSymbols;
import org.evenbeam.wording.Words;

/** The reference standards of a run with value, budget, certificate and traceability. */
final class StandardsInUse {
  private final Words words;
  private final Figures figures;

  StandardsInUse(Words words, Figures figures) {
    this.words = words;
    this.figures = figures;
  }

  /** A row for each check point. */
  List<Map<String, String>> rows(RunSheet sheet) {
    List<Map<String, String>> rows = new ArrayList<>();
    for (SheetCheckPoint point : sheet.checkPoints()) {
      String unit = UnitSymbols.of(point.standard().unit());
      rows.add(
          Map.of(
              "tag", point.standard().tag(),
              "kind", point.standard().kind(),
              "serial", point.standard().serialNumber(),
              "value", figures.withUnit(figures.exact(point.certified().value()), unit),
              "uncertainty", uncertainty(point.question().reference(), unit),
              "budget", budget(point),
              "certificate", point.certificate().number(),
              "issuedBy", point.certificate().issuedBy(),
              "expires", point.certificate().expires().toString()));
    }
    return rows;
  }

  /** The statements of traceability, each once (ISO/IEC 17025:2017, 6.5). */
  List<String> traceability(RunSheet sheet) {
    return sheet.checkPoints().stream()
        .map(point -> point.certificate().traceability())
        .distinct()
        .toList();
  }

  private String uncertainty(Reference reference, String unit) {
    return reference.uncertaintyStated()
        ? figures.withUnit(figures.uncertainty(reference.standardUncertainty()), unit)
        : words.text(CERTIFICATE, "budget.none");
  }

  private String budget(SheetCheckPoint point) {
    return point.certified().budget().terms().stream()
        .map(this::term)
        .collect(Collectors.joining("; "));
  }

  private String term(UncertaintyTerm term) {
    return words.text(
        CERTIFICATE,
        "budget." + term.spread().name(),
        term.name(),
        figures.exact(term.stated()),
        figures.exact(term.coverageFactor()));
  }
}
