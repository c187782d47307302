package org.evenbeam.stats.fitness;

import java.util.List;
import org.evenbeam.stats.Arguments;

/**
 * The standard deviation pooled over runs, {@code s_p^2 = sum of nu_i s_i^2 / sum of nu_i}. Source:
 * ISO 5725-2:1994, 7.4.5.1.
 *
 * @param standardDeviation s_p
 * @param degreesOfFreedom the sum of the runs' n - 1
 */
public record PooledDeviation(double standardDeviation, long degreesOfFreedom) {
  /**
   * Pools runs.
   *
   * @throws IllegalArgumentException if there is none
   */
  public static PooledDeviation of(List<Spread> runs) {
    Arguments.atLeast("number of runs", runs.size(), 1);
    double largest = runs.stream().mapToDouble(Spread::standardDeviation).max().orElse(0);
    long freedom = runs.stream().mapToLong(Spread::degreesOfFreedom).sum();
    if (largest == 0) {
      return new PooledDeviation(0, freedom);
    }
    double squares = runs.stream().mapToDouble(run -> squares(run, largest)).sum();
    return new PooledDeviation(largest * Math.sqrt(squares / freedom), freedom);
  }

  /** The run's sum of squares, in units in which no square leaves the range of doubles. */
  static double squares(Spread run, double unit) {
    double relative = run.standardDeviation() / unit;
    return run.degreesOfFreedom() * relative * relative;
  }
}
