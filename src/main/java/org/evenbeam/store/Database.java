package org.evenbeam.store;

import java.sql.SQLException;
import java.util.Optional;
import org.evenbeam.logbook.StoreFailed.Reason;
import org.evenbeam.store.rows.ColumnTypes;
import org.evenbeam.store.rows.Failures;
import org.h2.jdbcx.JdbcConnectionPool;
import org.jdbi.v3.core.Jdbi;
import org.slf4j.Logger;
import org.slf4j.LoggerFactory;

/**
 * An open database. Every use case works by the everyday user, who may read and add, and change
 * only what is meant to change.
 */
final class Database implements AutoCloseable {
  /** The user by whom every use case works. */
  static final String EVERYDAY = "EVENBEAM_EVERYDAY";

  private static final String WRONG_PASSWORD = "28000";
  private static final Logger LOG = LoggerFactory.getLogger(Database.class);
  private static final int MOST_CONNECTIONS = 16;

  private final OwnersConnection owner;
  private final JdbcConnectionPool pool;
  private final Jdbi everyday;

  private Database(OwnersConnection owner, JdbcConnectionPool pool) {
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
    OwnersConnection owner = null;
    boolean opened = false;
    try {
      owner = OwnersConnection.open(url, passwords);
      if (owner.isReadOnly()) {
        throw failures.because(Reason.READ_ONLY, new SQLException("opened read-only"));
      }
      Schema schema = new Schema(url, OwnersConnection.USER, passwords.owner(), failures);
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
        closeAfterFailure(owner);
      }
    }
  }

  /** The everyday user's connections. */
  Jdbi everyday() {
    return everyday;
  }

  /** Writes what was committed through to the disk. */
  void sync() throws SQLException {
    owner.execute("checkpoint sync");
  }

  /**
   * Whether it still answers the owner; a database that could not write has closed itself. The
   * connection's own {@code isValid} says yes even then.
   */
  boolean isAlive() {
    try {
      return !owner.head().isEmpty();
    } catch (SQLException dead) {
      return false;
    }
  }

  /** The hash in the chain's head, when the file is worth compacting once it is closed. */
  Optional<String> headIfWasteful() throws SQLException {
    return owner.isWasteful() ? Optional.of(owner.head()) : Optional.empty();
  }

  /** Closes it for everyone; what was acknowledged is on the disk already. */
  @Override
  public void close() throws SQLException {
    pool.dispose();
    try (owner) {
      owner.shutDown();
    }
  }

  /** Lets go of a database that has closed itself. */
  void abandon() throws SQLException {
    pool.dispose();
    owner.close();
  }

  private static void addEverydayUser(OwnersConnection owner, Passwords passwords)
      throws SQLException {
    owner.execute(
        "create user if not exists " + EVERYDAY + " password '" + passwords.everyday() + "'");
    owner.execute("grant everyday to " + EVERYDAY);
  }

  /** The failure that is on its way says more than one of closing, which is only logged. */
  private static void closeAfterFailure(OwnersConnection owner) {
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
