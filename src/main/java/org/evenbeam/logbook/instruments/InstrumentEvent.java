package org.evenbeam.logbook.instruments;

import java.time.Instant;
import java.util.Optional;

/**
 * Something that happened to an instrument.
 *
 * @param id the key in the logbook, 0 before it is kept
 * @param kind what happened
 * @param at when
 * @param personId who recorded it
 * @param text in the person's words: what was done, why, or the restriction
 * @param status the status from then on; empty where the event does not change it
 */
public record InstrumentEvent(
    long id, Kind kind, Instant at, long personId, String text, Optional<InstrumentStatus> status) {
  /** What can happen to an instrument. */
  public enum Kind {
    /** It was taken into the logbook. */
    ADDED,
    /** Maintenance was done. */
    MAINTENANCE,
    /** It was adjusted (VIM 3.11). */
    ADJUSTMENT,
    /** It was repaired. */
    REPAIR,
    /** It was damaged or overloaded. */
    DAMAGE,
    /** It was moved. */
    MOVE,
    /** Its firmware changed. */
    FIRMWARE_CHANGE,
    /** It was taken out of service. */
    STOPPED,
    /** It was put back into service. */
    RELEASED,
    /** It was retired. */
    RETIRED
  }
}
