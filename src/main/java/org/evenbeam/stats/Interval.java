package org.evenbeam.stats;

/**
 * A closed interval. An end may be infinite, never absent.
 *
 * @param low the lower end
 * @param high the upper end, not below {@code low}
 */
public record Interval(double low, double high) {
  /**
   * Makes an interval.
   *
   * @throws IllegalArgumentException if an end is not a number, or the ends are in the wrong order
   */
  public Interval {
    if (!(low <= high)) {
      throw new IllegalArgumentException("interval from " + low + " to " + high + " has no points");
    }
  }

  /** The interval of half-width {@code halfWidth} about {@code centre}. */
  public static Interval about(double centre, double halfWidth) {
    return new Interval(centre - halfWidth, centre + halfWidth);
  }

  /** Whether {@code value} lies in it, ends included. */
  public boolean contains(double value) {
    return low <= value && value <= high;
  }

  /** Whether all of it lies in {@code outer}, ends included. */
  public boolean liesIn(Interval outer) {
    return outer.low <= low && high <= outer.high;
  }
}
