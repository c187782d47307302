package org.evenbeam.app;

import javafx.application.Platform;

/** Starts the screen toolkit. */
final class Toolkit {
  private Toolkit() {}

  /**
   * Starts it and runs the work on its thread.
   *
   * @throws NoDisplay when it cannot start: the display does not answer, or a library of the system
   *     is missing
   */
  static void start(Runnable work) {
    Platform.setImplicitExit(false);
    try {
      Platform.startup(work);
    } catch (UnsupportedOperationException | LinkageError unusable) {
      throw new NoDisplay(unusable);
    }
  }
}
