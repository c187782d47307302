package org.evenbeam.store.rows;

import java.math.BigDecimal;
import java.time.Instant;
import java.time.LocalDate;
import java.time.OffsetDateTime;
import java.time.ZoneOffset;
import java.time.temporal.ChronoUnit;
import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Optional;

/** The columns of one row on its way into a trailed table, in the types that the schema keeps. */
public final class Row {
  private final TrailedTable table;
  private final Map<String, Object> columns = new LinkedHashMap<>();

  private Row(TrailedTable table) {
    this.table = table;
  }

  /** A row of that table, without columns yet. */
  public static Row of(TrailedTable table) {
    return new Row(table);
  }

  /**
   * Sets a column. An enum is kept by its name, a decimal or a double by its digits, an instant to
   * the microsecond, an empty Optional as nothing.
   *
   * @throws IllegalArgumentException for a type that the schema does not keep
   */
  public Row with(String column, Object value) {
    columns.put(column, kept(value));
    return this;
  }

  TrailedTable table() {
    return table;
  }

  Map<String, Object> columns() {
    return Collections.unmodifiableMap(columns);
  }

  static Object kept(Object value) {
    if (value instanceof Optional<?> optional) {
      return optional.map(Row::kept).orElse(null);
    }
    if (value instanceof Enum<?> constant) {
      return constant.name();
    }
    if (value instanceof BigDecimal || value instanceof Double) {
      return value.toString();
    }
    if (value instanceof Instant instant) {
      return time(instant);
    }
    if (value == null || isKeptAsItIs(value)) {
      return value;
    }
    throw new IllegalArgumentException(
        "value is a " + value.getClass() + ", allowed: what a column of the schema can keep");
  }

  /** A time as the database is given it: UTC, what lies below a microsecond dropped. */
  public static OffsetDateTime time(Instant instant) {
    return instant.truncatedTo(ChronoUnit.MICROS).atOffset(ZoneOffset.UTC);
  }

  private static boolean isKeptAsItIs(Object value) {
    return value instanceof String
        || value instanceof Long
        || value instanceof Integer
        || value instanceof Boolean
        || value instanceof LocalDate
        || value instanceof byte[];
  }
}
