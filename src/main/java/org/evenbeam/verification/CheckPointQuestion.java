package org.evenbeam.verification;

import java.math.BigDecimal;
import java.util.Optional;
import java.util.OptionalInt;

/**
 * Everything about one check point that is known before its readings.
 *
 * @param label how the check point is called, such as 100 g
 * @param reference the value the readings are held against
 * @param resolution the instrument's resolution, in the unit of the readings, greater than 0;
 *     absent where unknown
 * @param criteria limits and rules
 * @param plannedReadings how many readings the plan asks for; absent where no plan does
 */
public record CheckPointQuestion(
    String label,
    Reference reference,
    Optional<BigDecimal> resolution,
    Criteria criteria,
    OptionalInt plannedReadings) {
  /** Checks the ranges. */
  public CheckPointQuestion {
    resolution
        .filter(value -> value.signum() <= 0)
        .ifPresent(
            value -> {
              throw new IllegalArgumentException(
                  "resolution is " + value + ", allowed: greater than 0");
            });
    plannedReadings.stream()
        .filter(planned -> planned < 1)
        .forEach(
            planned -> {
              throw new IllegalArgumentException(
                  "plannedReadings is " + planned + ", allowed: 1 or more");
            });
  }
}
