package org.evenbeam.store.tables;

import static org.evenbeam.store.rows.TrailedTable.CREDENTIAL;
import static org.evenbeam.store.rows.TrailedTable.PERSON;

import java.nio.charset.StandardCharsets;
import java.time.Instant;
import java.util.List;
import java.util.Optional;
import org.evenbeam.logbook.Person;
import org.evenbeam.logbook.Transaction;
import org.evenbeam.logbook.people.NewPerson;
import org.evenbeam.logbook.people.PasswordHash;
import org.evenbeam.logbook.people.PersonRecords;
import org.evenbeam.store.rows.OpenTransaction;
import org.evenbeam.store.rows.Row;
import org.jdbi.v3.core.mapper.RowMapper;
import org.jdbi.v3.core.mapper.reflect.ConstructorMapper;

/** People and their password hashes. */
public final class PersonTable implements PersonRecords {
  private static final String SELECT = "select id, sign_in_name, name, role, active from person ";
  private static final RowMapper<Person> MAPPER = ConstructorMapper.of(Person.class);

  /** A table of any open store. */
  public PersonTable() {}

  @Override
  public long add(Transaction transaction, NewPerson person) {
    return OpenTransaction.rows(transaction)
        .addNumbered(
            Row.of(PERSON)
                .with("version", 1L)
                .with("sign_in_name", person.signInName())
                .with("name", person.name())
                .with("role", person.role())
                .with("active", true));
  }

  @Override
  public Optional<Person> find(Transaction transaction, String signInName) {
    return OpenTransaction.reading(transaction)
        .createQuery(SELECT + "where sign_in_name = :name")
        .bind("name", signInName)
        .map(MAPPER)
        .findOne();
  }

  @Override
  public Optional<Person> find(Transaction transaction, long id) {
    return OpenTransaction.reading(transaction)
        .createQuery(SELECT + "where id = :id")
        .bind("id", id)
        .map(MAPPER)
        .findOne();
  }

  @Override
  public List<Person> all(Transaction transaction) {
    return OpenTransaction.reading(transaction)
        .createQuery(SELECT + "order by name, id")
        .map(MAPPER)
        .list();
  }

  @Override
  public void setPassword(Transaction transaction, long personId, PasswordHash hash, Instant at) {
    OpenTransaction.rows(transaction)
        .addNumbered(
            Row.of(CREDENTIAL)
                .with("person_id", personId)
                .with("encoded", hash.encoded().getBytes(StandardCharsets.UTF_8))
                .with("at", at));
  }

  @Override
  public Optional<PasswordHash> password(Transaction transaction, long personId) {
    return OpenTransaction.reading(transaction)
        .createQuery(
            "select encoded from credential where person_id = :person"
                + " order by id desc fetch first row only")
        .bind("person", personId)
        .map((row, context) -> new String(row.getBytes("encoded"), StandardCharsets.UTF_8))
        .findOne()
        .map(PasswordHash::new);
  }
}
