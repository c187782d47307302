package org.evenbeam.cli;

import com.fasterxml.jackson.databind.node.JsonNodeFactory;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.Optional;
import java.util.OptionalDouble;
import org.evenbeam.verification.CheckPointFindings;
import org.evenbeam.verification.CheckRisk;

/** What a check could have missed, as JSON; null where nothing can be assumed. */
final class RiskJson {
  private RiskJson() {}

  static ObjectNode of(CheckPointFindings found) {
    Optional<CheckRisk> risk = CheckRisk.of(found.question(), found.n(), found.standardDeviation());
    ObjectNode node = JsonNodeFactory.instance.objectNode();
    JsonNumbers.put(
        node, "assumed_standard_deviation", risk.map(CheckRisk::assumedStandardDeviation));
    JsonNumbers.put(
        node, "conforms_at_zero_bias", risk.flatMap(r -> number(r.conformsAtZeroBias())));
    JsonNumbers.put(node, "conforms_at_limit", risk.flatMap(r -> number(r.conformsAtLimit())));
    JsonNumbers.put(
        node, "conforms_at_twice_limit", risk.flatMap(r -> number(r.conformsAtTwiceLimit())));
    JsonNumbers.put(node, "detectable_bias", risk.flatMap(r -> number(r.detectableBias())));
    JsonNumbers.put(
        node,
        "detectable_standard_deviation",
        risk.flatMap(r -> number(r.detectableStandardDeviation())));
    JsonNumbers.put(node, "conforms_without_bias", risk.map(CheckRisk::conformsWithoutBias));
    return node;
  }

  private static Optional<Double> number(OptionalDouble value) {
    return value.isPresent() ? Optional.of(value.getAsDouble()) : Optional.empty();
  }
}
