package org.evenbeam.store.tables;

import java.sql.ResultSet;
import java.sql.SQLException;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import org.evenbeam.logbook.Transaction;
import org.evenbeam.logbook.run.RunKind;
import org.evenbeam.logbook.run.RunState;
import org.evenbeam.logbook.run.RunStep;
import org.evenbeam.logbook.run.RunSummary;
import org.evenbeam.store.rows.ColumnTypes;
import org.evenbeam.store.rows.OpenTransaction;
import org.evenbeam.verification.Verdict;
import org.jdbi.v3.core.statement.StatementContext;

/** Runs in lists: the state from the last event, the verdict from the last submission. */
final class RunSummaries {
  private static final String SELECT =
      """
      select r.number, i.tag, p.title, v.revision, r.kind, r.technician_id,
        t.name as technician, r.started_at, e.step, s.verdict
      from run r
      join instrument i on i.id = r.instrument_id
      join verification_plan p on p.id = r.plan_id
      join plan_revision v on v.id = r.plan_revision_id
      join person t on t.id = r.technician_id
      join run_event e on e.run = r.number
        and e.sequence = (select max(l.sequence) from run_event l where l.run = r.number)
      left join submission s on s.event_id = (
        select max(b.id) from run_event b where b.run = r.number and b.step = 'SUBMITTED')
      """;

  private RunSummaries() {}

  static List<RunSummary> inState(Transaction transaction, RunState state) {
    List<RunStep> steps =
        Arrays.stream(RunStep.values()).filter(step -> step.state() == state).toList();
    return OpenTransaction.reading(transaction)
        .createQuery(SELECT + "where e.step in (<steps>) order by r.started_at, r.number")
        .bindList("steps", steps.stream().map(RunStep::name).toList())
        .map(RunSummaries::summary)
        .list();
  }

  static List<RunSummary> ofInstrument(Transaction transaction, String tag, int most) {
    return OpenTransaction.reading(transaction)
        .createQuery(
            SELECT
                + "where r.instrument_id = :instrument"
                + " order by r.started_at desc, r.number desc fetch first :most rows only")
        .bind("instrument", InstrumentTable.id(transaction, tag))
        .bind("most", most)
        .map(RunSummaries::summary)
        .list();
  }

  private static RunSummary summary(ResultSet row, StatementContext context) throws SQLException {
    return new RunSummary(
        row.getLong("number"),
        row.getString("tag"),
        row.getString("title"),
        row.getInt("revision"),
        RunKind.valueOf(row.getString("kind")),
        row.getLong("technician_id"),
        row.getString("technician"),
        ColumnTypes.instant(row, "started_at"),
        RunStep.valueOf(row.getString("step")).state(),
        Optional.ofNullable(row.getString("verdict")).map(Verdict::valueOf));
  }
}
