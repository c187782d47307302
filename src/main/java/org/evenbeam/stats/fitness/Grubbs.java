package org.evenbeam.stats.fitness;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.evenbeam.stats.Arguments;
import org.evenbeam.stats.ExactSample;
import org.evenbeam.stats.Student;

/**
 * Grubbs' test of one reading that lies apart: {@code G = |x - mean| / s}. Source: Grubbs,
 * Technometrics 11 (1969) 1, doi:10.1080/00401706.1969.10490657; ISO 5725-2:1994, 7.3.4; critical
 * values by the formula of NIST/SEMATECH e-Handbook of Statistical Methods, 1.3.5.17.1.
 *
 * @param index the reading, counted from 0 in the order made; the first where several are as far
 * @param n number of readings
 * @param statistic G
 * @param pBound Bonferroni's upper bound of p, at most 1; exact where G is so large that no two
 *     readings could both reach it
 * @param sides 2 where either end was asked, 1 where one end was chosen beforehand
 */
public record Grubbs(int index, int n, double statistic, double pBound, int sides) {
  /** The fewest readings that it takes. */
  public static final int FEWEST = 3;

  /** The reading furthest from the mean on either side; empty below 3 readings or all equal. */
  public static Optional<Grubbs> furthest(ExactSample sample) {
    return of(sample, 2, 0);
  }

  /** The largest reading; empty below 3 readings or all equal. */
  public static Optional<Grubbs> largest(ExactSample sample) {
    return of(sample, 1, 1);
  }

  /** The smallest reading; empty below 3 readings or all equal. */
  public static Optional<Grubbs> smallest(ExactSample sample) {
    return of(sample, 1, -1);
  }

  /**
   * The value of G that is exceeded with a probability of at most alpha.
   *
   * @throws IllegalArgumentException if {@code alpha} is outside 1e-12 to 0.5
   */
  public double critical(double alpha) {
    return critical(n, sides, alpha);
  }

  static double critical(int n, int sides, double alpha) {
    Arguments.significance(alpha);
    double t = Student.of(n - 2).quantileOfUpperTail(alpha / (sides * (double) n));
    return (n - 1) / Math.sqrt(n) / Math.sqrt(1 + (n - 2) / (t * t));
  }

  private static Optional<Grubbs> of(ExactSample sample, int sides, int sign) {
    if (sample.n() < FEWEST || sample.allEqual()) {
      return Optional.empty();
    }
    double[] deviations = sample.deviations();
    int furthest = 0;
    for (int i = 1; i < deviations.length; i++) {
      furthest = size(deviations[i], sign) > size(deviations[furthest], sign) ? i : furthest;
    }
    double g = size(deviations[furthest], sign) / sample.standardDeviation().orElseThrow();
    double bound = Math.min(1, sides * sample.n() * tail(sample, furthest));
    return Optional.of(new Grubbs(furthest, sample.n(), g, bound, sides));
  }

  private static double size(double deviation, int sign) {
    return sign == 0 ? Math.abs(deviation) : sign * deviation;
  }

  /**
   * The probability that one given reading lies as far on one side: G in another form is the t of
   * the reading against the mean of the others, which is exact also where the others are all equal.
   */
  private static double tail(ExactSample sample, int index) {
    List<BigDecimal> readings = new ArrayList<>(sample.readings());
    BigDecimal apart = readings.remove(index);
    ExactSample others = ExactSample.of(readings);
    double error = others.standardDeviation().orElseThrow() * Math.sqrt(1 + 1.0 / others.n());
    return Student.of(sample.n() - 2).upperTail(Math.abs(others.meanMinus(apart)) / error);
  }
}
