package org.evenbeam.logbook.standards;

import java.time.LocalDate;
import java.util.List;
import java.util.Optional;

/**
 * A calibration certificate or reference material certificate of a standard.
 *
 * @param number the certificate's number
 * @param issuedBy the laboratory or producer that issued it
 * @param traceability its statement of metrological traceability (VIM 2.41)
 * @param issued its date
 * @param expires the last day on which it holds
 * @param values what it certifies, at least one value
 */
public record StandardCertificate(
    String number,
    String issuedBy,
    String traceability,
    LocalDate issued,
    LocalDate expires,
    List<CertifiedValue> values) {
  /** Checks the dates and that there is a value. */
  public StandardCertificate {
    if (expires.isBefore(issued)) {
      throw new IllegalArgumentException(
          "expires is " + expires + ", allowed: " + issued + " or later");
    }
    if (values.isEmpty()) {
      throw new IllegalArgumentException("values is empty, allowed: at least one");
    }
    values = List.copyOf(values);
  }

  /** Whether it holds on that day, both ends included. */
  public boolean holdsOn(LocalDate day) {
    return !day.isBefore(issued) && !day.isAfter(expires);
  }

  /** The certified value of that label. */
  public Optional<CertifiedValue> value(String label) {
    return values.stream().filter(value -> value.label().equals(label)).findFirst();
  }
}
