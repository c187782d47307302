package org.evenbeam.verification.plan;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.evenbeam.metrology.TypedDecimal;
import org.evenbeam.verification.Condition;

/**
 * The room as it was during a run, each value as typed.
 *
 * @param temperature in °C
 * @param humidity relative, in %
 * @param pressure in hPa
 */
public record Conditions(
    Optional<TypedDecimal> temperature,
    Optional<TypedDecimal> humidity,
    Optional<TypedDecimal> pressure) {
  /** Nothing recorded yet. */
  public static final Conditions NONE =
      new Conditions(Optional.empty(), Optional.empty(), Optional.empty());

  /** The conditions that the limits ask for and that were not recorded. */
  public List<Condition> missing(EnvironmentLimits limits) {
    List<Condition> missing = new ArrayList<>();
    for (Condition condition : Condition.values()) {
      if (bounds(limits, condition).isAsked() && value(condition).isEmpty()) {
        missing.add(condition);
      }
    }
    return missing;
  }

  /** The recorded conditions that lie outside the limits. */
  public List<Condition> outside(EnvironmentLimits limits) {
    List<Condition> outside = new ArrayList<>();
    for (Condition condition : Condition.values()) {
      boolean beyond =
          value(condition).filter(v -> !bounds(limits, condition).contains(v.value())).isPresent();
      if (beyond) {
        outside.add(condition);
      }
    }
    return outside;
  }

  /** The recorded value of one condition. */
  public Optional<TypedDecimal> value(Condition condition) {
    return switch (condition) {
      case TEMPERATURE -> temperature;
      case HUMIDITY -> humidity;
      case PRESSURE -> pressure;
    };
  }

  private static Bounds bounds(EnvironmentLimits limits, Condition condition) {
    return switch (condition) {
      case TEMPERATURE -> limits.temperature();
      case HUMIDITY -> limits.humidity();
      case PRESSURE -> limits.pressure();
    };
  }
}
