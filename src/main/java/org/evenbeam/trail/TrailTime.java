package org.evenbeam.trail;

import java.time.Instant;
import java.time.ZoneOffset;
import java.time.format.DateTimeFormatter;
import java.util.Locale;

/** How the trail writes a time: UTC, six decimals. */
public final class TrailTime {
  private static final DateTimeFormatter FORM =
      DateTimeFormatter.ofPattern("uuuu-MM-dd'T'HH:mm:ss.SSSSSS'Z'", Locale.ROOT)
          .withZone(ZoneOffset.UTC);

  private TrailTime() {}

  /** The time as the trail writes it; what lies below a microsecond is dropped. */
  public static String format(Instant time) {
    return FORM.format(time);
  }
}
