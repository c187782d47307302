package org.evenbeam.trail;

import java.util.HashMap;
import java.util.HashSet;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.function.Function;

/**
 * Makes the tables again from the entries alone, and compares the result with the tables as they
 * are, in both directions. Entries are taken one after the other, of a chain that {@link
 * ChainCheck} found whole. A column that a later version of the schema added is missing in older
 * entries; it counts as empty there.
 */
public final class Replay {
  private final Map<String, Map<String, Map<String, Cell>>> tables = new HashMap<>();
  private long number;

  /** A replay before the first entry. */
  public Replay() {}

  /**
   * Takes the next entry.
   *
   * @return the fault, when a row before its change is not what the earlier entries left
   */
  public Optional<TrailFault> next(TrailEntry entry) {
    number = entry.number();
    for (RowChange change : entry.changes()) {
      Map<String, Map<String, Cell>> table =
          tables.computeIfAbsent(change.table(), name -> new HashMap<>());
      if (!same(Optional.ofNullable(table.get(change.key())), change.before())) {
        return Optional.of(fault(TrailFault.Kind.BEFORE_DIFFERS, change.table(), change.key()));
      }
      change
          .after()
          .ifPresentOrElse(
              after -> table.put(change.key(), after), () -> table.remove(change.key()));
    }
    return Optional.empty();
  }

  /** The tables that the entries touched. */
  public Set<String> tables() {
    return Set.copyOf(tables.keySet());
  }

  /**
   * Compares one table, column by column.
   *
   * @param table its name
   * @param rows every row that it has, by its key
   * @return the first fault by the order of keys
   */
  public Optional<TrailFault> compare(String table, Map<String, Map<String, Cell>> rows) {
    Map<String, Map<String, Cell>> replayed = tables.getOrDefault(table, Map.of());
    Set<String> keys = new HashSet<>(rows.keySet());
    keys.addAll(replayed.keySet());
    return keys.stream()
        .sorted()
        .flatMap(key -> difference(rows.get(key), replayed.get(key)).map(at(table, key)).stream())
        .findFirst();
  }

  private Function<TrailFault.Kind, TrailFault> at(String table, String key) {
    return kind -> fault(kind, table, key);
  }

  private TrailFault fault(TrailFault.Kind kind, String table, String key) {
    return new TrailFault(kind, number, table, key);
  }

  private static Optional<TrailFault.Kind> difference(
      Map<String, Cell> row, Map<String, Cell> replayed) {
    if (row == null) {
      return Optional.of(TrailFault.Kind.ROW_MISSING);
    }
    if (replayed == null) {
      return Optional.of(TrailFault.Kind.ROW_UNKNOWN);
    }
    return same(row, replayed) ? Optional.empty() : Optional.of(TrailFault.Kind.ROW_DIFFERS);
  }

  private static boolean same(Optional<Map<String, Cell>> left, Optional<Map<String, Cell>> right) {
    return left.isPresent() == right.isPresent()
        && (left.isEmpty() || same(left.get(), right.get()));
  }

  private static boolean same(Map<String, Cell> left, Map<String, Cell> right) {
    Set<String> columns = new HashSet<>(left.keySet());
    columns.addAll(right.keySet());
    return columns.stream()
        .allMatch(
            column ->
                left.getOrDefault(column, Cell.nothing())
                    .equals(right.getOrDefault(column, Cell.nothing())));
  }
}
