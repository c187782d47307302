package org.evenbeam.store.tables;

import java.sql.ResultSet;
import java.sql.SQLException;
import java.util.List;
import java.util.Optional;
import org.evenbeam.store.rows.ColumnTypes;
import org.evenbeam.verification.plan.Bounds;
import org.evenbeam.verification.plan.EnvironmentLimits;
import org.evenbeam.verification.plan.PlanRevision;
import org.evenbeam.verification.plan.PlannedCheckPoint;
import org.jdbi.v3.core.statement.StatementContext;

/** A plan revision without its check points, and its key. */
record PlanHead(
    long id,
    String instrumentTag,
    String title,
    int revision,
    String method,
    int intervalDays,
    EnvironmentLimits environment) {

  static PlanHead of(ResultSet row, StatementContext context) throws SQLException {
    return new PlanHead(
        row.getLong("id"),
        row.getString("tag"),
        row.getString("title"),
        row.getInt("revision"),
        row.getString("method"),
        row.getInt("interval_days"),
        new EnvironmentLimits(
            bounds(row, "temperature"), bounds(row, "humidity"), bounds(row, "pressure")));
  }

  PlanRevision with(List<PlannedCheckPoint> checkPoints) {
    return new PlanRevision(
        instrumentTag, title, revision, method, intervalDays, environment, checkPoints);
  }

  private static Bounds bounds(ResultSet row, String condition) throws SQLException {
    return new Bounds(
        Optional.ofNullable(ColumnTypes.decimal(row, condition + "_low")),
        Optional.ofNullable(ColumnTypes.decimal(row, condition + "_high")));
  }
}
