package org.evenbeam.logbook;

/** A tag, name or number that must be unique is taken. */
public final class AlreadyThere extends LogbookException {
  private static final long serialVersionUID = 1L;

  /** Names what is taken. */
  public AlreadyThere(NotFound.Thing thing, String name) {
    super("already-there", thing, name);
  }
}
