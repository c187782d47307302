package org.evenbeam.logbook;

/** What was asked for is not in the logbook. */
public final class NotFound extends LogbookException {
  private static final long serialVersionUID = 1L;

  /** What kind of thing was looked for. */
  public enum Thing {
    /** A person by sign-in name. */
    PERSON,
    /** An instrument by tag. */
    INSTRUMENT,
    /** A reference standard by tag. */
    STANDARD,
    /** A calibration certificate or reference material certificate of a standard, by number. */
    STANDARD_CERTIFICATE,
    /** A plan by instrument tag. */
    PLAN,
    /** A check point by label. */
    CHECK_POINT,
    /** A run by number. */
    RUN,
    /** A reading by number. */
    READING,
    /** A certificate by number. */
    CERTIFICATE,
    /** A certified value by label. */
    CERTIFIED_VALUE,
    /** The laboratory's own facts. */
    LABORATORY
  }

  /** Names what was looked for and by which name. */
  public NotFound(Thing thing, String name) {
    super("not-found", thing, name);
  }
}
