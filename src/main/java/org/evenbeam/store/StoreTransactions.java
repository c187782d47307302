package org.evenbeam.store;

import java.util.Optional;
import java.util.concurrent.locks.ReentrantLock;
import java.util.function.BooleanSupplier;
import java.util.function.Function;
import java.util.function.Supplier;
import org.evenbeam.logbook.Change;
import org.evenbeam.logbook.StoreFailed;
import org.evenbeam.logbook.Transaction;
import org.evenbeam.logbook.Transactions;
import org.evenbeam.store.rows.Failures;
import org.evenbeam.store.rows.OpenTransaction;
import org.evenbeam.store.rows.OpenTransaction.Purpose;
import org.evenbeam.store.rows.TrailHead;
import org.evenbeam.trail.SealedEntry;
import org.jdbi.v3.core.Handle;
import org.jdbi.v3.core.JdbiException;
import org.jdbi.v3.core.transaction.TransactionIsolationLevel;

/**
 * Transactions on one database. Changes follow one another; reads go beside them, each on one view
 * of the data.
 */
final class StoreTransactions implements Transactions {
  private final DatabaseHolder holder;
  private final BooleanSupplier onScreenThread;
  private final Failures failures;
  private final ReentrantLock writing = new ReentrantLock(true);
  private boolean inTransaction;
  private boolean inBulk;

  StoreTransactions(DatabaseHolder holder, BooleanSupplier onScreenThread, Failures failures) {
    this.holder = holder;
    this.onScreenThread = onScreenThread;
    this.failures = failures;
  }

  @Override
  public <T> T read(Function<Transaction, T> work) {
    requireOffScreen();
    return transact(Purpose.READ, TransactionIsolationLevel.SERIALIZABLE, work::apply);
  }

  @Override
  public <T> T scratch(Function<Transaction, T> work) {
    return exclusively(
        () -> {
          T result = write(Purpose.SCRATCH, work::apply);
          sync();
          return result;
        });
  }

  @Override
  public <T> T change(Change change, Function<Transaction, T> work) {
    return exclusively(() -> new Attempt<T>().make(change, work));
  }

  /** Runs work whose changes are written through to the disk together, at its end. */
  void inBulk(Runnable work) {
    requireOffScreen();
    writing.lock();
    try {
      inBulk = true;
      work.run();
    } finally {
      inBulk = false;
      try {
        sync();
      } finally {
        writing.unlock();
      }
    }
  }

  /** Closes the database, after the change at work, if any; see {@link DatabaseHolder#close}. */
  Optional<String> close() {
    writing.lock();
    try {
      return holder.close();
    } finally {
      writing.unlock();
    }
  }

  private <T> T exclusively(Supplier<T> work) {
    requireOffScreen();
    writing.lock();
    try {
      if (inTransaction) {
        throw new IllegalStateException("a change was begun inside another");
      }
      inTransaction = true;
      try {
        return work.get();
      } finally {
        inTransaction = false;
      }
    } finally {
      writing.unlock();
    }
  }

  private <T> T write(Purpose purpose, Function<OpenTransaction, T> work) {
    return transact(purpose, TransactionIsolationLevel.READ_COMMITTED, work);
  }

  private <T> T transact(
      Purpose purpose, TransactionIsolationLevel level, Function<OpenTransaction, T> work) {
    try (Handle handle = holder.database().everyday().open()) {
      return handle.inTransaction(
          level,
          same -> {
            OpenTransaction transaction = new OpenTransaction(same, purpose, failures);
            try {
              return work.apply(transaction);
            } finally {
              transaction.end();
            }
          });
    } catch (JdbiException failed) {
      holder.doubt();
      throw failures.of(failed);
    } catch (StoreFailed failed) {
      holder.doubt();
      throw failed;
    }
  }

  private void sync() {
    if (!inBulk) {
      holder.sync();
    }
  }

  private void requireOffScreen() {
    if (onScreenThread.getAsBoolean()) {
      throw new IllegalStateException("the store was called on the screen's thread");
    }
  }

  /** One change, made and written through to the disk. */
  private final class Attempt<T> {
    private T result;
    private SealedEntry sealed;

    T make(Change change, Function<Transaction, T> work) {
      try {
        write(
            Purpose.CHANGE,
            transaction -> {
              result = work.apply(transaction);
              sealed = transaction.seal(change);
              return sealed;
            });
        sync();
      } catch (StoreFailed failed) {
        requireKept(failed);
      }
      return result;
    }

    /**
     * A failure while committing leaves open whether the change is kept: the chain's head tells. A
     * change that is kept is acknowledged, so that nobody makes it twice.
     */
    private void requireKept(StoreFailed failed) {
      if (sealed == null || !isKept(failed)) {
        throw failed;
      }
    }

    private boolean isKept(StoreFailed failed) {
      try {
        TrailHead head =
            transact(
                Purpose.READ,
                TransactionIsolationLevel.READ_COMMITTED,
                transaction -> TrailHead.read(OpenTransaction.reading(transaction)));
        boolean kept = head.hash().equals(sealed.hash());
        if (kept) {
          sync();
        }
        return kept;
      } catch (StoreFailed again) {
        failed.addSuppressed(again);
        return holder.isKept(sealed.hash(), failed);
      }
    }
  }
}
