package org.evenbeam.trail;

import java.util.Map;
import java.util.Optional;

/**
 * One row that a use case added, changed or removed.
 *
 * @param table the table's name
 * @param key the row's primary key as text
 * @param before the row before, column by column; empty for a row that was added
 * @param after the row after, column by column; empty for a row that was removed
 */
public record RowChange(
    String table,
    String key,
    Optional<Map<String, Cell>> before,
    Optional<Map<String, Cell>> after) {}
