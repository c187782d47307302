package org.evenbeam.logbook.laboratory;

import java.time.Instant;
import java.util.Optional;
import org.evenbeam.logbook.AlreadyThere;
import org.evenbeam.logbook.Change;
import org.evenbeam.logbook.Desk;
import org.evenbeam.logbook.NotFound;
import org.evenbeam.logbook.Person;
import org.evenbeam.logbook.Role;
import org.evenbeam.logbook.Session;
import org.evenbeam.logbook.Transactions;
import org.evenbeam.logbook.UseCase;
import org.evenbeam.logbook.people.NewPerson;
import org.evenbeam.logbook.people.PasswordHash;
import org.evenbeam.logbook.people.People;
import org.evenbeam.logbook.people.PersonRecords;

/**
 * The laboratory's own facts, and the first set-up, before which there is nobody who could sign in.
 */
public final class LaboratorySetUp {
  private final Transactions transactions;
  private final Desk desk;
  private final LaboratoryRecords laboratories;
  private final PersonRecords persons;
  private final People people;

  /** Works on the given store. */
  public LaboratorySetUp(
      Transactions transactions,
      Desk desk,
      LaboratoryRecords laboratories,
      PersonRecords persons,
      People people) {
    this.transactions = transactions;
    this.desk = desk;
    this.laboratories = laboratories;
    this.persons = persons;
    this.people = people;
  }

  /** The laboratory, once it is set up; read before anyone signs in, to know its zone. */
  public Optional<Laboratory> find() {
    return transactions.read(laboratories::find);
  }

  /**
   * The laboratory's own facts.
   *
   * @throws NotFound before it is set up
   */
  public Laboratory read(Session session) {
    return desk.read(session, UseCase.READ_LABORATORY, laboratories::find)
        .orElseThrow(() -> new NotFound(NotFound.Thing.LABORATORY, ""));
  }

  /**
   * Sets the laboratory up with its first manager.
   *
   * @throws AlreadyThere when it is set up already
   */
  public Person setUp(
      Laboratory laboratory, String signInName, String name, char[] password, Instant at) {
    PasswordHash hash = people.hashOfNew(password);
    Change change = new Change(at, Optional.empty(), UseCase.SET_UP_LABORATORY, Optional.empty());
    return transactions.change(
        change,
        transaction -> {
          if (laboratories.find(transaction).isPresent()) {
            throw new AlreadyThere(NotFound.Thing.LABORATORY, laboratory.name());
          }
          laboratories.add(transaction, laboratory);
          NewPerson manager = new NewPerson(signInName, name, Role.MANAGER);
          long id = persons.add(transaction, manager);
          persons.setPassword(transaction, id, hash, at);
          return new Person(id, signInName, name, Role.MANAGER, true);
        });
  }
}
