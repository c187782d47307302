package org.evenbeam.cli;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.JsonNodeFactory;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * Doubles in JSON with 17 significant digits, so that they can be read back exactly; null for none.
 */
final class JsonNumbers {
  private static final JsonNodeFactory NODES = JsonNodeFactory.instance;
  private static final MathContext FULL = new MathContext(17, RoundingMode.HALF_EVEN);

  private JsonNumbers() {}

  static void put(ObjectNode node, String name, OptionalDouble value) {
    put(node, name, value.isPresent() ? Optional.of(value.getAsDouble()) : Optional.empty());
  }

  static void put(ObjectNode node, String name, double value) {
    put(node, name, Optional.of(value));
  }

  static void put(ObjectNode node, String name, Optional<Double> value) {
    node.set(
        name,
        value
            .filter(Double::isFinite)
            .map(v -> new BigDecimal(v).round(FULL))
            .<JsonNode>map(NODES::numberNode)
            .orElseGet(NODES::nullNode));
  }
}
