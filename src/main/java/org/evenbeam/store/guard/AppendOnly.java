package org.evenbeam.store.guard;

import java.sql.Connection;
import java.sql.SQLException;
import org.h2.api.Trigger;

/** Refuses every UPDATE and DELETE on its table, with SQLState {@link #REFUSED}. */
public final class AppendOnly implements Trigger {
  /** The SQLState of a refusal by a guard: a condition of the application's own (SQL, 45000). */
  public static final String REFUSED = "45000";

  private String table = "";

  /** Made by the database. */
  public AppendOnly() {}

  @Override
  public void init(
      Connection connection,
      String schema,
      String trigger,
      String table,
      boolean before,
      int type) {
    this.table = table;
  }

  @Override
  public void fire(Connection connection, Object[] oldRow, Object[] newRow) throws SQLException {
    throw new SQLException(table + " is append-only", REFUSED);
  }
}
