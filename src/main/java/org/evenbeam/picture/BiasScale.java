package org.evenbeam.picture;

import java.math.BigDecimal;
import java.util.List;
import java.util.Optional;
import org.evenbeam.stats.Interval;
import org.evenbeam.verification.CheckPointQuestion;
import org.evenbeam.verification.Criteria;

/**
 * Where a bias lies across the picture. The limits lie well inside; interval and readings widen the
 * scale only so far that the limits stay easy to tell apart, and what is farther out is left out.
 */
record BiasScale(double zero, double perUnit, double left, double right) {
  /** The picture goes at least that far beyond a limit, as a multiple of it. */
  private static final double ROOM = 1.3;

  /** And at most that far, as a multiple of the larger limit. */
  private static final double MOST = 2.5;

  /** Without limits the interval takes their place. */
  private static final double MOST_WITHOUT_LIMITS = 4;

  private static final double OTHER_SIDE = 0.4;

  /** How many multiples of the resolution to show where there is nothing else to go by. */
  private static final double STEPS = 5;

  /**
   * A scale between {@code left} and {@code right}, with the zero no nearer to the picture's ends
   * than asked.
   */
  static BiasScale of(
      CheckPointQuestion question,
      List<BigDecimal> deviations,
      Optional<Interval> interval,
      Interval across,
      Interval allowedZero) {
    Reach below = new Reach(question, deviations, interval, -1);
    Reach above = new Reach(question, deviations, interval, 1);
    double low = below.length();
    double high = above.length();
    if (low + high == 0) {
      low = STEPS * question.resolution().map(BigDecimal::doubleValue).orElse(1.0);
      high = low;
    }
    double span = across.high() - across.low();
    double wished = across.low() + span * (low / (low + high));
    double zero = Math.min(Math.max(wished, allowedZero.low()), allowedZero.high());
    double perUnit = Math.min(ratio(zero - across.low(), low), ratio(across.high() - zero, high));
    return new BiasScale(zero, perUnit, across.low(), across.high());
  }

  private static double ratio(double length, double value) {
    return value == 0 ? Double.POSITIVE_INFINITY : length / value;
  }

  /** Where that bias lies, whether or not the picture goes so far. */
  double x(double bias) {
    return zero + bias * perUnit;
  }

  /** The same, held at the picture's ends. */
  double held(double bias) {
    return Math.min(Math.max(x(bias), left), right);
  }

  boolean isLeftOut(double bias) {
    return isBelow(bias) || isAbove(bias);
  }

  boolean isBelow(double bias) {
    return x(bias) < left - slack();
  }

  boolean isAbove(double bias) {
    return x(bias) > right + slack();
  }

  private double slack() {
    return (right - left) * 1e-9;
  }

  /** How far the scale must go on one side; the side is −1 or 1. */
  private record Reach(
      CheckPointQuestion question,
      List<BigDecimal> deviations,
      Optional<Interval> interval,
      int side) {
    double length() {
      Criteria criteria = question.criteria();
      double own = number(side < 0 ? criteria.biasBelow() : criteria.biasAbove());
      double other = number(side < 0 ? criteria.biasAbove() : criteria.biasBelow());
      double least = own > 0 ? ROOM * own : OTHER_SIDE * other;
      return Math.max(least, Math.min(farthest() * 1.05, most(Math.max(own, other))));
    }

    private double most(double limit) {
      if (limit > 0) {
        return MOST * limit;
      }
      return interval
          .map(i -> MOST_WITHOUT_LIMITS * Math.max(Math.abs(i.low()), Math.abs(i.high())))
          .filter(most -> most > 0)
          .orElse(Double.MAX_VALUE);
    }

    private double farthest() {
      double readings =
          deviations.stream().mapToDouble(d -> side * d.doubleValue()).max().orElse(0);
      double end = interval.map(i -> side < 0 ? -i.low() : i.high()).orElse(0.0);
      return Math.max(0, Math.max(readings, end));
    }

    private static double number(Optional<BigDecimal> limit) {
      return limit.map(BigDecimal::doubleValue).orElse(0.0);
    }
  }
}
