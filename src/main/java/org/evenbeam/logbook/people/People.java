package org.evenbeam.logbook.people;

import java.time.Clock;
import java.time.ZoneId;
import java.util.List;
import java.util.Optional;
import org.evenbeam.logbook.AlreadyThere;
import org.evenbeam.logbook.Desk;
import org.evenbeam.logbook.NotFound;
import org.evenbeam.logbook.Person;
import org.evenbeam.logbook.Session;
import org.evenbeam.logbook.Transactions;
import org.evenbeam.logbook.UseCase;

/** Signing in, and the people of the laboratory. */
public final class People {
  /** The shortest password that is accepted, in characters (NIST SP 800-63B, 5.1.1.1). */
  public static final int SHORTEST_PASSWORD = 8;

  private final Transactions transactions;
  private final Desk desk;
  private final PersonRecords people;
  private final Passwords passwords;

  /** Works on the given store. */
  public People(Transactions transactions, Desk desk, PersonRecords people, Passwords passwords) {
    this.transactions = transactions;
    this.desk = desk;
    this.people = people;
    this.passwords = passwords;
  }

  /**
   * Signs a person in.
   *
   * @throws SignInRefused when name and password do not go together, or the person has left
   */
  public Session signIn(String signInName, char[] password, ZoneId zone, Clock clock) {
    record Known(Person person, PasswordHash hash) {}
    Optional<Known> known =
        transactions.read(
            transaction ->
                people
                    .find(transaction, signInName.strip())
                    .filter(Person::active)
                    .flatMap(
                        person ->
                            people
                                .password(transaction, person.id())
                                .map(hash -> new Known(person, hash))));
    return known
        .filter(k -> passwords.matches(password, k.hash()))
        .map(k -> new Session(k.person(), zone, clock))
        .orElseThrow(SignInRefused::new);
  }

  /**
   * Adds a person with a first password.
   *
   * @throws AlreadyThere when the sign-in name is taken
   * @throws PasswordTooShort when the password is
   */
  public Person add(Session session, NewPerson person, char[] password) {
    PasswordHash hash = hashOfNew(password);
    return desk.change(
        session,
        UseCase.ADD_PERSON,
        transaction -> {
          if (people.find(transaction, person.signInName()).isPresent()) {
            throw new AlreadyThere(NotFound.Thing.PERSON, person.signInName());
          }
          long id = people.add(transaction, person);
          people.setPassword(transaction, id, hash, session.now());
          return new Person(id, person.signInName(), person.name(), person.role(), true);
        });
  }

  /** Everyone, by name. */
  public List<Person> all(Session session) {
    return desk.read(session, UseCase.READ_PEOPLE, people::all);
  }

  /**
   * Checks the password that goes with a signature.
   *
   * @throws PasswordWrong when it is not the signer's
   */
  public void confirm(Session session, char[] password) {
    boolean right =
        transactions
            .read(transaction -> people.password(transaction, session.person().id()))
            .filter(hash -> passwords.matches(password, hash))
            .isPresent();
    if (!right) {
      throw new PasswordWrong();
    }
  }

  /**
   * The hash of a password that someone chose.
   *
   * @throws PasswordTooShort when it is
   */
  public PasswordHash hashOfNew(char[] password) {
    if (password.length < SHORTEST_PASSWORD) {
      throw new PasswordTooShort(SHORTEST_PASSWORD);
    }
    return passwords.hash(password);
  }
}
