package org.evenbeam.logbook;

import java.time.Instant;
import java.util.Optional;
import java.util.function.Function;

/** The one way from a use case into a transaction: it asks for the permission first. */
public final class Desk {
  private final Transactions transactions;

  /** Works on the given store. */
  public Desk(Transactions transactions) {
    this.transactions = transactions;
  }

  /**
   * Reads.
   *
   * @throws NotAllowed when the person's role does not include the use case
   */
  public <T> T read(Session session, UseCase useCase, Function<Transaction, T> work) {
    require(session, useCase);
    return transactions.read(work);
  }

  /**
   * Changes something, with one trail entry.
   *
   * @throws NotAllowed when the person's role does not include the use case
   */
  public <T> T change(Session session, UseCase useCase, Function<Transaction, T> work) {
    return change(session, useCase, Optional.empty(), work);
  }

  /**
   * Changes something for a stated reason, with one trail entry.
   *
   * @throws NotAllowed when the person's role does not include the use case
   */
  public <T> T change(
      Session session, UseCase useCase, Optional<String> reason, Function<Transaction, T> work) {
    require(session, useCase);
    Change change = new Change(session.now(), Optional.of(session.person().id()), useCase, reason);
    return transactions.change(change, work);
  }

  /**
   * Keeps what is only being typed, outside the trail.
   *
   * @throws NotAllowed when the person's role does not include the use case
   */
  public <T> T scratch(Session session, UseCase useCase, Function<Transaction, T> work) {
    require(session, useCase);
    return transactions.scratch(work);
  }

  /** Reads what the program needs for work of its own, which nobody has to ask for. */
  public <T> T readByItself(Function<Transaction, T> work) {
    return transactions.read(work);
  }

  /** Changes something by the program itself, with one trail entry that names no person. */
  public <T> T changeByItself(Instant at, UseCase useCase, Function<Transaction, T> work) {
    return transactions.change(new Change(at, Optional.empty(), useCase, Optional.empty()), work);
  }

  private static void require(Session session, UseCase useCase) {
    Person person = session.person();
    if (!person.active() || !useCase.allows(person.role())) {
      throw new NotAllowed(person, useCase);
    }
  }
}
