package org.evenbeam.stats.fitness;

import org.evenbeam.stats.Arguments;

/**
 * The standard deviation of one run's readings.
 *
 * @param standardDeviation s, 0 or more
 * @param n number of readings, 2 or more
 */
public record Spread(double standardDeviation, int n) {
  /**
   * Makes a spread.
   *
   * @throws IllegalArgumentException if an argument is outside its range
   */
  public Spread {
    Arguments.notNegative("standardDeviation", standardDeviation);
    Arguments.atLeast("n", n, 2);
  }

  int degreesOfFreedom() {
    return n - 1;
  }
}
