package org.evenbeam.logbook.plans;

import java.util.Set;

/**
 * Which units have a true zero, so that a share of a value means something (Stevens, Science 103
 * (1946) 677).
 */
final class RatioScale {
  private static final Set<String> INTERVAL_SCALES = Set.of("Cel", "[degF]", "[pH]");

  private RatioScale() {}

  /** Whether values in the unit of that UCUM code lie on a ratio scale. */
  static boolean isOne(String unit) {
    return !INTERVAL_SCALES.contains(unit);
  }
}
