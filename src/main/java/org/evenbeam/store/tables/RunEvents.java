package org.evenbeam.store.tables;

import static org.evenbeam.store.rows.TrailedTable.RUN_EVENT;
import static org.evenbeam.store.rows.TrailedTable.SIGNATURE;

import java.sql.ResultSet;
import java.sql.SQLException;
import java.util.List;
import java.util.Optional;
import org.evenbeam.logbook.Transaction;
import org.evenbeam.logbook.run.RunEvent;
import org.evenbeam.logbook.run.RunStep;
import org.evenbeam.logbook.run.Signature;
import org.evenbeam.store.rows.ColumnTypes;
import org.evenbeam.store.rows.OpenTransaction;
import org.evenbeam.store.rows.Row;
import org.jdbi.v3.core.mapper.reflect.ConstructorMapper;
import org.jdbi.v3.core.statement.StatementContext;

/** The steps of runs and their signatures. */
final class RunEvents {
  private RunEvents() {}

  static long add(Transaction transaction, long run, RunEvent event) {
    return OpenTransaction.rows(transaction)
        .addNumbered(
            Row.of(RUN_EVENT)
                .with("run", run)
                .with("sequence", event.sequence())
                .with("step", event.step())
                .with("person_id", event.personId())
                .with("at", event.at())
                .with("reason", event.reason())
                .with("answers_event_id", event.answers().map(RunEvent.Answered::eventId))
                .with("answers_person_id", event.answers().map(RunEvent.Answered::personId)));
  }

  static List<RunEvent> of(Transaction transaction, long run) {
    return OpenTransaction.reading(transaction)
        .createQuery("select * from run_event where run = :run order by sequence")
        .bind("run", run)
        .map(RunEvents::event)
        .list();
  }

  static void sign(Transaction transaction, long eventId, Signature signature) {
    OpenTransaction.rows(transaction)
        .addNumbered(
            Row.of(SIGNATURE)
                .with("event_id", eventId)
                .with("person_id", signature.personId())
                .with("meaning", signature.meaning())
                .with("at", signature.at())
                .with("content_sha256", signature.contentSha256()));
  }

  static List<Signature> signatures(Transaction transaction, long run) {
    return OpenTransaction.reading(transaction)
        .createQuery(
            "select s.person_id, s.meaning, s.at, s.content_sha256 from signature s"
                + " join run_event e on e.id = s.event_id where e.run = :run order by e.sequence")
        .bind("run", run)
        .map(ConstructorMapper.of(Signature.class))
        .list();
  }

  private static RunEvent event(ResultSet row, StatementContext context) throws SQLException {
    Optional<Long> answers = Optional.ofNullable(row.getObject("answers_event_id", Long.class));
    long submitter = row.getLong("answers_person_id");
    return new RunEvent(
        row.getLong("id"),
        row.getInt("sequence"),
        RunStep.valueOf(row.getString("step")),
        row.getLong("person_id"),
        ColumnTypes.instant(row, "at"),
        Optional.ofNullable(row.getString("reason")),
        answers.map(event -> new RunEvent.Answered(event, submitter)));
  }
}
