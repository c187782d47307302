package org.evenbeam.trail;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.JsonNodeFactory;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.Map;
import java.util.Optional;
import org.erdtman.jcs.JsonCanonicalizer;

/**
 * The one form in which an entry is hashed: JSON with sorted members and no white space (RFC 8785),
 * every number a text. Form 1 is final: an entry is always checked in the form that it names.
 */
public final class CanonicalForm {
  private static final ObjectMapper JSON = new ObjectMapper();
  private static final JsonNodeFactory NODES = JsonNodeFactory.instance;

  private CanonicalForm() {}

  /** Puts the entry into its canonical form and seals it with its hash. */
  public static SealedEntry seal(TrailEntry entry) {
    String canonical = canonical(json(entry));
    return new SealedEntry(
        entry.number(),
        TrailEntry.FORM,
        canonical,
        Sha256.hex(canonical.getBytes(StandardCharsets.UTF_8)));
  }

  /**
   * Any JSON in canonical form.
   *
   * @throws UncheckedIOException when the text is not JSON
   */
  public static String canonical(String json) {
    try {
      return new JsonCanonicalizer(json).getEncodedString();
    } catch (IOException notJson) {
      throw new UncheckedIOException(notJson);
    }
  }

  private static String json(TrailEntry entry) {
    ObjectNode node = NODES.objectNode();
    node.put("form", Integer.toString(TrailEntry.FORM));
    node.put("number", Long.toString(entry.number()));
    node.put("at", TrailTime.format(entry.at()));
    node.put("person", entry.person().orElse(null));
    node.put("action", entry.action());
    node.put("reason", entry.reason().orElse(null));
    node.put("previous", entry.previousHash());
    ArrayNode changes = node.putArray("changes");
    entry.changes().forEach(change -> changes.add(change(change)));
    try {
      return JSON.writeValueAsString(node);
    } catch (IOException impossible) {
      throw new UncheckedIOException(impossible);
    }
  }

  private static ObjectNode change(RowChange change) {
    ObjectNode node = NODES.objectNode();
    node.put("table", change.table());
    node.put("key", change.key());
    node.set("before", row(change.before()));
    node.set("after", row(change.after()));
    return node;
  }

  private static JsonNode row(Optional<Map<String, Cell>> row) {
    if (row.isEmpty()) {
      return NODES.nullNode();
    }
    ObjectNode node = NODES.objectNode();
    row.get().forEach((column, cell) -> node.set(column, cell(cell)));
    return node;
  }

  private static JsonNode cell(Cell cell) {
    if (cell.value() == null) {
      return NODES.nullNode();
    }
    return cell.value() instanceof Boolean truth
        ? NODES.booleanNode(truth)
        : NODES.textNode((String) cell.value());
  }
}
