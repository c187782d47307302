package org.evenbeam.store.guard;

import java.sql.Connection;
import java.sql.SQLException;
import org.h2.api.Trigger;

/** Refuses every DELETE on its table, with SQLState {@link AppendOnly#REFUSED}. */
public final class NeverRemoved implements Trigger {
  private String table = "";

  /** Made by the database. */
  public NeverRemoved() {}

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
    throw new SQLException("rows of " + table + " are never removed", AppendOnly.REFUSED);
  }
}
