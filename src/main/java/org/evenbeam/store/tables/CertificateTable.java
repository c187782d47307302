package org.evenbeam.store.tables;

import static org.evenbeam.store.rows.TrailedTable.CERTIFICATE;
import static org.evenbeam.store.rows.TrailedTable.CERTIFICATE_DOCUMENT;

import java.nio.charset.StandardCharsets;
import java.sql.ResultSet;
import java.sql.SQLException;
import java.time.Instant;
import java.time.LocalDate;
import java.time.ZoneId;
import java.util.List;
import java.util.Optional;
import org.evenbeam.logbook.Transaction;
import org.evenbeam.logbook.certificates.CertificateFacts;
import org.evenbeam.logbook.certificates.CertificateRecord;
import org.evenbeam.logbook.certificates.CertificateRecords;
import org.evenbeam.store.rows.ColumnTypes;
import org.evenbeam.store.rows.OpenTransaction;
import org.evenbeam.store.rows.Row;
import org.evenbeam.trail.Sha256;
import org.jdbi.v3.core.mapper.reflect.ConstructorMapper;
import org.jdbi.v3.core.statement.StatementContext;

/** Certificate records and their documents; lists never touch the large columns. */
public final class CertificateTable implements CertificateRecords {
  private static final String FACTS =
      """
      select c.number, c.run, i.tag as instrument_tag, c.performed, c.issued_at,
        m.name as approved_by, s.verdict, d.sha256 as document_sha256
      from certificate c
      join run r on r.number = c.run
      join instrument i on i.id = r.instrument_id
      join run_event e on e.id = c.approval_event_id
      join person m on m.id = e.person_id
      left join submission s on s.event_id = e.answers_event_id
      left join certificate_document d on d.number = c.number
      """;

  /** A table of any open store. */
  public CertificateTable() {}

  @Override
  public int countOfYear(Transaction transaction, int year) {
    ZoneId zone = InstrumentOverviews.zone(transaction);
    return OpenTransaction.reading(transaction)
        .createQuery(
            "select count(*) from certificate where issued_at >= :first and issued_at < :next")
        .bind("first", startOf(year, zone))
        .bind("next", startOf(year + 1, zone))
        .mapTo(Integer.class)
        .one();
  }

  @Override
  public void add(Transaction transaction, CertificateRecord certificate) {
    OpenTransaction.rows(transaction)
        .add(
            Row.of(CERTIFICATE)
                .with("number", certificate.number())
                .with("run", certificate.run())
                .with("approval_event_id", certificate.approvalEventId())
                .with("performed", certificate.performed())
                .with("issued_at", certificate.issuedAt())
                .with("issued_by", certificate.issuedBy())
                .with("trail_head", certificate.trailHead())
                .with("template_sha256", certificate.templateSha256())
                .with("program", certificate.program())
                .with("rules_version", certificate.rulesVersion())
                .with("data", certificate.data().getBytes(StandardCharsets.UTF_8)));
  }

  @Override
  public Optional<CertificateRecord> find(Transaction transaction, String number) {
    return OpenTransaction.reading(transaction)
        .createQuery("select * from certificate where number = :number")
        .bind("number", number)
        .map(CertificateTable::certificate)
        .findOne();
  }

  @Override
  public List<CertificateFacts> ofRun(Transaction transaction, long run) {
    return OpenTransaction.reading(transaction)
        .createQuery(FACTS + "where c.run = :run order by c.issued_at desc, c.number desc")
        .bind("run", run)
        .map(ConstructorMapper.of(CertificateFacts.class))
        .list();
  }

  @Override
  public List<CertificateFacts> newest(Transaction transaction, int most) {
    return OpenTransaction.reading(transaction)
        .createQuery(FACTS + "order by c.issued_at desc, c.number desc fetch first :most rows only")
        .bind("most", most)
        .map(ConstructorMapper.of(CertificateFacts.class))
        .list();
  }

  @Override
  public List<String> withoutDocument(Transaction transaction) {
    return OpenTransaction.reading(transaction)
        .createQuery(
            "select c.number from certificate c"
                + " left join certificate_document d on d.number = c.number"
                + " where d.number is null order by c.issued_at, c.number")
        .mapTo(String.class)
        .list();
  }

  @Override
  public void addDocument(Transaction transaction, String number, byte[] bytes, Instant at) {
    OpenTransaction.rows(transaction)
        .add(
            Row.of(CERTIFICATE_DOCUMENT)
                .with("number", number)
                .with("bytes", bytes)
                .with("sha256", Sha256.hex(bytes))
                .with("kept_at", at));
  }

  @Override
  public Optional<byte[]> document(Transaction transaction, String number) {
    return OpenTransaction.reading(transaction)
        .createQuery("select bytes from certificate_document where number = :number")
        .bind("number", number)
        .map((row, context) -> row.getBytes("bytes"))
        .findOne();
  }

  private static Object startOf(int year, ZoneId zone) {
    return Row.time(LocalDate.of(year, 1, 1).atStartOfDay(zone).toInstant());
  }

  private static CertificateRecord certificate(ResultSet row, StatementContext context)
      throws SQLException {
    return new CertificateRecord(
        row.getString("number"),
        row.getLong("run"),
        row.getLong("approval_event_id"),
        row.getObject("performed", LocalDate.class),
        ColumnTypes.instant(row, "issued_at"),
        row.getLong("issued_by"),
        row.getString("trail_head"),
        row.getString("template_sha256"),
        row.getString("program"),
        row.getInt("rules_version"),
        new String(row.getBytes("data"), StandardCharsets.UTF_8));
  }
}
