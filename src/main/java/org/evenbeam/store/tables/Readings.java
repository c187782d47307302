package org.evenbeam.store.tables;

import static org.evenbeam.store.rows.TrailedTable.READING;
import static org.evenbeam.store.rows.TrailedTable.READING_STRIKE;

import java.sql.ResultSet;
import java.sql.SQLException;
import java.util.List;
import java.util.Optional;
import org.evenbeam.logbook.Transaction;
import org.evenbeam.logbook.run.Reading;
import org.evenbeam.store.rows.ColumnTypes;
import org.evenbeam.store.rows.OpenTransaction;
import org.evenbeam.store.rows.Row;
import org.jdbi.v3.core.statement.StatementContext;

/** Readings as typed, their corrections and strikes. */
final class Readings {
  private Readings() {}

  static long add(Transaction transaction, long run, Reading reading) {
    long revisionId = Runs.revisionId(transaction, run);
    return OpenTransaction.rows(transaction)
        .addNumbered(
            Row.of(READING)
                .with("run", run)
                .with("plan_revision_id", revisionId)
                .with(
                    "check_point_id", CheckPoints.id(transaction, revisionId, reading.checkPoint()))
                .with("position", reading.position())
                .with("typed", reading.value().text())
                .with("decimal_sign", reading.value().sign())
                .with("at", reading.at())
                .with("person_id", reading.personId())
                .with("source", reading.source())
                .with("source_key", reading.sourceKey())
                .with("corrects_id", reading.corrects().map(Reading.Correction::readingId))
                .with("correction_reason", reading.corrects().map(Reading.Correction::reason)));
  }

  static void strike(Transaction transaction, long readingId, Reading.Strike strike) {
    OpenTransaction.rows(transaction)
        .add(
            Row.of(READING_STRIKE)
                .with("reading_id", readingId)
                .with("cause", strike.cause())
                .with("at", strike.at())
                .with("person_id", strike.personId()));
  }

  static List<Reading> of(Transaction transaction, long run) {
    return OpenTransaction.reading(transaction)
        .createQuery(
            "select r.*, c.label, s.cause, s.at as struck_at, s.person_id as struck_by"
                + " from reading r"
                + " join check_point c on c.id = r.check_point_id"
                + " left join reading_strike s on s.reading_id = r.id"
                + " where r.run = :run order by r.id")
        .bind("run", run)
        .map(Readings::reading)
        .list();
  }

  private static Reading reading(ResultSet row, StatementContext context) throws SQLException {
    return new Reading(
        row.getLong("id"),
        row.getString("label"),
        row.getInt("position"),
        ColumnTypes.typed(row, "typed", "decimal_sign"),
        ColumnTypes.instant(row, "at"),
        row.getLong("person_id"),
        Reading.Source.valueOf(row.getString("source")),
        Optional.ofNullable(row.getString("source_key")),
        correction(row),
        strike(row));
  }

  private static Optional<Reading.Correction> correction(ResultSet row) throws SQLException {
    String reason = row.getString("correction_reason");
    return reason == null
        ? Optional.empty()
        : Optional.of(new Reading.Correction(row.getLong("corrects_id"), reason));
  }

  private static Optional<Reading.Strike> strike(ResultSet row) throws SQLException {
    String cause = row.getString("cause");
    return cause == null
        ? Optional.empty()
        : Optional.of(
            new Reading.Strike(
                cause, ColumnTypes.instant(row, "struck_at"), row.getLong("struck_by")));
  }
}
