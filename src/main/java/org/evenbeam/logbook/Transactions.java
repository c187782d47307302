package org.evenbeam.logbook;

import java.util.function.Function;

/**
 * The store's transactions. Only {@link Desk} uses them, so that no use case goes round its
 * permission.
 */
public interface Transactions {
  /** Runs work that changes nothing, on one consistent view of the data. */
  <T> T read(Function<Transaction, T> work);

  /**
   * Runs work that changes something, all of it or nothing, and seals it last of all with one entry
   * of the audit trail that holds every row touched. When this returns, the change is on the disk.
   *
   * @throws StoreFailed when the store cannot do it; nothing of it is then kept
   */
  <T> T change(Change change, Function<Transaction, T> work);

  /**
   * Runs work outside the trail, for what is only being typed. When this returns, it is on the
   * disk.
   */
  <T> T scratch(Function<Transaction, T> work);
}
