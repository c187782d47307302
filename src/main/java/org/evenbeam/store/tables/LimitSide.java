package org.evenbeam.store.tables;

import static org.evenbeam.store.rows.TrailedTable.CHECK_POINT_LIMIT;

import java.sql.ResultSet;
import java.sql.SQLException;
import java.util.EnumMap;
import java.util.HashMap;
import java.util.Map;
import java.util.Optional;
import org.evenbeam.store.rows.ColumnTypes;
import org.evenbeam.store.rows.Row;
import org.evenbeam.store.rows.RowWriter;
import org.evenbeam.verification.plan.LimitTerms;
import org.evenbeam.verification.plan.PlannedCheckPoint;
import org.jdbi.v3.core.Handle;

/** What a limit of a check point bounds. */
enum LimitSide {
  /** How far the bias may lie below zero. */
  BIAS_BELOW,
  /** How far the bias may lie above zero. */
  BIAS_ABOVE,
  /** The standard deviation. */
  STANDARD_DEVIATION;

  static void add(RowWriter rows, long checkPointId, PlannedCheckPoint checkPoint) {
    checkPoint.biasBelow().ifPresent(terms -> BIAS_BELOW.add(rows, checkPointId, terms));
    checkPoint.biasAbove().ifPresent(terms -> BIAS_ABOVE.add(rows, checkPointId, terms));
    checkPoint
        .maximumStandardDeviation()
        .ifPresent(terms -> STANDARD_DEVIATION.add(rows, checkPointId, terms));
  }

  /** The limits of a revision by the key of their check point. */
  static Map<Long, Map<LimitSide, LimitTerms>> ofRevision(Handle handle, long revisionId) {
    Map<Long, Map<LimitSide, LimitTerms>> limits = new HashMap<>();
    handle
        .createQuery(
            "select l.* from check_point_limit l join check_point c on c.id = l.check_point_id"
                + " where c.plan_revision_id = :revision")
        .bind("revision", revisionId)
        .map((row, context) -> new Limit(row))
        .forEach(
            limit ->
                limits
                    .computeIfAbsent(limit.checkPointId, id -> new EnumMap<>(LimitSide.class))
                    .put(limit.side, limit.terms));
    return limits;
  }

  private void add(RowWriter rows, long checkPointId, LimitTerms terms) {
    rows.addNumbered(
        Row.of(CHECK_POINT_LIMIT)
            .with("check_point_id", checkPointId)
            .with("side", this)
            .with("absolute_amount", terms.absolute())
            .with("percent_of_reference", terms.percentOfReference())
            .with("percent_of_range", terms.percentOfRange())
            .with("combination", terms.combination()));
  }

  /** One row. */
  private record Limit(long checkPointId, LimitSide side, LimitTerms terms) {
    Limit(ResultSet row) throws SQLException {
      this(
          row.getLong("check_point_id"),
          LimitSide.valueOf(row.getString("side")),
          new LimitTerms(
              Optional.ofNullable(ColumnTypes.decimal(row, "absolute_amount")),
              Optional.ofNullable(ColumnTypes.decimal(row, "percent_of_reference")),
              Optional.ofNullable(ColumnTypes.decimal(row, "percent_of_range")),
              LimitTerms.Combination.valueOf(row.getString("combination"))));
    }
  }
}
