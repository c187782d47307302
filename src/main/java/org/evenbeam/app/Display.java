package org.evenbeam.app;

import java.util.Locale;

/**
 * Whether there is a display that a window can open on, asked before any class of the toolkit
 * loads.
 */
final class Display {
  private Display() {}

  /** On Linux the toolkit needs an X server and knows no other; elsewhere there is one. */
  static boolean isThere() {
    boolean linux = System.getProperty("os.name").toLowerCase(Locale.ROOT).contains("linux");
    String display = System.getenv("DISPLAY");
    return !linux || (display != null && !display.isBlank());
  }
}
