package org.evenbeam.stats;

import static org.assertj.core.api.Assertions.assertThat;

/** Comparison of numbers by relative error. */
public final class Close {
  private Close() {}

  /** Asserts that the relative error of {@code actual} is at most {@code tolerance}. */
  public static void assertClose(String what, double actual, double expected, double tolerance) {
    double error = actual == expected ? 0 : Math.abs(actual - expected) / Math.abs(expected);
    assertThat(error).as("%s: %s for %s", what, actual, expected).isLessThanOrEqualTo(tolerance);
  }
}
