package org.evenbeam.logbook.run;

import java.time.Instant;
import java.util.Optional;
import org.evenbeam.metrology.TypedDecimal;

/**
 * A reading, kept exactly as typed and never overwritten.
 *
 * @param id the key in the logbook, 0 before it is kept
 * @param checkPoint the check point's label
 * @param position 1 for the first reading of the check point; a correction has its original's
 *     position
 * @param value as typed
 * @param at when it was entered
 * @param personId who entered it
 * @param source where it came from
 * @param sourceKey for a captured reading, what makes it unique there: file hash and line, port and
 *     sequence
 * @param corrects for a correction, the reading that it replaces and why
 * @param strike set once it is struck
 */
public record Reading(
    long id,
    String checkPoint,
    int position,
    TypedDecimal value,
    Instant at,
    long personId,
    Source source,
    Optional<String> sourceKey,
    Optional<Correction> corrects,
    Optional<Strike> strike) {

  /** Where a reading came from. */
  public enum Source {
    /** Typed. */
    KEYBOARD,
    /** Pasted from another program. */
    PASTED,
    /** Read from a file. */
    FILE,
    /** Read from the instrument's port. */
    PORT
  }

  /**
   * What a correction replaces.
   *
   * @param readingId the reading replaced
   * @param reason why
   */
  public record Correction(long readingId, String reason) {}

  /**
   * How a reading was struck.
   *
   * @param cause what was seen at the bench, never the value alone
   * @param at when
   * @param personId by whom
   */
  public record Strike(String cause, Instant at, long personId) {}
}
