package org.evenbeam.store.tables;

import static org.evenbeam.store.rows.TrailedTable.RUN;
import static org.evenbeam.store.rows.TrailedTable.RUN_STANDARD;

import java.sql.ResultSet;
import java.sql.SQLException;
import java.util.List;
import java.util.Optional;
import org.evenbeam.logbook.NotFound;
import org.evenbeam.logbook.Transaction;
import org.evenbeam.logbook.run.Run;
import org.evenbeam.logbook.run.RunKind;
import org.evenbeam.store.rows.ColumnTypes;
import org.evenbeam.store.rows.OpenTransaction;
import org.evenbeam.store.rows.Row;
import org.jdbi.v3.core.Handle;
import org.jdbi.v3.core.mapper.reflect.ConstructorMapper;

/** What is settled about runs when they start. */
final class Runs {
  private Runs() {}

  /**
   * Adds a run under the next number. Changes follow one another, so the numbers have no gap for a
   * reader to wonder about, as a sequence of the database would leave.
   */
  static long add(Transaction transaction, Run run) {
    Handle handle = OpenTransaction.reading(transaction);
    Plan plan = plan(handle, run);
    long number =
        handle.createQuery("select coalesce(max(number), 0) + 1 from run").mapTo(Long.class).one();
    OpenTransaction.rows(transaction)
        .add(
            Row.of(RUN)
                .with("number", number)
                .with("instrument_id", plan.instrumentId)
                .with("plan_id", plan.id)
                .with("plan_revision_id", plan.revisionId)
                .with("kind", run.kind())
                .with("technician_id", run.technicianId())
                .with("started_at", run.startedAt())
                .with("as_found_run", run.asLeftOf().map(Run.AsLeftOf::asFoundRun))
                .with("adjustment_id", run.asLeftOf().map(Run.AsLeftOf::adjustmentEvent)));
    for (Run.StandardInUse standard : run.standards()) {
      addStandard(transaction, number, plan.revisionId, standard);
    }
    return number;
  }

  static Optional<Run> find(Transaction transaction, long number) {
    Handle handle = OpenTransaction.reading(transaction);
    return handle
        .createQuery(
            "select r.*, i.tag, p.title, v.revision from run r"
                + " join instrument i on i.id = r.instrument_id"
                + " join verification_plan p on p.id = r.plan_id"
                + " join plan_revision v on v.id = r.plan_revision_id"
                + " where r.number = :number")
        .bind("number", number)
        .map((row, context) -> run(row, standards(handle, number)))
        .findOne();
  }

  /**
   * The key of a run's plan revision.
   *
   * @throws NotFound when there is no such run
   */
  static long revisionId(Transaction transaction, long number) {
    return OpenTransaction.reading(transaction)
        .createQuery("select plan_revision_id from run where number = :number")
        .bind("number", number)
        .mapTo(Long.class)
        .findOne()
        .orElseThrow(() -> new NotFound(NotFound.Thing.RUN, Long.toString(number)));
  }

  private static Plan plan(Handle handle, Run run) {
    return handle
        .createQuery(
            "select p.id, p.instrument_id, v.id as revision_id from plan_revision v"
                + " join verification_plan p on p.id = v.plan_id"
                + " join instrument i on i.id = p.instrument_id"
                + " where i.tag = :tag and p.title = :title and v.revision = :revision")
        .bind("tag", run.instrumentTag())
        .bind("title", run.planTitle())
        .bind("revision", run.planRevision())
        .map(ConstructorMapper.of(Plan.class))
        .findOne()
        .orElseThrow(
            () -> new NotFound(NotFound.Thing.PLAN, run.planTitle() + " " + run.planRevision()));
  }

  private static void addStandard(
      Transaction transaction, long run, long revisionId, Run.StandardInUse standard) {
    OpenTransaction.rows(transaction)
        .addNumbered(
            Row.of(RUN_STANDARD)
                .with("run", run)
                .with("plan_revision_id", revisionId)
                .with(
                    "check_point_id",
                    CheckPoints.id(transaction, revisionId, standard.checkPoint()))
                .with("certificate_id", StandardCertificates.id(transaction, standard)));
  }

  private static List<Run.StandardInUse> standards(Handle handle, long number) {
    return handle
        .createQuery(
            "select c.label as check_point, s.tag as standard_tag, t.number as certificate_number"
                + " from run_standard r"
                + " join check_point c on c.id = r.check_point_id"
                + " join standard_certificate t on t.id = r.certificate_id"
                + " join reference_standard s on s.id = t.standard_id"
                + " where r.run = :number order by c.position")
        .bind("number", number)
        .map(ConstructorMapper.of(Run.StandardInUse.class))
        .list();
  }

  private static Run run(ResultSet row, List<Run.StandardInUse> standards) throws SQLException {
    Optional<Long> asFound = Optional.ofNullable(row.getObject("as_found_run", Long.class));
    long adjustment = row.getLong("adjustment_id");
    return new Run(
        row.getLong("number"),
        row.getString("tag"),
        row.getString("title"),
        row.getInt("revision"),
        RunKind.valueOf(row.getString("kind")),
        row.getLong("technician_id"),
        ColumnTypes.instant(row, "started_at"),
        asFound.map(number -> new Run.AsLeftOf(number, adjustment)),
        standards);
  }

  /** The keys of a plan revision and of what it belongs to. */
  record Plan(long id, long instrumentId, long revisionId) {}
}
