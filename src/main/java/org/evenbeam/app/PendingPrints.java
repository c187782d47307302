package org.evenbeam.app;

import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.TimeUnit;
import org.evenbeam.logbook.certificates.Certificates;
import org.slf4j.Logger;
import org.slf4j.LoggerFactory;

/**
 * Prints, beside the window, the certificates that were recorded and not printed: after a crash, or
 * in a laboratory that was just imported. What is still to be printed when the window closes is
 * printed at the next start, or when somebody opens it.
 */
final class PendingPrints implements AutoCloseable {
  private static final Logger LOG = LoggerFactory.getLogger(PendingPrints.class);
  private static final long LONGEST_PRINT_SECONDS = 60;

  private final ExecutorService printer =
      Executors.newSingleThreadExecutor(work -> new Thread(work, "certificates"));
  private final Certificates certificates;
  private volatile boolean closing;

  /** For the certificates of that logbook. */
  PendingPrints(Certificates certificates) {
    this.certificates = certificates;
  }

  /** Begins. */
  void begin() {
    printer.execute(this::printAll);
  }

  private void printAll() {
    while (!closing && certificates.printNext().isPresent()) {
      LOG.debug("printed");
    }
  }

  /** Finishes the certificate in hand. */
  @Override
  public void close() {
    closing = true;
    printer.shutdown();
    try {
      if (!printer.awaitTermination(LONGEST_PRINT_SECONDS, TimeUnit.SECONDS)) {
        LOG.warn("A certificate is still being printed");
      }
    } catch (InterruptedException stopped) {
      Thread.currentThread().interrupt();
    }
  }
}
