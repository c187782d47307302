package org.evenbeam.store;

import java.sql.Connection;
import java.sql.DriverManager;
import java.sql.SQLException;
import java.sql.Statement;
import org.evenbeam.logbook.StoreFailed.Reason;
import org.evenbeam.store.rows.ColumnTypes;
import org.evenbeam.store.rows.Failures;
import org.h2.jdbcx.JdbcConnectionPool;
import org.jdbi.v3.core.Jdbi;
import org.slf4j.Logger;
import org.slf4j.LoggerFactory;

/**
 * An open database. Its owner's connection is opened first, without a write delay, and held for as
 * long as the database is open: the setting is in force only while it is given at opening. Every
 * use case works by the everyday user, who may read and add, and change only what is meant to
 * change.
 */
final class Database implements AutoCloseable {
  /** The user who owns tables and guards. */
  static final String OWNER = "EVENBEAM_OWNER";

  /** The user by whom every use case works. */
  static final String EVERYDAY = "EVENBEAM_EVERYDAY";

  private static final String OWNERS_SETTINGS =
      ";WRITE_DELAY=0;DB_CLOSE_ON_EXIT=FALSE;TRACE_LEVEL_FILE=0";
  private static final String WRONG_PASSWORD = "28000";
  private static final Logger LOG = LoggerFactory.getLogger(Database.class);
  private static final int MOST_CONNECTIONS = 16;

  private final Connection owner;
  private final JdbcConnectionPool pool;
  private final Jdbi everyday;

  private Database(Connection owner, JdbcConnectionPool pool) {
    this.owner = owner;
    this.pool = pool;
    this.everyday = ColumnTypes.register(Jdbi.create(pool));
  }

  /**
   * Makes a database at that URL.
   *
   * @throws org.evenbeam.logbook.StoreFailed with the reason
   */
  static Database create(String url, Passwords passwords, Failures failures) {
    return connect(url, passwords, failures, false);
  }

  /**
   * Opens the logbook at that URL and brings its schema up to date.
   *
   * @throws org.evenbeam.logbook.StoreFailed with the reason; DAMAGED when there is a database
   *     without a logbook, as an emptied file is
   */
  static Database open(String url, Passwords passwords, Failures failures) {
    return connect(url + ";IFEXISTS=TRUE", passwords, failures, true);
  }

  private static Database connect(
      String url, Passwords passwords, Failures failures, boolean isOld) {
    Connection owner = null;
    boolean opened = false;
    try {
      owner = DriverManager.getConnection(url + OWNERS_SETTINGS, OWNER, passwords.owner());
      if (owner.isReadOnly()) {
        throw failures.because(Reason.READ_ONLY, new SQLException("opened read-only"));
      }
      Schema schema = new Schema(url, OWNER, passwords.owner(), failures);
      if (isOld) {
        schema.requireLogbook();
      }
      schema.migrate();
      addEverydayUser(owner, passwords);
      JdbcConnectionPool pool = JdbcConnectionPool.create(url, EVERYDAY, passwords.everyday());
      pool.setMaxConnections(MOST_CONNECTIONS);
      Database database = new Database(owner, pool);
      opened = true;
      return database;
    } catch (SQLException refused) {
      throw WRONG_PASSWORD.equals(refused.getSQLState())
          ? new Failures(passwords.file()).because(Reason.DAMAGED, refused)
          : failures.of(refused);
    } finally {
      if (!opened) {
        abandon(owner);
      }
    }
  }

  /** The everyday user's connections. */
  Jdbi everyday() {
    return everyday;
  }

  /** Writes what was committed through to the disk. */
  void sync() throws SQLException {
    try (Statement statement = owner.createStatement()) {
      statement.execute("checkpoint sync");
    }
  }

  /**
   * Whether it still answers the owner; a database that could not write has closed itself. The
   * connection's own {@code isValid} says yes even then.
   */
  boolean isAlive() {
    try (Statement statement = owner.createStatement()) {
      return statement.execute("select number from chain_head");
    } catch (SQLException dead) {
      return false;
    }
  }

  /** Closes it; what was acknowledged is on the disk already. */
  @Override
  public void close() throws SQLException {
    pool.dispose();
    owner.close();
  }

  private static void addEverydayUser(Connection owner, Passwords passwords) throws SQLException {
    try (Statement statement = owner.createStatement()) {
      statement.execute(
          "create user if not exists " + EVERYDAY + " password '" + passwords.everyday() + "'");
      statement.execute("grant everyday to " + EVERYDAY);
    }
  }

  /** The failure that is on its way says more than one of closing, which is only logged. */
  private static void abandon(Connection owner) {
    if (owner == null) {
      return;
    }
    try {
      owner.close();
    } catch (SQLException unclosed) {
      LOG.warn("A connection could not be closed after a failed opening", unclosed);
    }
  }
}
