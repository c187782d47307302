package org.evenbeam.stats;

/**
 * The maximum permissible bias on either side of the reference value. A side without a limit is
 * infinite.
 *
 * @param below how far below the reference value a bias may lie, 0 to infinity
 * @param above how far above it may lie, 0 to infinity
 */
public record BiasLimits(double below, double above) {
  /**
   * Makes limits.
   *
   * @throws IllegalArgumentException if one is negative or not a number, or neither side has one
   */
  public BiasLimits {
    if (!(below >= 0 && above >= 0)) {
      throw new IllegalArgumentException(
          "limits are " + below + " and " + above + ", allowed: 0 to infinity");
    }
    if (Double.isInfinite(below) && Double.isInfinite(above)) {
      throw new IllegalArgumentException("limits are infinite on both sides: nothing is asked");
    }
  }

  /** The same limit on both sides. */
  public static BiasLimits symmetric(double limit) {
    return new BiasLimits(limit, limit);
  }

  /** A limit only for readings too low. */
  public static BiasLimits onlyBelow(double limit) {
    return new BiasLimits(limit, Double.POSITIVE_INFINITY);
  }

  /** A limit only for readings too high. */
  public static BiasLimits onlyAbove(double limit) {
    return new BiasLimits(Double.POSITIVE_INFINITY, limit);
  }

  /** The permitted biases, from {@code -below} to {@code above}. */
  public Interval permitted() {
    return new Interval(-below, above);
  }
}
