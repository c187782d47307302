package org.evenbeam.ui.common;

import java.lang.System.Logger.Level;
import java.util.concurrent.CompletableFuture;
import java.util.concurrent.CompletionException;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.TimeUnit;
import java.util.function.Consumer;
import java.util.function.Supplier;
import javafx.application.Platform;
import org.evenbeam.logbook.LogbookException;

/**
 * One thread for the logbook's work, so that it keeps its order, and one for computing; results
 * arrive on the screen's.
 */
public final class ScreenBackground implements Background, AutoCloseable {
  private static final System.Logger LOGGER = System.getLogger(ScreenBackground.class.getName());

  private static final long LONGEST_WORK_SECONDS = 60;

  private final ExecutorService worker =
      Executors.newSingleThreadExecutor(work -> thread(work, "logbook work", false));

  private final ExecutorService computer =
      Executors.newSingleThreadExecutor(work -> thread(work, "computing", true));

  private static Thread thread(Runnable work, String name, boolean daemon) {
    Thread thread = new Thread(work, name);
    thread.setDaemon(daemon);
    return thread;
  }

  @Override
  public <T> void run(Supplier<T> work, Consumer<T> done, Consumer<Throwable> failed) {
    run(worker, work, done, failed);
  }

  @Override
  public <T> void compute(Supplier<T> work, Consumer<T> done, Consumer<Throwable> failed) {
    run(computer, work, done, failed);
  }

  private static <T> void run(
      ExecutorService where, Supplier<T> work, Consumer<T> done, Consumer<Throwable> failed) {
    CompletableFuture<T> running = CompletableFuture.supplyAsync(work, where);
    var unused =
        running.whenComplete(
            (result, thrown) -> Platform.runLater(() -> deliver(result, thrown, done, failed)));
  }

  private static <T> void deliver(
      T result, Throwable thrown, Consumer<T> done, Consumer<Throwable> failed) {
    if (thrown == null) {
      done.accept(result);
    } else {
      failed.accept(logged(cause(thrown)));
    }
  }

  private static Throwable cause(Throwable thrown) {
    return thrown instanceof CompletionException && thrown.getCause() != null
        ? thrown.getCause()
        : thrown;
  }

  private static Throwable logged(Throwable thrown) {
    boolean refusal = thrown instanceof LogbookException && thrown.getCause() == null;
    LOGGER.log(refusal ? Level.DEBUG : Level.ERROR, "Work for the screen failed", thrown);
    return thrown;
  }

  /** Takes no more work and returns when the work in hand is finished. */
  @Override
  public void close() {
    computer.shutdownNow();
    worker.shutdown();
    try {
      boolean finished = worker.awaitTermination(LONGEST_WORK_SECONDS, TimeUnit.SECONDS);
      LOGGER.log(
          finished ? Level.DEBUG : Level.WARNING, "Work for the screen ended: {0}", finished);
    } catch (InterruptedException stopped) {
      Thread.currentThread().interrupt();
    }
  }
}
