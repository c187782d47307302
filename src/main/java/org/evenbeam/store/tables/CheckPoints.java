package org.evenbeam.store.tables;

import static org.evenbeam.store.rows.TrailedTable.CHECK_POINT;

import java.sql.ResultSet;
import java.sql.SQLException;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.evenbeam.logbook.NotFound;
import org.evenbeam.logbook.Transaction;
import org.evenbeam.store.rows.ColumnTypes;
import org.evenbeam.store.rows.OpenTransaction;
import org.evenbeam.store.rows.Row;
import org.evenbeam.verification.DecisionRule;
import org.evenbeam.verification.plan.LimitTerms;
import org.evenbeam.verification.plan.PlannedCheckPoint;
import org.jdbi.v3.core.Handle;

/** The check points of a plan revision. */
final class CheckPoints {
  private CheckPoints() {}

  static void add(
      Transaction transaction, long revisionId, int position, PlannedCheckPoint checkPoint) {
    long id =
        OpenTransaction.rows(transaction)
            .addNumbered(
                Row.of(CHECK_POINT)
                    .with("plan_revision_id", revisionId)
                    .with("position", position)
                    .with("label", checkPoint.label())
                    .with("nominal", checkPoint.nominal())
                    .with("standard_id", StandardTable.id(transaction, checkPoint.standardTag()))
                    .with("value_label", checkPoint.valueLabel())
                    .with("readings", checkPoint.readings())
                    .with("alpha", checkPoint.alpha())
                    .with("bias_rule", checkPoint.biasRule())
                    .with("precision_rule", checkPoint.precisionRule())
                    .with("reference_left_out_because", checkPoint.referenceLeftOutBecause()));
    LimitSide.add(OpenTransaction.rows(transaction), id, checkPoint);
  }

  static List<PlannedCheckPoint> of(Handle handle, long revisionId) {
    Map<Long, Map<LimitSide, LimitTerms>> limits = LimitSide.ofRevision(handle, revisionId);
    return handle
        .createQuery(
            "select c.*, s.tag from check_point c join reference_standard s on s.id = c.standard_id"
                + " where c.plan_revision_id = :revision order by c.position")
        .bind("revision", revisionId)
        .map((row, context) -> checkPoint(row, limits.getOrDefault(row.getLong("id"), Map.of())))
        .list();
  }

  /**
   * The key of a check point of a run's plan revision.
   *
   * @throws NotFound when it has none of that label
   */
  static long id(Transaction transaction, long revisionId, String label) {
    return OpenTransaction.reading(transaction)
        .createQuery(
            "select id from check_point where plan_revision_id = :revision and label = :label")
        .bind("revision", revisionId)
        .bind("label", label)
        .mapTo(Long.class)
        .findOne()
        .orElseThrow(() -> new NotFound(NotFound.Thing.CHECK_POINT, label));
  }

  private static PlannedCheckPoint checkPoint(ResultSet row, Map<LimitSide, LimitTerms> limits)
      throws SQLException {
    return new PlannedCheckPoint(
        row.getString("label"),
        ColumnTypes.decimal(row, "nominal"),
        row.getString("tag"),
        row.getString("value_label"),
        row.getInt("readings"),
        Optional.ofNullable(limits.get(LimitSide.BIAS_BELOW)),
        Optional.ofNullable(limits.get(LimitSide.BIAS_ABOVE)),
        Optional.ofNullable(limits.get(LimitSide.STANDARD_DEVIATION)),
        Double.parseDouble(row.getString("alpha")),
        DecisionRule.valueOf(row.getString("bias_rule")),
        DecisionRule.valueOf(row.getString("precision_rule")),
        Optional.ofNullable(row.getString("reference_left_out_because")));
  }
}
