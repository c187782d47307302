package org.evenbeam.store;

import java.io.IOException;
import java.sql.SQLException;
import java.util.Optional;
import org.evenbeam.logbook.StoreFailed;
import org.evenbeam.store.rows.Failures;
import org.slf4j.Logger;
import org.slf4j.LoggerFactory;

/**
 * Holds the open database. A database that could not write, as on a full disk, closes itself; it is
 * opened again when it is next asked for, so that a person frees some space and goes on.
 */
final class DatabaseHolder {
  private static final Logger LOG = LoggerFactory.getLogger(DatabaseHolder.class);

  private final Reopening again;
  private final Failures failures;
  private Database database;
  private boolean doubtful;
  private boolean closed;

  /**
   * Holds a database.
   *
   * @param database open
   * @param again opens the same again
   */
  DatabaseHolder(Database database, Reopening again, Failures failures) {
    this.database = database;
    this.again = again;
    this.failures = failures;
  }

  /**
   * The database.
   *
   * @throws IllegalStateException when the logbook is closed
   * @throws org.evenbeam.logbook.StoreFailed when it has closed itself and cannot be opened again
   */
  synchronized Database database() {
    if (closed) {
      throw new IllegalStateException("the logbook is closed");
    }
    if (doubtful && !database.isAlive()) {
      abandon();
      database = again.open();
    }
    doubtful = false;
    return database;
  }

  /** Says that something failed, so that the database is asked whether it still answers. */
  synchronized void doubt() {
    doubtful = true;
  }

  /**
   * Whether the file of a database that cannot be opened ends with that entry all the same, on the
   * disk.
   *
   * @param failed what is told to the person otherwise, gets what stood in the way of looking
   */
  synchronized boolean isKept(String head, StoreFailed failed) {
    doubtful = true;
    abandon();
    try {
      return again.isKept(head);
    } catch (SQLException | IOException unseen) {
      failed.addSuppressed(unseen);
      return false;
    }
  }

  /** Writes what was committed through to the disk. */
  void sync() {
    try {
      database().sync();
    } catch (SQLException failed) {
      doubt();
      throw failures.of(failed);
    }
  }

  /**
   * Closes the database, once.
   *
   * @return the hash in the chain's head, when the file is then worth compacting
   */
  synchronized Optional<String> close() {
    if (closed) {
      return Optional.empty();
    }
    closed = true;
    try (Database closing = database) {
      return closing.headIfWasteful();
    } catch (SQLException failed) {
      throw failures.of(failed);
    }
  }

  private void abandon() {
    try {
      database.abandon();
      LOG.info("The database had closed itself and is opened again");
    } catch (SQLException dead) {
      LOG.info("The database had closed itself and is opened again: {}", dead.getMessage());
    }
  }
}
