package org.evenbeam.store.tables;

import static org.evenbeam.store.rows.TrailedTable.INSTRUMENT;
import static org.evenbeam.store.rows.TrailedTable.INSTRUMENT_EVENT;

import java.util.List;
import java.util.Optional;
import org.evenbeam.logbook.NotFound;
import org.evenbeam.logbook.Transaction;
import org.evenbeam.logbook.instruments.Instrument;
import org.evenbeam.logbook.instruments.InstrumentEvent;
import org.evenbeam.logbook.instruments.InstrumentOverview;
import org.evenbeam.logbook.instruments.InstrumentRecords;
import org.evenbeam.store.rows.OpenTransaction;
import org.evenbeam.store.rows.Row;
import org.jdbi.v3.core.mapper.reflect.ConstructorMapper;

/** Instruments and their events. */
public final class InstrumentTable implements InstrumentRecords {
  /** The columns of an instrument {@code i}, as its record takes them. */
  static final String COLUMNS =
      "i.tag, i.kind, i.maker, i.model, i.serial_number, i.location, i.measurand, i.unit,"
          + " i.range_low, i.range_high, i.resolution, i.firmware";

  /** A table of any open store. */
  public InstrumentTable() {}

  /**
   * The key of the instrument of that tag.
   *
   * @throws NotFound when there is none
   */
  static long id(Transaction transaction, String tag) {
    return OpenTransaction.reading(transaction)
        .createQuery("select id from instrument where tag = :tag")
        .bind("tag", tag)
        .mapTo(Long.class)
        .findOne()
        .orElseThrow(() -> new NotFound(NotFound.Thing.INSTRUMENT, tag));
  }

  @Override
  public void add(Transaction transaction, Instrument instrument) {
    OpenTransaction.rows(transaction)
        .addNumbered(
            Row.of(INSTRUMENT)
                .with("version", 1L)
                .with("tag", instrument.tag())
                .with("kind", instrument.kind())
                .with("maker", instrument.maker())
                .with("model", instrument.model())
                .with("serial_number", instrument.serialNumber())
                .with("location", instrument.location())
                .with("measurand", instrument.measurand())
                .with("unit", instrument.unit())
                .with("range_low", instrument.rangeLow())
                .with("range_high", instrument.rangeHigh())
                .with("resolution", instrument.resolution())
                .with("firmware", instrument.firmware()));
  }

  @Override
  public Optional<Instrument> find(Transaction transaction, String tag) {
    return OpenTransaction.reading(transaction)
        .createQuery("select " + COLUMNS + " from instrument i where i.tag = :tag")
        .bind("tag", tag)
        .map(ConstructorMapper.of(Instrument.class))
        .findOne();
  }

  @Override
  public List<InstrumentOverview> all(Transaction transaction) {
    return InstrumentOverviews.all(transaction);
  }

  @Override
  public long addEvent(Transaction transaction, String tag, InstrumentEvent event) {
    return OpenTransaction.rows(transaction)
        .addNumbered(
            Row.of(INSTRUMENT_EVENT)
                .with("instrument_id", id(transaction, tag))
                .with("kind", event.kind())
                .with("at", event.at())
                .with("person_id", event.personId())
                .with("text", event.text())
                .with("status", event.status()));
  }

  @Override
  public List<InstrumentEvent> events(Transaction transaction, String tag) {
    return OpenTransaction.reading(transaction)
        .createQuery(
            "select id, kind, at, person_id, text, status from instrument_event"
                + " where instrument_id = :instrument order by id")
        .bind("instrument", id(transaction, tag))
        .map(ConstructorMapper.of(InstrumentEvent.class))
        .list();
  }
}
