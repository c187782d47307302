package org.evenbeam.ui.runsheet;

import java.util.LinkedHashMap;
import java.util.Map;
import java.util.function.Consumer;
import org.evenbeam.ui.common.Background;

/**
 * Keeps what is being typed: one save in flight, and of those that wait the newest of each check
 * point.
 */
final class ScratchKeeper {
  /** Saves a text. */
  @FunctionalInterface
  interface Save {
    void save(String checkPoint, String text);
  }

  private final Background background;
  private final Save save;
  private final Consumer<Throwable> failed;
  private final Map<String, String> waiting = new LinkedHashMap<>();
  private boolean inFlight;

  ScratchKeeper(Background background, Save save, Consumer<Throwable> failed) {
    this.background = background;
    this.save = save;
    this.failed = failed;
  }

  /** Keeps that text in place of what was typed there before. */
  void keep(String checkPoint, String text) {
    waiting.put(checkPoint, text);
    if (!inFlight) {
      next();
    }
  }

  /** Forgets what waits there, because it has become a reading. */
  void forget(String checkPoint) {
    waiting.remove(checkPoint);
  }

  private void next() {
    inFlight = false;
    waiting.keySet().stream().findFirst().ifPresent(this::send);
  }

  private void send(String checkPoint) {
    String text = waiting.remove(checkPoint);
    inFlight = true;
    background.run(
        () -> {
          save.save(checkPoint, text);
          return text;
        },
        kept -> next(),
        thrown -> {
          failed.accept(thrown);
          next();
        });
  }
}
