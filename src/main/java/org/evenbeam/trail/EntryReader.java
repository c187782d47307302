package org.evenbeam.trail;

import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.time.Instant;
import java.time.format.DateTimeParseException;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/** Reads an entry back from its canonical form; the inverse of {@link CanonicalForm#seal}. */
public final class EntryReader {
  private static final ObjectMapper JSON = new ObjectMapper();

  private EntryReader() {}

  /**
   * The entry that the canonical form says.
   *
   * @throws UnreadableEntry when it is not an entry in form {@link TrailEntry#FORM}
   */
  public static TrailEntry read(String canonical) {
    try {
      JsonNode entry = JSON.readTree(canonical);
      if (!Integer.toString(TrailEntry.FORM).equals(text(entry, "form"))) {
        throw new UnreadableEntry("form is " + entry.path("form"), null);
      }
      return new TrailEntry(
          Long.parseLong(text(entry, "number")),
          Instant.parse(text(entry, "at")),
          optional(entry, "person"),
          text(entry, "action"),
          optional(entry, "reason"),
          changes(member(entry, "changes")),
          text(entry, "previous"));
    } catch (JsonProcessingException | NumberFormatException | DateTimeParseException unreadable) {
      throw new UnreadableEntry(unreadable.getMessage(), unreadable);
    }
  }

  private static List<RowChange> changes(JsonNode array) {
    List<RowChange> changes = new ArrayList<>();
    for (JsonNode change : array) {
      changes.add(
          new RowChange(
              text(change, "table"),
              text(change, "key"),
              row(member(change, "before")),
              row(member(change, "after"))));
    }
    return changes;
  }

  private static Optional<Map<String, Cell>> row(JsonNode row) {
    if (row.isNull()) {
      return Optional.empty();
    }
    Map<String, Cell> cells = new LinkedHashMap<>();
    row.properties().forEach(column -> cells.put(column.getKey(), cell(column.getValue())));
    return Optional.of(cells);
  }

  private static Cell cell(JsonNode value) {
    if (value.isNull()) {
      return Cell.nothing();
    }
    if (value.isBoolean()) {
      return Cell.of(value.booleanValue());
    }
    if (value.isTextual()) {
      return Cell.of(value.textValue());
    }
    throw new UnreadableEntry("a column holds " + value.getNodeType(), null);
  }

  private static Optional<String> optional(JsonNode node, String name) {
    return member(node, name).isNull() ? Optional.empty() : Optional.of(text(node, name));
  }

  private static String text(JsonNode node, String name) {
    JsonNode member = member(node, name);
    if (!member.isTextual()) {
      throw new UnreadableEntry(name + " is not a text", null);
    }
    return member.textValue();
  }

  private static JsonNode member(JsonNode node, String name) {
    JsonNode member = node.get(name);
    if (member == null) {
      throw new UnreadableEntry(name + " is missing", null);
    }
    return member;
  }
}
