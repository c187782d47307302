package org.evenbeam.store.tables;

import static org.evenbeam.store.rows.TrailedTable.PLAN_REVISION;
import static org.evenbeam.store.rows.TrailedTable.VERIFICATION_PLAN;

import java.util.List;
import java.util.Optional;
import org.evenbeam.logbook.AlreadyThere;
import org.evenbeam.logbook.NotFound;
import org.evenbeam.logbook.Transaction;
import org.evenbeam.logbook.plans.PlanRecords;
import org.evenbeam.store.rows.OpenTransaction;
import org.evenbeam.store.rows.Row;
import org.evenbeam.store.rows.RowWriter;
import org.evenbeam.verification.plan.EnvironmentLimits;
import org.evenbeam.verification.plan.PlanRevision;
import org.evenbeam.verification.plan.PlannedCheckPoint;
import org.jdbi.v3.core.Handle;

/** Verification plans and their revisions. */
public final class PlanTable implements PlanRecords {
  private static final String SELECT =
      """
      select v.id, i.tag, p.title, v.revision, v.method, v.interval_days, v.temperature_low,
        v.temperature_high, v.humidity_low, v.humidity_high, v.pressure_low, v.pressure_high
      from plan_revision v
      join verification_plan p on p.id = v.plan_id
      join instrument i on i.id = p.instrument_id
      where i.tag = :tag
      """;
  private static final String NEWEST =
      " and v.revision = (select max(w.revision) from plan_revision w where w.plan_id = p.id)";

  /** A table of any open store. */
  public PlanTable() {}

  @Override
  public void add(Transaction transaction, PlanRevision revision) {
    if (find(transaction, revision.instrumentTag(), revision.title(), revision.revision())
        .isPresent()) {
      throw new AlreadyThere(NotFound.Thing.PLAN, revision.title() + " " + revision.revision());
    }
    RowWriter rows = OpenTransaction.rows(transaction);
    long revisionId = addRevision(rows, planId(transaction, revision), revision);
    int position = 0;
    for (PlannedCheckPoint checkPoint : revision.checkPoints()) {
      position++;
      CheckPoints.add(transaction, revisionId, position, checkPoint);
    }
  }

  @Override
  public List<PlanRevision> current(Transaction transaction, String instrumentTag) {
    Handle handle = OpenTransaction.reading(transaction);
    return handle
        .createQuery(SELECT + NEWEST + " order by p.title")
        .bind("tag", instrumentTag)
        .map(PlanHead::of)
        .list()
        .stream()
        .map(head -> head.with(CheckPoints.of(handle, head.id())))
        .toList();
  }

  @Override
  public Optional<PlanRevision> find(
      Transaction transaction, String instrumentTag, String title, int revision) {
    Handle handle = OpenTransaction.reading(transaction);
    return handle
        .createQuery(SELECT + " and p.title = :title and v.revision = :revision")
        .bind("tag", instrumentTag)
        .bind("title", title)
        .bind("revision", revision)
        .map(PlanHead::of)
        .findOne()
        .map(head -> head.with(CheckPoints.of(handle, head.id())));
  }

  private static long planId(Transaction transaction, PlanRevision revision) {
    long instrument = InstrumentTable.id(transaction, revision.instrumentTag());
    return OpenTransaction.reading(transaction)
        .createQuery(
            "select id from verification_plan where instrument_id = :instrument and title = :title")
        .bind("instrument", instrument)
        .bind("title", revision.title())
        .mapTo(Long.class)
        .findOne()
        .orElseGet(
            () ->
                OpenTransaction.rows(transaction)
                    .addNumbered(
                        Row.of(VERIFICATION_PLAN)
                            .with("instrument_id", instrument)
                            .with("title", revision.title())));
  }

  private static long addRevision(RowWriter rows, long planId, PlanRevision revision) {
    EnvironmentLimits environment = revision.environment();
    return rows.addNumbered(
        Row.of(PLAN_REVISION)
            .with("plan_id", planId)
            .with("revision", revision.revision())
            .with("method", revision.method())
            .with("interval_days", revision.intervalDays())
            .with("temperature_low", environment.temperature().low())
            .with("temperature_high", environment.temperature().high())
            .with("humidity_low", environment.humidity().low())
            .with("humidity_high", environment.humidity().high())
            .with("pressure_low", environment.pressure().low())
            .with("pressure_high", environment.pressure().high()));
  }
}
