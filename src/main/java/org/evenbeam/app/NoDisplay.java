package org.evenbeam.app;

import org.evenbeam.logbook.LogbookException;

/** There is no display that a window can open on. */
final class NoDisplay extends LogbookException {
  private static final long serialVersionUID = 1L;

  NoDisplay() {
    super("no-display");
  }

  NoDisplay(Throwable cause) {
    super(cause, "display-unusable", String.valueOf(cause.getMessage()));
  }
}
