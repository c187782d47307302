package org.evenbeam.store.tables;

import java.util.List;
import org.evenbeam.logbook.Transaction;
import org.evenbeam.logbook.run.Scratch;
import org.evenbeam.store.rows.OpenTransaction;
import org.evenbeam.store.rows.Row;
import org.jdbi.v3.core.Handle;
import org.jdbi.v3.core.mapper.reflect.ConstructorMapper;

/** What is being typed and not yet entered; one row a check point, outside the trail. */
final class Scratches {
  private Scratches() {}

  static void keep(Transaction transaction, long run, Scratch scratch) {
    Handle handle = OpenTransaction.scratching(transaction);
    long checkPoint =
        CheckPoints.id(transaction, Runs.revisionId(transaction, run), scratch.checkPoint());
    handle
        .createUpdate("delete from scratch where run = :run and check_point_id = :checkPoint")
        .bind("run", run)
        .bind("checkPoint", checkPoint)
        .execute();
    if (scratch.text().isEmpty()) {
      return;
    }
    handle
        .createUpdate(
            "insert into scratch (run, check_point_id, text, at)"
                + " values (:run, :checkPoint, :text, :at)")
        .bind("run", run)
        .bind("checkPoint", checkPoint)
        .bind("text", scratch.text())
        .bind("at", Row.time(scratch.at()))
        .execute();
  }

  static List<Scratch> of(Transaction transaction, long run) {
    return OpenTransaction.reading(transaction)
        .createQuery(
            "select c.label as check_point, s.text, s.at from scratch s"
                + " join check_point c on c.id = s.check_point_id"
                + " where s.run = :run order by c.position")
        .bind("run", run)
        .map(ConstructorMapper.of(Scratch.class))
        .list();
  }
}
