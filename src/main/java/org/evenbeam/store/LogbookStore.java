package org.evenbeam.store;

import java.io.Closeable;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.sql.SQLException;
import java.util.UUID;
import java.util.function.BooleanSupplier;
import java.util.function.Consumer;
import org.evenbeam.logbook.Transactions;
import org.evenbeam.logbook.certificates.CertificateRecords;
import org.evenbeam.logbook.history.TrailRecords;
import org.evenbeam.logbook.instruments.InstrumentRecords;
import org.evenbeam.logbook.laboratory.LaboratoryRecords;
import org.evenbeam.logbook.people.PersonRecords;
import org.evenbeam.logbook.plans.PlanRecords;
import org.evenbeam.logbook.run.RunRecords;
import org.evenbeam.logbook.standards.StandardRecords;
import org.evenbeam.store.rows.Failures;
import org.evenbeam.store.tables.CertificateTable;
import org.evenbeam.store.tables.InstrumentTable;
import org.evenbeam.store.tables.LaboratoryTable;
import org.evenbeam.store.tables.PersonTable;
import org.evenbeam.store.tables.PlanTable;
import org.evenbeam.store.tables.RunTable;
import org.evenbeam.store.tables.StandardTable;
import org.evenbeam.store.tables.TrailTable;
import org.h2.mvstore.MVStoreException;
import org.slf4j.Logger;
import org.slf4j.LoggerFactory;

/** A laboratory's logbook, open: its transactions and its records. */
public final class LogbookStore implements AutoCloseable {
  /**
   * H2's file system that opens the file again when a thread's interrupt has closed it: a cancelled
   * background task must not close the logbook.
   */
  private static final String THROUGH_INTERRUPTS = "retry:";

  private static final Logger LOG = LoggerFactory.getLogger(LogbookStore.class);

  private final StoreTransactions transactions;
  private final Closeable lock;
  private final Consumer<String> compaction;
  private final Failures failures;

  private LogbookStore(
      StoreTransactions transactions,
      Closeable lock,
      Consumer<String> compaction,
      Failures failures) {
    this.transactions = transactions;
    this.lock = lock;
    this.compaction = compaction;
    this.failures = failures;
  }

  /**
   * Opens the logbook in a laboratory's folder, or makes it when there is none. One program at a
   * time can have it open.
   *
   * @param laboratoryFolder an existing folder
   * @param onScreenThread whether the calling thread is the screen's, which the store refuses
   * @throws org.evenbeam.logbook.StoreFailed IN_USE, READ_ONLY, DISK_FULL, NEWER_SCHEMA, DAMAGED or
   *     OTHER, naming the file or folder
   */
  public static LogbookStore open(Path laboratoryFolder, BooleanSupplier onScreenThread) {
    return open(laboratoryFolder, onScreenThread, THROUGH_INTERRUPTS);
  }

  static LogbookStore open(Path laboratoryFolder, BooleanSupplier onScreen, String fileSystem) {
    LogbookFolder folder = LogbookFolder.at(laboratoryFolder);
    folder.requireUsable();
    FolderLock lock = FolderLock.take(folder);
    boolean opened = false;
    try {
      LogbookStore store = open(folder, lock, onScreen, fileSystem);
      opened = true;
      return store;
    } finally {
      if (!opened) {
        giveUp(lock);
      }
    }
  }

  private static LogbookStore open(
      LogbookFolder folder, FolderLock lock, BooleanSupplier onScreen, String fileSystem) {
    if (!Files.exists(folder.database())) {
      create(folder, fileSystem);
    }
    Failures failures = new Failures(folder.database());
    Passwords passwords = Passwords.read(folder.passwords());
    String url = url(fileSystem, folder.database());
    Reopening again = new Reopening(url, folder.database(), passwords, failures);
    DatabaseHolder holder = new DatabaseHolder(again.open(), again, failures);
    return new LogbookStore(
        new StoreTransactions(holder, onScreen, failures),
        lock,
        head -> Compaction.run(folder, passwords, head),
        failures);
  }

  /** A logbook in memory, of its own, gone when it is closed; for tests. */
  public static LogbookStore openInMemory(BooleanSupplier onScreenThread) {
    Path nowhere = Path.of("memory");
    Failures failures = new Failures(nowhere);
    String url = "jdbc:h2:mem:" + UUID.randomUUID();
    Passwords passwords = Passwords.random(nowhere);
    DatabaseHolder holder =
        new DatabaseHolder(
            Database.create(url, passwords, failures),
            new Reopening(url, nowhere, passwords, failures),
            failures);
    return new LogbookStore(
        new StoreTransactions(holder, onScreenThread, failures), () -> {}, head -> {}, failures);
  }

  /** Its transactions. */
  public Transactions transactions() {
    return transactions;
  }

  /**
   * Runs work with many changes, such as an import. Each is whole or not at all as ever, but they
   * are on the disk together, when this returns. Other threads' changes wait.
   *
   * @throws org.evenbeam.logbook.StoreFailed when the store cannot do it
   */
  public void inBulk(Runnable work) {
    transactions.inBulk(work);
  }

  /** The laboratory's own facts. */
  public LaboratoryRecords laboratory() {
    return new LaboratoryTable();
  }

  /** People. */
  public PersonRecords people() {
    return new PersonTable();
  }

  /** Instruments. */
  public InstrumentRecords instruments() {
    return new InstrumentTable();
  }

  /** Reference standards. */
  public StandardRecords standards() {
    return new StandardTable();
  }

  /** Verification plans. */
  public PlanRecords plans() {
    return new PlanTable();
  }

  /** Runs. */
  public RunRecords runs() {
    return new RunTable();
  }

  /** Certificates. */
  public CertificateRecords certificates() {
    return new CertificateTable();
  }

  /** The audit trail. */
  public TrailRecords trail() {
    return new TrailTable();
  }

  /**
   * Closes the logbook, after the change at work, if any. It takes a second or so where the file is
   * mostly waste and is compacted.
   */
  @Override
  public void close() {
    try (lock) {
      transactions.close().ifPresent(compaction);
    } catch (IOException failed) {
      throw failures.of(failed);
    }
  }

  /** The failure that is on its way says more than one of closing, which is only logged. */
  private static void giveUp(FolderLock lock) {
    try {
      lock.close();
    } catch (IOException unclosed) {
      LOG.warn("The folder's lock could not be closed after a failed opening", unclosed);
    }
  }

  /**
   * Makes the database under another name, so that a half-made one is never taken for one, and
   * without the states that it went through, so that a cut file does not fall back to one of them.
   */
  private static void create(LogbookFolder folder, String fileSystem) {
    Failures failures = new Failures(folder.database());
    try {
      if (!Files.exists(folder.passwords())) {
        Passwords.random(folder.passwords()).write();
      }
      Files.deleteIfExists(folder.newDatabase());
      Passwords passwords = Passwords.read(folder.passwords());
      Database.create(url(fileSystem, folder.newDatabase()), passwords, failures).close();
      Compaction.rewrite(folder.newDatabase());
      Files.move(folder.newDatabase(), folder.database(), StandardCopyOption.ATOMIC_MOVE);
    } catch (IOException | SQLException | MVStoreException failed) {
      throw failures.of(failed);
    }
  }

  private static String url(String fileSystem, Path database) {
    return "jdbc:h2:" + fileSystem + LogbookFolder.withoutEnding(database);
  }
}
