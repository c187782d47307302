package org.evenbeam.verification.plan;

import java.math.BigDecimal;
import java.util.Optional;

/**
 * A closed range; either end may be open.
 *
 * @param low the lowest allowed value
 * @param high the highest allowed value, not below {@code low}
 */
public record Bounds(Optional<BigDecimal> low, Optional<BigDecimal> high) {
  /** No bound at all. */
  public static final Bounds NONE = new Bounds(Optional.empty(), Optional.empty());

  /** Checks the order of the ends. */
  public Bounds {
    if (low.isPresent() && high.isPresent() && low.get().compareTo(high.get()) > 0) {
      throw new IllegalArgumentException(
          "high is " + high.get() + ", allowed: " + low.get() + " or more");
    }
  }

  /** Whether anything is asked. */
  public boolean isAsked() {
    return low.isPresent() || high.isPresent();
  }

  /** Whether the value lies within, ends included. */
  public boolean contains(BigDecimal value) {
    return low.map(l -> l.compareTo(value) <= 0).orElse(true)
        && high.map(h -> h.compareTo(value) >= 0).orElse(true);
  }
}
