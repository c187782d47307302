package org.evenbeam.store.tables;

import static org.evenbeam.store.rows.TrailedTable.RUN_CONDITIONS;

import java.sql.ResultSet;
import java.sql.SQLException;
import java.time.Instant;
import java.util.Locale;
import java.util.Optional;
import org.evenbeam.logbook.Transaction;
import org.evenbeam.metrology.TypedDecimal;
import org.evenbeam.store.rows.ColumnTypes;
import org.evenbeam.store.rows.OpenTransaction;
import org.evenbeam.store.rows.Row;
import org.evenbeam.verification.Condition;
import org.evenbeam.verification.plan.Conditions;
import org.jdbi.v3.core.statement.StatementContext;

/** The conditions recorded for runs, the newest in force. */
final class RunConditions {
  private RunConditions() {}

  static void add(
      Transaction transaction, long run, Conditions conditions, long personId, Instant at) {
    Row row = Row.of(RUN_CONDITIONS).with("run", run).with("person_id", personId).with("at", at);
    for (Condition condition : Condition.values()) {
      Optional<TypedDecimal> value = conditions.value(condition);
      row.with(column(condition), value.map(TypedDecimal::text))
          .with(column(condition) + "_sign", value.map(TypedDecimal::sign));
    }
    OpenTransaction.rows(transaction).addNumbered(row);
  }

  static Conditions newest(Transaction transaction, long run) {
    return OpenTransaction.reading(transaction)
        .createQuery(
            "select * from run_conditions where run = :run order by id desc fetch first row only")
        .bind("run", run)
        .map(RunConditions::conditions)
        .findOne()
        .orElse(Conditions.NONE);
  }

  private static Conditions conditions(ResultSet row, StatementContext context)
      throws SQLException {
    return new Conditions(
        typed(row, Condition.TEMPERATURE),
        typed(row, Condition.HUMIDITY),
        typed(row, Condition.PRESSURE));
  }

  private static Optional<TypedDecimal> typed(ResultSet row, Condition condition)
      throws SQLException {
    String column = column(condition);
    return Optional.ofNullable(ColumnTypes.typed(row, column, column + "_sign"));
  }

  private static String column(Condition condition) {
    return condition.name().toLowerCase(Locale.ROOT);
  }
}
