package org.evenbeam.app;

import java.nio.file.Path;
import java.time.Clock;
import java.util.function.BooleanSupplier;
import org.evenbeam.logbook.certificates.CertificatePress;
import org.evenbeam.logbook.open.OpenLogbook;
import org.evenbeam.logbook.people.Passwords;
import org.evenbeam.store.LogbookStore;

/** A laboratory's folder, opened: its store and the use cases over it. */
final class OpenLaboratory implements AutoCloseable {
  private final LogbookStore store;
  private final OpenLogbook logbook;

  private OpenLaboratory(LogbookStore store, OpenLogbook logbook) {
    this.store = store;
    this.logbook = logbook;
  }

  /**
   * Opens the logbook in that folder.
   *
   * @throws org.evenbeam.logbook.StoreFailed when it cannot be opened
   */
  static OpenLaboratory in(Path folder, CertificatePress press, BooleanSupplier onScreenThread) {
    LogbookStore store = LogbookStore.open(folder, onScreenThread);
    return new OpenLaboratory(
        store, Wiring.over(store, press, Passwords.Cost.USUAL, Clock.systemUTC()));
  }

  /** Its use cases. */
  OpenLogbook logbook() {
    return logbook;
  }

  /** Runs work with many changes. */
  void inBulk(Runnable work) {
    store.inBulk(work);
  }

  @Override
  public void close() {
    store.close();
  }
}
