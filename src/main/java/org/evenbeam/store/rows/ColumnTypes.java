package org.evenbeam.store.rows;

import java.math.BigDecimal;
import java.sql.ResultSet;
import java.sql.SQLException;
import java.sql.Types;
import java.time.Instant;
import java.time.OffsetDateTime;
import java.time.ZoneId;
import org.evenbeam.metrology.DecimalSign;
import org.evenbeam.metrology.TypedDecimal;
import org.jdbi.v3.core.Jdbi;
import org.jdbi.v3.core.argument.AbstractArgumentFactory;
import org.jdbi.v3.core.argument.Argument;
import org.jdbi.v3.core.config.ConfigRegistry;

/** How the values of the logbook stand in columns, both ways. */
public final class ColumnTypes {
  private ColumnTypes() {}

  /** Teaches them to connections. */
  public static Jdbi register(Jdbi jdbi) {
    return jdbi.registerArgument(new Times())
        .registerColumnMapper(Instant.class, (row, column, context) -> instant(row, column))
        .registerColumnMapper(BigDecimal.class, (row, column, context) -> decimal(row, column))
        .registerColumnMapper(ZoneId.class, (row, column, context) -> zone(row, column));
  }

  /** A decimal as typed, from the columns of its text and its sign; null where there is none. */
  public static TypedDecimal typed(ResultSet row, String text, String sign) throws SQLException {
    String typed = row.getString(text);
    return typed == null
        ? null
        : TypedDecimal.parse(typed, DecimalSign.valueOf(row.getString(sign)));
  }

  /** A time, null where there is none. */
  public static Instant instant(ResultSet row, String column) throws SQLException {
    OffsetDateTime time = row.getObject(column, OffsetDateTime.class);
    return time == null ? null : time.toInstant();
  }

  /** A decimal kept by its digits, null where there is none. */
  public static BigDecimal decimal(ResultSet row, String column) throws SQLException {
    String digits = row.getString(column);
    return digits == null ? null : new BigDecimal(digits);
  }

  private static Instant instant(ResultSet row, int column) throws SQLException {
    OffsetDateTime time = row.getObject(column, OffsetDateTime.class);
    return time == null ? null : time.toInstant();
  }

  private static BigDecimal decimal(ResultSet row, int column) throws SQLException {
    String digits = row.getString(column);
    return digits == null ? null : new BigDecimal(digits);
  }

  private static ZoneId zone(ResultSet row, int column) throws SQLException {
    String name = row.getString(column);
    return name == null ? null : ZoneId.of(name);
  }

  /** Hands times over as they are, with their offset. */
  private static final class Times extends AbstractArgumentFactory<OffsetDateTime> {
    Times() {
      super(Types.TIMESTAMP_WITH_TIMEZONE);
    }

    @Override
    protected Argument build(OffsetDateTime time, ConfigRegistry config) {
      return (position, statement, context) -> statement.setObject(position, time);
    }
  }
}
