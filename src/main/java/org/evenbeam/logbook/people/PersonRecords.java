package org.evenbeam.logbook.people;

import java.time.Instant;
import java.util.List;
import java.util.Optional;
import org.evenbeam.logbook.Person;
import org.evenbeam.logbook.Transaction;

/** Where people and their password hashes are kept. */
public interface PersonRecords {
  /** Adds a person, active, and returns the key. */
  long add(Transaction transaction, NewPerson person);

  /** The person who signs in by that name. */
  Optional<Person> find(Transaction transaction, String signInName);

  /** The person of that key. */
  Optional<Person> find(Transaction transaction, long id);

  /** Everyone, by name. */
  List<Person> all(Transaction transaction);

  /** Sets a person's password hash; earlier ones stay as rows and no longer count. */
  void setPassword(Transaction transaction, long personId, PasswordHash hash, Instant at);

  /** The person's password hash in force. */
  Optional<PasswordHash> password(Transaction transaction, long personId);
}
