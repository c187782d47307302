package org.evenbeam.certificate;

import static org.evenbeam.wording.Words.Bundle.CERTIFICATE;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import org.evenbeam.logbook.certificates.CertificateData;
import org.evenbeam.logbook.certificates.CertificateRecord;
import org.evenbeam.logbook.instruments.Instrument;
import org.evenbeam.logbook.run.RunKind;
import org.evenbeam.logbook.run.RunSheet;
import org.evenbeam.verification.Condition;
import org.evenbeam.wording.Figures;
import org.evenbeam.wording.UnitSymbols;
import org.evenbeam.wording.Words;

/** The facts about the item and about the verification, as names and values. */
final class Facts {
  private final CertificateRecord certificate;
  private final CertificateData data;
  private final Words words;
  private final Figures figures;
  private final CertificateTimes times;

  Facts(
      CertificateRecord certificate,
      CertificateData data,
      Words words,
      Figures figures,
      CertificateTimes times) {
    this.certificate = certificate;
    this.data = data;
    this.words = words;
    this.figures = figures;
    this.times = times;
  }

  /** The item, unambiguously (ISO/IEC 17025:2017, 7.8.2.1 g). */
  Map<String, Object> instrument() {
    Instrument item = data.sheet().instrument();
    String unit = UnitSymbols.of(item.unit());
    List<Map<String, String>> rows = new ArrayList<>();
    add(rows, "tag", item.tag());
    add(rows, "kind", item.kind());
    add(rows, "maker", item.maker() + " " + item.model());
    add(rows, "serial", item.serialNumber());
    if (!item.firmware().isEmpty()) {
      add(rows, "firmware", item.firmware());
    }
    add(rows, "location", item.location());
    add(
        rows,
        "range",
        item.measurand()
            + ", "
            + figures.exact(item.rangeLow())
            + " … "
            + figures.withUnit(figures.exact(item.rangeHigh()), unit));
    add(rows, "resolution", figures.withUnit(figures.exact(item.resolution()), unit));
    return section("section.instrument", rows);
  }

  /** The laboratory, dates, method and conditions (ISO/IEC 17025:2017, 7.8.2.1 b, c, f, j, k). */
  Map<String, Object> verification() {
    RunSheet sheet = data.sheet();
    List<Map<String, String>> rows = new ArrayList<>();
    add(rows, "laboratory", data.laboratory().name());
    add(rows, "address", data.laboratory().address().replace("\n", ", "));
    add(rows, "performed", sheet.performed().toString());
    add(rows, "issued", times.day(certificate.issuedAt()));
    add(rows, "run", Long.toString(sheet.run().number()));
    add(rows, "run-kind", runKind(sheet));
    add(
        rows,
        "plan",
        text("revision", sheet.plan().title(), Integer.toString(sheet.plan().revision())));
    add(rows, "method", sheet.plan().method());
    add(rows, "conditions", conditions(sheet));
    add(rows, "technician", sheet.technician());
    return section("section.verification", rows);
  }

  private String runKind(RunSheet sheet) {
    RunKind kind = sheet.run().kind();
    return sheet
        .run()
        .asLeftOf()
        .map(before -> text("as-left-of", Long.toString(before.asFoundRun())))
        .orElseGet(() -> words.name(CERTIFICATE, "run-kind", kind));
  }

  private String conditions(RunSheet sheet) {
    String recorded =
        Stream.of(Condition.values())
            .flatMap(
                condition ->
                    sheet.conditions().value(condition).stream()
                        .map(value -> text("condition." + condition.name(), value.text())))
            .collect(Collectors.joining(", "));
    return recorded.isEmpty() ? text("conditions.none") : recorded;
  }

  private Map<String, Object> section(String title, List<Map<String, String>> rows) {
    return Map.of("title", text(title), "rows", rows);
  }

  private void add(List<Map<String, String>> rows, String name, String value) {
    rows.add(Map.of("name", text(name), "value", value));
  }

  private String text(String key, String... arguments) {
    return words.text(CERTIFICATE, key, arguments);
  }
}
