package org.evenbeam.certificate;

import java.time.Instant;
import java.time.ZoneId;
import java.time.format.DateTimeFormatter;
import java.util.Locale;

/** Times on certificates: ISO 8601 in the laboratory's zone, the difference from UTC named. */
final class CertificateTimes {
  private static final DateTimeFormatter MINUTE =
      DateTimeFormatter.ofPattern("uuuu-MM-dd HH:mm xxx", Locale.ROOT);
  private static final DateTimeFormatter SECOND =
      DateTimeFormatter.ofPattern("HH:mm:ss", Locale.ROOT);
  private static final DateTimeFormatter DAY =
      DateTimeFormatter.ofPattern("uuuu-MM-dd", Locale.ROOT);

  private final ZoneId zone;

  CertificateTimes(ZoneId zone) {
    this.zone = zone;
  }

  String toTheMinute(Instant time) {
    return MINUTE.format(time.atZone(zone));
  }

  String ofDay(Instant time) {
    return SECOND.format(time.atZone(zone));
  }

  String day(Instant time) {
    return DAY.format(time.atZone(zone));
  }
}
