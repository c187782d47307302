package org.evenbeam.logbook.instruments;

import java.util.List;
import java.util.Optional;
import org.evenbeam.logbook.Transaction;

/** Where instruments and their events are kept. */
public interface InstrumentRecords {
  /** Adds an instrument. */
  void add(Transaction transaction, Instrument instrument);

  /** The instrument of that tag. */
  Optional<Instrument> find(Transaction transaction, String tag);

  /** All instruments with their present status, by tag. */
  List<InstrumentOverview> all(Transaction transaction);

  /** Adds an event and returns its key. */
  long addEvent(Transaction transaction, String tag, InstrumentEvent event);

  /** The instrument's events, oldest first. */
  List<InstrumentEvent> events(Transaction transaction, String tag);
}
