package org.evenbeam.ui.runsheet;

/**
 * A line in the list of readings.
 *
 * @param id the reading's key, 0 before it is kept
 * @param position 1 for the first reading of the check point
 * @param text as typed
 * @param time when it was entered; empty before it is kept
 * @param state how it stands
 * @param remark why it was struck or corrected; empty for nothing
 */
public record ReadingLine(
    long id, int position, String text, String time, State state, String remark) {
  /** How a reading stands. */
  public enum State {
    /** Taken at the screen and on its way to the disk. */
    ON_ITS_WAY,
    /** On the disk, and counts. */
    COUNTS,
    /** Struck for a cause seen at the bench. */
    STRUCK,
    /** Replaced by a correction. */
    CORRECTED,
    /** Refused; it is not in the logbook. */
    NOT_KEPT
  }

  /** Whether it can be corrected or struck. */
  boolean counts() {
    return state == State.COUNTS;
  }

  /** Whether it no longer counts. */
  boolean isGone() {
    return state == State.STRUCK || state == State.CORRECTED || state == State.NOT_KEPT;
  }
}
