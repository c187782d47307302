package org.evenbeam.exchange;

import java.math.BigDecimal;
import java.nio.file.Path;
import java.time.LocalDate;
import java.time.format.DateTimeParseException;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.stream.Collectors;
import org.evenbeam.logbook.files.BadInput;
import org.evenbeam.logbook.standards.CertifiedValue;
import org.evenbeam.logbook.standards.StandardCertificate;
import org.evenbeam.metrology.Spread;
import org.evenbeam.metrology.UncertaintyBudget;
import org.evenbeam.metrology.UncertaintyTerm;

/** The tables of the standards' certificates, certified values and uncertainty terms. */
final class CertificateTables {
  private static final List<String> CERTIFICATES =
      List.of("standard", "number", "issued_by", "traceability", "issued", "expires");
  private static final List<String> VALUES = List.of("standard", "certificate", "label", "value");
  private static final List<String> TERMS =
      List.of(
          "standard",
          "certificate",
          "label",
          "name",
          "stated",
          "spread",
          "coverage_factor",
          "degrees_of_freedom");

  private final Path folder;

  CertificateTables(Path folder) {
    this.folder = folder;
  }

  /**
   * A certificate and whose it is.
   *
   * @param standardTag the standard
   * @param certificate its certificate
   */
  record Owned(String standardTag, StandardCertificate certificate) {}

  List<Owned> certificates() {
    Map<List<String>, List<UncertaintyTerm>> terms =
        TableFile.read(folder.resolve("uncertainty_terms.csv"), TERMS).stream()
            .collect(
                Collectors.groupingBy(
                    row ->
                        List.of(row.text("standard"), row.text("certificate"), row.text("label")),
                    Collectors.mapping(CertificateTables::term, Collectors.toList())));
    Map<List<String>, List<CertifiedValue>> values =
        TableFile.read(folder.resolve("certified_values.csv"), VALUES).stream()
            .collect(
                Collectors.groupingBy(
                    row -> List.of(row.text("standard"), row.text("certificate")),
                    Collectors.mapping(row -> value(row, terms), Collectors.toList())));
    List<Owned> owned = new ArrayList<>();
    for (TableRow row : TableFile.read(folder.resolve("standard_certificates.csv"), CERTIFICATES)) {
      owned.add(new Owned(row.text("standard"), certificate(row, values)));
    }
    return owned;
  }

  private static StandardCertificate certificate(
      TableRow row, Map<List<String>, List<CertifiedValue>> values) {
    List<CertifiedValue> own = values.get(List.of(row.text("standard"), row.text("number")));
    if (own == null) {
      throw BadInput.range(row.place("number"), row.text("number"), "certified_values.csv");
    }
    return new StandardCertificate(
        row.text("number"),
        row.text("issued_by"),
        row.text("traceability"),
        date(row, "issued"),
        date(row, "expires"),
        own);
  }

  private static CertifiedValue value(
      TableRow row, Map<List<String>, List<UncertaintyTerm>> terms) {
    List<UncertaintyTerm> own =
        terms.getOrDefault(
            List.of(row.text("standard"), row.text("certificate"), row.text("label")), List.of());
    return new CertifiedValue(
        row.text("label"), row.requiredNumber("value"), new UncertaintyBudget(own));
  }

  private static UncertaintyTerm term(TableRow row) {
    return new UncertaintyTerm(
        row.text("name"),
        row.requiredNumber("stated"),
        LaboratoryTables.constant(row, "spread", Spread.class),
        row.positive("coverage_factor").orElse(BigDecimal.ONE),
        row.number("degrees_of_freedom").map(Number::doubleValue).orElse(Double.POSITIVE_INFINITY));
  }

  private static LocalDate date(TableRow row, String column) {
    try {
      return LocalDate.parse(row.text(column));
    } catch (DateTimeParseException notADate) {
      throw BadInput.range(row.place(column), row.text(column), "2026-12-31");
    }
  }
}
