package org.evenbeam.ui.common;

import java.io.UncheckedIOException;
import java.util.function.Consumer;
import java.util.function.Supplier;
import org.evenbeam.logbook.LogbookException;

/** Where work runs, and where its result arrives. Work that was asked for first is done first. */
public interface Background {
  /**
   * Runs work off the screen's thread; exactly one of the two is called on it afterwards.
   *
   * @param work what to do
   * @param done takes its result
   * @param failed takes what went wrong
   */
  <T> void run(Supplier<T> work, Consumer<T> done, Consumer<Throwable> failed);

  /**
   * Computes something that needs nothing of the logbook, beside its work and in no order, so that
   * no reading waits for it.
   *
   * @param work what to compute
   * @param done takes its result
   * @param failed takes what went wrong
   */
  default <T> void compute(Supplier<T> work, Consumer<T> done, Consumer<Throwable> failed) {
    run(work, done, failed);
  }

  /** Runs everything at once and where it was asked for, as tests like it. */
  static Background direct() {
    return new Background() {
      @Override
      public <T> void run(Supplier<T> work, Consumer<T> done, Consumer<Throwable> failed) {
        T result;
        try {
          result = work.get();
        } catch (LogbookException | UncheckedIOException refused) {
          failed.accept(refused);
          return;
        }
        done.accept(result);
      }
    };
  }
}
