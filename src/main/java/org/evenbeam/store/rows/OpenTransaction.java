package org.evenbeam.store.rows;

import org.evenbeam.logbook.Change;
import org.evenbeam.logbook.Transaction;
import org.evenbeam.trail.CanonicalForm;
import org.evenbeam.trail.SealedEntry;
import org.evenbeam.trail.TrailEntry;
import org.jdbi.v3.core.Handle;

/** A transaction of this store while it is open. */
public final class OpenTransaction implements Transaction {
  private final Handle handle;
  private final Purpose purpose;
  private final RowWriter rows;
  private boolean open = true;

  /** What a transaction is for. */
  public enum Purpose {
    /** Reads only. */
    READ,
    /** Keeps what is being typed, outside the trail. */
    SCRATCH,
    /** Changes trailed tables, and may keep scratches too. */
    CHANGE
  }

  /** A transaction on that connection. */
  public OpenTransaction(Handle handle, Purpose purpose, Failures failures) {
    this.handle = handle;
    this.purpose = purpose;
    this.rows = new RowWriter(handle, failures);
  }

  /**
   * The connection, to read from.
   *
   * @throws IllegalArgumentException when the transaction is another store's
   * @throws IllegalStateException when it is over
   */
  public static Handle reading(Transaction transaction) {
    return own(transaction).handle;
  }

  /**
   * The connection, to keep scratches.
   *
   * @throws IllegalArgumentException when the transaction is another store's
   * @throws IllegalStateException when it is over or only reads
   */
  public static Handle scratching(Transaction transaction) {
    OpenTransaction own = own(transaction);
    if (own.purpose == Purpose.READ) {
      throw new IllegalStateException("a transaction that reads was asked to keep a scratch");
    }
    return own.handle;
  }

  /**
   * The writer of trailed rows.
   *
   * @throws IllegalArgumentException when the transaction is another store's
   * @throws IllegalStateException when it is over or does not change anything
   */
  public static RowWriter rows(Transaction transaction) {
    OpenTransaction own = own(transaction);
    if (own.purpose != Purpose.CHANGE) {
      throw new IllegalStateException(
          "a transaction for " + own.purpose + " was asked to change a trailed table");
    }
    return own.rows;
  }

  /** Seals what was done, last of all, with one entry at the chain's head. */
  public SealedEntry seal(Change change) {
    TrailHead head = TrailHead.lock(handle);
    TrailEntry entry =
        new TrailEntry(
            head.number() + 1,
            change.at(),
            change.person().map(String::valueOf),
            change.action().lastingName(),
            change.reason(),
            rows.changes(),
            head.hash());
    SealedEntry sealed = CanonicalForm.seal(entry);
    TrailHead.advance(handle, sealed);
    return sealed;
  }

  /** Ends it: what was given out of it is of no use any more. */
  public void end() {
    open = false;
  }

  private static OpenTransaction own(Transaction transaction) {
    if (!(transaction instanceof OpenTransaction own)) {
      throw new IllegalArgumentException(
          "transaction is a " + transaction.getClass() + ", allowed: one of this store");
    }
    if (!own.open) {
      throw new IllegalStateException("the transaction is over");
    }
    return own;
  }
}
