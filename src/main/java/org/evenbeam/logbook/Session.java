package org.evenbeam.logbook;

import java.time.Clock;
import java.time.Instant;
import java.time.LocalDate;
import java.time.ZoneId;
import java.time.temporal.ChronoUnit;

/**
 * A person at work: who, where and by which clock. One per window, passed to every use case.
 *
 * @param person who acts
 * @param zone the laboratory's time zone
 * @param clock where the time comes from
 */
public record Session(Person person, ZoneId zone, Clock clock) {
  /** The present moment, to the microsecond, which is what the store keeps. */
  public Instant now() {
    return clock.instant().truncatedTo(ChronoUnit.MICROS);
  }

  /** Today at the laboratory. */
  public LocalDate today() {
    return LocalDate.ofInstant(now(), zone);
  }
}
