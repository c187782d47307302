package org.evenbeam.store.rows;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.Collectors;
import org.evenbeam.logbook.LogbookException;
import org.evenbeam.logbook.StoreFailed;
import org.evenbeam.trail.Cell;
import org.evenbeam.trail.RowChange;
import org.jdbi.v3.core.Handle;
import org.jdbi.v3.core.JdbiException;

/**
 * The only way by which a row of a trailed table is added or changed. It notes each row as the
 * database then has it, so that no change can miss the trail. Once a row has been refused, the
 * transaction takes no more and cannot be sealed: nothing half is kept.
 */
public final class RowWriter {
  private final Handle handle;
  private final Failures failures;
  private final List<RowChange> changes = new ArrayList<>();
  private Optional<LogbookException> refused = Optional.empty();

  RowWriter(Handle handle, Failures failures) {
    this.handle = handle;
    this.failures = failures;
  }

  /**
   * Adds a row whose key is among its columns.
   *
   * @throws org.evenbeam.logbook.AlreadyThere when its tag, name or number is taken
   * @throws StoreFailed when the database refuses it
   */
  public void add(Row row) {
    write(
        row,
        () -> {
          handle.createUpdate(insert(row)).bindMap(row.columns()).execute();
          note(row.table(), row.columns().get(row.table().key()), Optional.empty());
          return 0;
        });
  }

  /**
   * Adds a row whose key the database gives, and returns the key.
   *
   * @throws org.evenbeam.logbook.AlreadyThere when its tag, name or number is taken
   * @throws StoreFailed when the database refuses it
   */
  public long addNumbered(Row row) {
    return write(
        row,
        () -> {
          long key =
              handle
                  .createUpdate(insert(row))
                  .bindMap(row.columns())
                  .executeAndReturnGeneratedKeys(row.table().key())
                  .mapTo(Long.class)
                  .one();
          note(row.table(), key, Optional.empty());
          return key;
        });
  }

  /**
   * Changes columns of a row that may change, and counts its version up.
   *
   * @param key the row's key
   * @param version the version that the change was made from
   * @param row the columns to change
   * @throws StoreFailed with CHANGED_MEANWHILE when the row has another version by now
   */
  public void update(long key, long version, Row row) {
    write(
        row,
        () -> {
          Optional<Map<String, Cell>> before = find(row.table(), key);
          int changed =
              handle
                  .createUpdate(update(row))
                  .bindMap(row.columns())
                  .bind("_key", key)
                  .bind("_version", version)
                  .execute();
          if (changed == 0) {
            throw failures.because(
                StoreFailed.Reason.CHANGED_MEANWHILE,
                new IllegalStateException(row.table() + " " + key + " is not at " + version));
          }
          note(row.table(), key, before);
          return 0;
        });
  }

  /**
   * Every row noted so far, in the order of the work.
   *
   * @throws LogbookException the refusal of a row, where there was one
   */
  List<RowChange> changes() {
    refused.ifPresent(
        refusal -> {
          throw refusal;
        });
    return changes;
  }

  private long write(Row row, Write write) {
    changes();
    try {
      return write.run();
    } catch (JdbiException refusal) {
      throw refuse(failures.of(refusal, row));
    } catch (StoreFailed refusal) {
      throw refuse(refusal);
    }
  }

  private LogbookException refuse(LogbookException refusal) {
    refused = Optional.of(refusal);
    return refusal;
  }

  private void note(TrailedTable table, Object key, Optional<Map<String, Cell>> before) {
    changes.add(new RowChange(table.sqlName(), key.toString(), before, find(table, key)));
  }

  private Optional<Map<String, Cell>> find(TrailedTable table, Object key) {
    return handle
        .createQuery("select * from " + table.sqlName() + " where " + table.key() + " = :key")
        .bind("key", key)
        .map(new RowCells())
        .findOne();
  }

  private static String insert(Row row) {
    String columns = String.join(", ", row.columns().keySet());
    String values =
        row.columns().keySet().stream().map(name -> ":" + name).collect(Collectors.joining(", "));
    return "insert into " + row.table().sqlName() + " (" + columns + ") values (" + values + ")";
  }

  private static String update(Row row) {
    String columns =
        row.columns().keySet().stream()
            .map(name -> name + " = :" + name)
            .collect(Collectors.joining(", "));
    return "update %s set %s, version = version + 1 where %s = :_key and version = :_version"
        .formatted(row.table().sqlName(), columns, row.table().key());
  }

  /** One write, giving the key where the database gives one. */
  @FunctionalInterface
  private interface Write {
    long run();
  }
}
