package org.evenbeam.stats;

/** Checks of arguments. Each message has the argument's name, its value and the allowed range. */
public final class Arguments {
  /** The smallest significance level that is accepted. */
  public static final double SMALLEST_ALPHA = 1e-12;

  /** The largest significance level that is accepted. */
  public static final double LARGEST_ALPHA = 0.5;

  private Arguments() {}

  /**
   * Refuses what is not a finite number.
   *
   * @throws IllegalArgumentException if {@code value} is infinite or not a number
   */
  public static double finite(String name, double value) {
    return require(Double.isFinite(value), name, value, "a finite number");
  }

  /**
   * Refuses what is not a finite number above zero.
   *
   * @throws IllegalArgumentException if {@code value} is not in (0, infinity)
   */
  public static double positive(String name, double value) {
    return require(value > 0 && Double.isFinite(value), name, value, "a finite number above 0");
  }

  /**
   * Refuses what is not a finite number of at least zero.
   *
   * @throws IllegalArgumentException if {@code value} is not in [0, infinity)
   */
  public static double notNegative(String name, double value) {
    return require(value >= 0 && Double.isFinite(value), name, value, "a finite number, 0 or more");
  }

  /**
   * Refuses what is not within a closed range.
   *
   * @throws IllegalArgumentException if {@code value} is not in [low, high]
   */
  public static double within(String name, double value, double low, double high) {
    return require(value >= low && value <= high, name, value, low + " to " + high);
  }

  /**
   * Refuses what is not a probability strictly between zero and one.
   *
   * @throws IllegalArgumentException if {@code value} is not in (0, 1)
   */
  public static double probability(String name, double value) {
    return require(value > 0 && value < 1, name, value, "above 0 and below 1");
  }

  /**
   * Refuses a significance level outside [1e-12, 0.5].
   *
   * @throws IllegalArgumentException if {@code alpha} is outside
   */
  public static double significance(double alpha) {
    boolean allowed = alpha >= SMALLEST_ALPHA && alpha <= LARGEST_ALPHA;
    return require(allowed, "alpha", alpha, "1e-12 to 0.5");
  }

  /**
   * Refuses degrees of freedom below one half; infinity means a value known without doubt. One half
   * is what GUM G.4.2 gives where an uncertainty is itself in doubt by all of its size.
   *
   * @throws IllegalArgumentException if {@code value} is below 0.5 or not a number
   */
  public static double degreesOfFreedom(double value) {
    return require(value >= 0.5, "degreesOfFreedom", value, "0.5 or more, infinity included");
  }

  /**
   * Refuses a count below a smallest one.
   *
   * @throws IllegalArgumentException if {@code value} is below {@code smallest}
   */
  public static int atLeast(String name, int value, int smallest) {
    if (value < smallest) {
      throw new IllegalArgumentException(name + " is " + value + ", allowed: " + smallest + "+");
    }
    return value;
  }

  private static double require(boolean allowed, String name, double value, String range) {
    if (!allowed) {
      throw new IllegalArgumentException(name + " is " + value + ", allowed: " + range);
    }
    return value;
  }
}
