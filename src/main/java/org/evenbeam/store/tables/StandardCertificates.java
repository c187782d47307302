package org.evenbeam.store.tables;

import java.math.BigDecimal;
import java.time.LocalDate;
import java.util.List;
import org.evenbeam.logbook.NotFound;
import org.evenbeam.logbook.Transaction;
import org.evenbeam.logbook.run.Run;
import org.evenbeam.logbook.standards.CertifiedValue;
import org.evenbeam.logbook.standards.StandardCertificate;
import org.evenbeam.metrology.Spread;
import org.evenbeam.metrology.UncertaintyBudget;
import org.evenbeam.metrology.UncertaintyTerm;
import org.evenbeam.store.rows.ColumnTypes;
import org.evenbeam.store.rows.OpenTransaction;
import org.jdbi.v3.core.Handle;
import org.jdbi.v3.core.mapper.reflect.ConstructorMapper;

/** The certificates of one standard with their values and budgets, put together. */
final class StandardCertificates {
  private StandardCertificates() {}

  static List<StandardCertificate> of(Transaction transaction, long standardId) {
    Handle handle = OpenTransaction.reading(transaction);
    return handle
        .createQuery(
            "select id, number, issued_by, traceability, issued, expires"
                + " from standard_certificate where standard_id = :standard"
                + " order by issued desc, id desc")
        .bind("standard", standardId)
        .map(ConstructorMapper.of(Head.class))
        .list()
        .stream()
        .map(head -> head.with(values(handle, head.id())))
        .toList();
  }

  /**
   * The key of the certificate in use.
   *
   * @throws NotFound when the standard has none of that number
   */
  static long id(Transaction transaction, Run.StandardInUse inUse) {
    return OpenTransaction.reading(transaction)
        .createQuery(
            "select c.id from standard_certificate c"
                + " join reference_standard s on s.id = c.standard_id"
                + " where s.tag = :tag and c.number = :number")
        .bind("tag", inUse.standardTag())
        .bind("number", inUse.certificateNumber())
        .mapTo(Long.class)
        .findOne()
        .orElseThrow(
            () -> new NotFound(NotFound.Thing.STANDARD_CERTIFICATE, inUse.certificateNumber()));
  }

  private static List<CertifiedValue> values(Handle handle, long certificateId) {
    return handle
        .createQuery(
            "select id, label, certified from certified_value"
                + " where certificate_id = :certificate order by position")
        .bind("certificate", certificateId)
        .map(ConstructorMapper.of(Value.class))
        .list()
        .stream()
        .map(value -> new CertifiedValue(value.label, value.certified, budget(handle, value.id)))
        .toList();
  }

  private static UncertaintyBudget budget(Handle handle, long valueId) {
    return new UncertaintyBudget(
        handle
            .createQuery(
                "select name, stated, spread, coverage_factor, degrees_of_freedom from uncertainty_term"
                    + " where certified_value_id = :value order by position")
            .bind("value", valueId)
            .map(
                (row, context) ->
                    new UncertaintyTerm(
                        row.getString("name"),
                        ColumnTypes.decimal(row, "stated"),
                        Spread.valueOf(row.getString("spread")),
                        ColumnTypes.decimal(row, "coverage_factor"),
                        Double.parseDouble(row.getString("degrees_of_freedom"))))
            .list());
  }

  /** A certificate without its values. */
  record Head(
      long id,
      String number,
      String issuedBy,
      String traceability,
      LocalDate issued,
      LocalDate expires) {
    StandardCertificate with(List<CertifiedValue> values) {
      return new StandardCertificate(number, issuedBy, traceability, issued, expires, values);
    }
  }

  /** A certified value without its budget. */
  record Value(long id, String label, BigDecimal certified) {}
}
