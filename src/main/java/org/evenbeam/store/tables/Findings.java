package org.evenbeam.store.tables;

import static org.evenbeam.store.rows.TrailedTable.FINDING;
import static org.evenbeam.store.rows.TrailedTable.SUBMISSION;

import java.util.List;
import java.util.Optional;
import org.evenbeam.logbook.NotFound;
import org.evenbeam.logbook.Transaction;
import org.evenbeam.logbook.run.KeptFinding;
import org.evenbeam.logbook.run.RunStep;
import org.evenbeam.store.rows.OpenTransaction;
import org.evenbeam.store.rows.Row;
import org.evenbeam.verification.Verdict;
import org.jdbi.v3.core.mapper.reflect.ConstructorMapper;

/** What was found at submissions. */
final class Findings {
  private Findings() {}

  static void add(
      Transaction transaction,
      long eventId,
      Optional<Verdict> verdict,
      List<KeptFinding> findings) {
    OpenTransaction.rows(transaction)
        .add(
            Row.of(SUBMISSION)
                .with("event_id", eventId)
                .with("step", RunStep.SUBMITTED)
                .with("verdict", verdict));
    long revisionId = revisionId(transaction, eventId);
    int position = 0;
    for (KeptFinding finding : findings) {
      position++;
      add(transaction, eventId, revisionId, position, finding);
    }
  }

  static List<KeptFinding> of(Transaction transaction, long eventId) {
    return OpenTransaction.reading(transaction)
        .createQuery(
            "select c.label as check_point, f.criterion, f.rule, f.outcome, f.rules_version,"
                + " f.figures from finding f join check_point c on c.id = f.check_point_id"
                + " where f.event_id = :event order by f.position")
        .bind("event", eventId)
        .map(ConstructorMapper.of(KeptFinding.class))
        .list();
  }

  private static void add(
      Transaction transaction, long eventId, long revisionId, int position, KeptFinding finding) {
    OpenTransaction.rows(transaction)
        .addNumbered(
            Row.of(FINDING)
                .with("event_id", eventId)
                .with(
                    "check_point_id", CheckPoints.id(transaction, revisionId, finding.checkPoint()))
                .with("position", position)
                .with("criterion", finding.criterion())
                .with("rule", finding.rule())
                .with("outcome", finding.outcome())
                .with("rules_version", finding.rulesVersion())
                .with("figures", finding.figures()));
  }

  private static long revisionId(Transaction transaction, long eventId) {
    return OpenTransaction.reading(transaction)
        .createQuery(
            "select r.plan_revision_id from run r join run_event e on e.run = r.number"
                + " where e.id = :event")
        .bind("event", eventId)
        .mapTo(Long.class)
        .findOne()
        .orElseThrow(() -> new NotFound(NotFound.Thing.RUN, Long.toString(eventId)));
  }
}
