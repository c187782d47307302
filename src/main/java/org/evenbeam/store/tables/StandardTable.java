package org.evenbeam.store.tables;

import static org.evenbeam.store.rows.TrailedTable.CERTIFIED_VALUE;
import static org.evenbeam.store.rows.TrailedTable.REFERENCE_STANDARD;
import static org.evenbeam.store.rows.TrailedTable.STANDARD_CERTIFICATE;
import static org.evenbeam.store.rows.TrailedTable.UNCERTAINTY_TERM;

import java.util.List;
import java.util.Optional;
import org.evenbeam.logbook.NotFound;
import org.evenbeam.logbook.Transaction;
import org.evenbeam.logbook.standards.CertifiedValue;
import org.evenbeam.logbook.standards.ReferenceStandard;
import org.evenbeam.logbook.standards.StandardCertificate;
import org.evenbeam.logbook.standards.StandardRecords;
import org.evenbeam.metrology.UncertaintyTerm;
import org.evenbeam.store.rows.OpenTransaction;
import org.evenbeam.store.rows.Row;
import org.evenbeam.store.rows.RowWriter;
import org.jdbi.v3.core.mapper.RowMapper;
import org.jdbi.v3.core.mapper.reflect.ConstructorMapper;

/** Reference standards, their certificates and what these certify. */
public final class StandardTable implements StandardRecords {
  private static final String SELECT =
      "select tag, kind, maker, serial_number, unit from reference_standard ";
  private static final RowMapper<ReferenceStandard> MAPPER =
      ConstructorMapper.of(ReferenceStandard.class);

  /** A table of any open store. */
  public StandardTable() {}

  /**
   * The key of the standard of that tag.
   *
   * @throws NotFound when there is none
   */
  static long id(Transaction transaction, String tag) {
    return OpenTransaction.reading(transaction)
        .createQuery("select id from reference_standard where tag = :tag")
        .bind("tag", tag)
        .mapTo(Long.class)
        .findOne()
        .orElseThrow(() -> new NotFound(NotFound.Thing.STANDARD, tag));
  }

  @Override
  public void add(Transaction transaction, ReferenceStandard standard) {
    OpenTransaction.rows(transaction)
        .addNumbered(
            Row.of(REFERENCE_STANDARD)
                .with("version", 1L)
                .with("tag", standard.tag())
                .with("kind", standard.kind())
                .with("maker", standard.maker())
                .with("serial_number", standard.serialNumber())
                .with("unit", standard.unit()));
  }

  @Override
  public Optional<ReferenceStandard> find(Transaction transaction, String tag) {
    return OpenTransaction.reading(transaction)
        .createQuery(SELECT + "where tag = :tag")
        .bind("tag", tag)
        .map(MAPPER)
        .findOne();
  }

  @Override
  public List<ReferenceStandard> all(Transaction transaction) {
    return OpenTransaction.reading(transaction)
        .createQuery(SELECT + "order by tag")
        .map(MAPPER)
        .list();
  }

  @Override
  public void addCertificate(Transaction transaction, String tag, StandardCertificate certificate) {
    RowWriter rows = OpenTransaction.rows(transaction);
    long id =
        rows.addNumbered(
            Row.of(STANDARD_CERTIFICATE)
                .with("standard_id", id(transaction, tag))
                .with("number", certificate.number())
                .with("issued_by", certificate.issuedBy())
                .with("traceability", certificate.traceability())
                .with("issued", certificate.issued())
                .with("expires", certificate.expires()));
    int position = 0;
    for (CertifiedValue value : certificate.values()) {
      position++;
      addValue(rows, id, position, value);
    }
  }

  @Override
  public List<StandardCertificate> certificates(Transaction transaction, String tag) {
    return StandardCertificates.of(transaction, id(transaction, tag));
  }

  private static void addValue(
      RowWriter rows, long certificateId, int position, CertifiedValue value) {
    long id =
        rows.addNumbered(
            Row.of(CERTIFIED_VALUE)
                .with("certificate_id", certificateId)
                .with("position", position)
                .with("label", value.label())
                .with("certified", value.value()));
    int place = 0;
    for (UncertaintyTerm term : value.budget().terms()) {
      place++;
      rows.addNumbered(
          Row.of(UNCERTAINTY_TERM)
              .with("certified_value_id", id)
              .with("position", place)
              .with("name", term.name())
              .with("stated", term.stated())
              .with("spread", term.spread())
              .with("coverage_factor", term.coverageFactor())
              .with("degrees_of_freedom", term.degreesOfFreedom()));
    }
  }
}
