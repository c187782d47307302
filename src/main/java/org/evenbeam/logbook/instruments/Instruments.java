package org.evenbeam.logbook.instruments;

import java.util.List;
import java.util.Optional;
import org.evenbeam.logbook.AlreadyThere;
import org.evenbeam.logbook.Desk;
import org.evenbeam.logbook.NotFound;
import org.evenbeam.logbook.Session;
import org.evenbeam.logbook.Transaction;
import org.evenbeam.logbook.UseCase;

/** The laboratory's instruments and what happens to them. */
public final class Instruments {
  private final Desk desk;
  private final InstrumentRecords instruments;

  /** Works on the given store. */
  public Instruments(Desk desk, InstrumentRecords instruments) {
    this.desk = desk;
    this.instruments = instruments;
  }

  /**
   * Adds an instrument, in service from now on.
   *
   * @throws AlreadyThere when the tag is taken
   */
  public void add(Session session, Instrument instrument) {
    desk.change(
        session,
        UseCase.ADD_INSTRUMENT,
        transaction -> {
          if (instruments.find(transaction, instrument.tag()).isPresent()) {
            throw new AlreadyThere(NotFound.Thing.INSTRUMENT, instrument.tag());
          }
          instruments.add(transaction, instrument);
          return addEvent(
              transaction,
              session,
              instrument.tag(),
              InstrumentEvent.Kind.ADDED,
              "",
              Optional.of(InstrumentStatus.IN_SERVICE));
        });
  }

  /** All instruments with their present status, by tag. */
  public List<InstrumentOverview> all(Session session) {
    return desk.read(session, UseCase.READ_INSTRUMENTS, instruments::all);
  }

  /** An instrument's events, oldest first. */
  public List<InstrumentEvent> events(Session session, String tag) {
    return desk.read(
        session,
        UseCase.READ_INSTRUMENTS,
        transaction -> instruments.events(transaction, known(transaction, tag).tag()));
  }

  /**
   * Records something that happened and that leaves the status as it is; returns the event's key.
   *
   * @throws NotFound when there is no such instrument
   */
  public long record(Session session, String tag, InstrumentEvent.Kind kind, String text) {
    return change(session, UseCase.RECORD_INSTRUMENT_EVENT, tag, kind, text, Optional.empty());
  }

  /**
   * Takes an instrument out of service; anyone at the bench may.
   *
   * @throws NotFound when there is no such instrument
   */
  public void stop(Session session, String tag, String why) {
    change(
        session,
        UseCase.STOP_INSTRUMENT,
        tag,
        InstrumentEvent.Kind.STOPPED,
        why,
        Optional.of(InstrumentStatus.OUT_OF_SERVICE));
  }

  /**
   * Puts an instrument back into service; only a manager may.
   *
   * @param restriction what it may be used for; empty for no restriction
   * @throws NotFound when there is no such instrument
   */
  public void release(Session session, String tag, String why, Optional<String> restriction) {
    InstrumentStatus status =
        restriction.isPresent()
            ? InstrumentStatus.IN_SERVICE_WITH_RESTRICTION
            : InstrumentStatus.IN_SERVICE;
    change(
        session,
        UseCase.RELEASE_INSTRUMENT,
        tag,
        InstrumentEvent.Kind.RELEASED,
        restriction.orElse(why),
        Optional.of(status));
  }

  private long change(
      Session session,
      UseCase useCase,
      String tag,
      InstrumentEvent.Kind kind,
      String text,
      Optional<InstrumentStatus> status) {
    return desk.change(
        session,
        useCase,
        Optional.of(text),
        transaction ->
            addEvent(transaction, session, known(transaction, tag).tag(), kind, text, status));
  }

  private long addEvent(
      Transaction transaction,
      Session session,
      String tag,
      InstrumentEvent.Kind kind,
      String text,
      Optional<InstrumentStatus> status) {
    return instruments.addEvent(
        transaction,
        tag,
        new InstrumentEvent(0, kind, session.now(), session.person().id(), text, status));
  }

  private Instrument known(Transaction transaction, String tag) {
    return instruments
        .find(transaction, tag)
        .orElseThrow(() -> new NotFound(NotFound.Thing.INSTRUMENT, tag));
  }
}
