package org.evenbeam.logbook;

/** The person's role does not include the use case. */
public final class NotAllowed extends LogbookException {
  private static final long serialVersionUID = 1L;

  /** Names the person, the role and the use case. */
  public NotAllowed(Person person, UseCase useCase) {
    super("not-allowed", person.name(), person.role(), useCase);
  }
}
