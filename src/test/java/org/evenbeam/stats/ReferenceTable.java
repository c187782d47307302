package org.evenbeam.stats;

import de.siegmar.fastcsv.reader.CommentStrategy;
import de.siegmar.fastcsv.reader.CsvReader;
import de.siegmar.fastcsv.reader.NamedCsvRecord;
import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.math.BigDecimal;
import java.util.List;
import java.util.stream.Stream;

/** Values from outside, from the files under reference/. */
public final class ReferenceTable {
  private ReferenceTable() {}

  /** One row of a table. */
  public record Row(NamedCsvRecord cells) {
    /** The text of a cell. */
    public String text(String column) {
      return cells.getField(column);
    }

    /** Whether a cell has a value. */
    public boolean has(String column) {
      return !text(column).isEmpty() && !text(column).equals("NA");
    }

    /** A cell as the nearest double. */
    public double number(String column) {
      return text(column).equals("inf") ? Double.POSITIVE_INFINITY : decimal(column).doubleValue();
    }

    /** A cell as a whole number. */
    public int count(String column) {
      return decimal(column).intValueExact();
    }

    /** A cell as the decimal that it is. */
    public BigDecimal decimal(String column) {
      return new BigDecimal(text(column));
    }

    @Override
    public String toString() {
      return String.join(",", cells.getFields().subList(0, Math.min(4, cells.getFieldCount())));
    }
  }

  /** The rows of a table; lines that begin with # are its header. */
  public static List<Row> rows(String name) {
    try (InputStream in = ReferenceTable.class.getResourceAsStream("/reference/" + name);
        CsvReader<NamedCsvRecord> csv =
            CsvReader.builder().commentStrategy(CommentStrategy.SKIP).ofNamedCsvRecord(in)) {
      return csv.stream().map(Row::new).toList();
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  /** The rows of a table with {@code value} in {@code column}. */
  public static Stream<Row> rows(String name, String column, String value) {
    return rows(name).stream().filter(row -> row.text(column).equals(value));
  }

  /** One column of decimals. */
  public static List<BigDecimal> decimals(String name, String column) {
    return rows(name).stream().map(row -> row.decimal(column)).toList();
  }
}
