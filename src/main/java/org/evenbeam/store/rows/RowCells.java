package org.evenbeam.store.rows;

import java.sql.ResultSet;
import java.sql.ResultSetMetaData;
import java.sql.SQLException;
import java.sql.Types;
import java.time.LocalDate;
import java.time.OffsetDateTime;
import java.util.LinkedHashMap;
import java.util.Locale;
import java.util.Map;
import java.util.function.Function;
import org.evenbeam.trail.Cell;
import org.jdbi.v3.core.mapper.RowMapper;
import org.jdbi.v3.core.statement.StatementContext;

/** Every column of a row as the trail writes it. */
public final class RowCells implements RowMapper<Map<String, Cell>> {
  /** Maps rows of any table. */
  public RowCells() {}

  @Override
  public Map<String, Cell> map(ResultSet row, StatementContext context) throws SQLException {
    ResultSetMetaData columns = row.getMetaData();
    Map<String, Cell> cells = new LinkedHashMap<>();
    for (int column = 1; column <= columns.getColumnCount(); column++) {
      String name = columns.getColumnLabel(column).toLowerCase(Locale.ROOT);
      cells.put(name, cell(row, column, columns.getColumnType(column)));
    }
    return cells;
  }

  private static Cell cell(ResultSet row, int column, int type) throws SQLException {
    return switch (type) {
      case Types.VARCHAR -> cell(row.getString(column), Cell::of);
      case Types.BIGINT, Types.INTEGER -> cell(row.getObject(column, Long.class), Cell::of);
      case Types.BOOLEAN -> cell(row.getObject(column, Boolean.class), Cell::of);
      case Types.DATE -> cell(row.getObject(column, LocalDate.class), Cell::of);
      case Types.TIMESTAMP_WITH_TIMEZONE ->
          cell(row.getObject(column, OffsetDateTime.class), time -> Cell.of(time.toInstant()));
      case Types.VARBINARY, Types.BLOB -> cell(row.getBytes(column), Cell::of);
      default -> throw new IllegalStateException("no form for a column of JDBC type " + type);
    };
  }

  private static <T> Cell cell(T content, Function<T, Cell> form) {
    return content == null ? Cell.nothing() : form.apply(content);
  }
}
