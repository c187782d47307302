package org.evenbeam.trail;

import java.math.BigDecimal;
import java.time.Instant;
import java.time.LocalDate;
import java.util.Optional;

/**
 * The content of one column of one row, in the form that the trail keeps for ever: nothing, true or
 * false, or a text. Numbers are texts, so that no reader rounds them; bytes are the SHA-256 of
 * their content.
 *
 * @param value null for nothing, otherwise a {@link Boolean} or a {@link String}
 */
public record Cell(Object value) {
  private static final Cell NOTHING = new Cell(null);

  /** Checks the type. */
  public Cell {
    if (value != null && !(value instanceof Boolean) && !(value instanceof String)) {
      throw new IllegalArgumentException(
          "value is a " + value.getClass() + ", allowed: null, Boolean, String");
    }
  }

  /** An empty column. */
  public static Cell nothing() {
    return NOTHING;
  }

  /** A text column. */
  public static Cell of(String text) {
    return new Cell(text);
  }

  /** A boolean column. */
  public static Cell of(boolean truth) {
    return new Cell(truth);
  }

  /** An integer column, as digits. */
  public static Cell of(long number) {
    return new Cell(Long.toString(number));
  }

  /** A decimal column, as digits with its trailing zeros and without an exponent. */
  public static Cell of(BigDecimal number) {
    return new Cell(number.toPlainString());
  }

  /** A date column, ISO 8601. */
  public static Cell of(LocalDate date) {
    return new Cell(date.toString());
  }

  /** A time column: UTC, six decimals, as in 2026-03-01T09:41:00.000000Z. */
  public static Cell of(Instant time) {
    return new Cell(TrailTime.format(time));
  }

  /** A bytes column, by the SHA-256 of its content. */
  public static Cell of(byte[] bytes) {
    return new Cell("sha256:" + Sha256.hex(bytes));
  }

  /** The column's value as text, empty for nothing. */
  public Optional<String> text() {
    return Optional.ofNullable(value).map(Object::toString);
  }
}
