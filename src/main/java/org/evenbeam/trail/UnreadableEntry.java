package org.evenbeam.trail;

/** A text that is not an entry of the trail in a known form. */
public final class UnreadableEntry extends IllegalArgumentException {
  private static final long serialVersionUID = 1L;

  UnreadableEntry(String message, Throwable cause) {
    super(message, cause);
  }
}
