package org.evenbeam.store;

import java.sql.Connection;
import java.sql.DriverManager;
import java.sql.ResultSet;
import java.sql.SQLException;
import java.sql.Statement;

/**
 * The connection of the user who owns tables and guards. It is opened before any other, without a
 * write delay, and held for as long as the database is open: the setting is in force only while it
 * is given at opening.
 *
 * <p>Space inside the file is not used again while it is open. Where H2 2.5.252 writes changes into
 * such space, the file's header names the pages written before them, and after a kill the newest
 * changes, acknowledged as they are, are not found. Written at the file's end they are found by
 * searching from there; {@link Compaction} gives the space back at closing.
 */
final class OwnersConnection implements AutoCloseable {
  /** The owner's name. */
  static final String USER = "EVENBEAM_OWNER";

  private static final String SETTINGS = ";WRITE_DELAY=0;DB_CLOSE_ON_EXIT=FALSE;TRACE_LEVEL_FILE=0";
  private static final String SETTINGS_OF_A_FILE = ";REUSE_SPACE=FALSE";
  private static final String IN_MEMORY = "jdbc:h2:mem:";

  private final Connection connection;

  private OwnersConnection(Connection connection) {
    this.connection = connection;
  }

  static OwnersConnection open(String url, Passwords passwords) throws SQLException {
    String settings = url.startsWith(IN_MEMORY) ? SETTINGS : SETTINGS + SETTINGS_OF_A_FILE;
    return new OwnersConnection(
        DriverManager.getConnection(url + settings, USER, passwords.owner()));
  }

  void execute(String sql) throws SQLException {
    try (Statement statement = connection.createStatement()) {
      statement.execute(sql);
    }
  }

  boolean isReadOnly() throws SQLException {
    return connection.isReadOnly();
  }

  /** The hash in the chain's head. */
  String head() throws SQLException {
    return text("select hash from chain_head where id = 1", "");
  }

  /** Whether much of the file is pages out of date; false for a database in memory. */
  boolean isWasteful() throws SQLException {
    return Compaction.isWorthIt(info("FILE_SIZE", "0"), (int) info("CHUNKS_FILL_RATE", "100"));
  }

  /** Closes the database for everyone. */
  void shutDown() throws SQLException {
    execute("shutdown");
  }

  @Override
  public void close() throws SQLException {
    connection.close();
  }

  private long info(String name, String otherwise) throws SQLException {
    String sql =
        "select setting_value from information_schema.settings where setting_name = 'info.%s'";
    return Long.parseLong(text(sql.formatted(name), otherwise));
  }

  private String text(String sql, String otherwise) throws SQLException {
    try (Statement statement = connection.createStatement();
        ResultSet row = statement.executeQuery(sql)) {
      return row.next() ? row.getString(1) : otherwise;
    }
  }
}
