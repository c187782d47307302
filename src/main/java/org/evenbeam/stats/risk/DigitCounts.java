package org.evenbeam.stats.risk;

import org.evenbeam.stats.StandardNormal;

/**
 * The joint distribution of the sum and the sum of squares of n normal readings rounded to whole
 * digits, the true value lying {@code position} above a digit. Built by adding one reading after
 * the other; outcomes too rare to matter are cut off. All in units of the resolution.
 */
final class DigitCounts {
  private static final double NEGLIGIBLE = 1e-16;
  private static final double MOST_LOST = 1e-10;
  private static final double TOO_RARE = 1e-10;
  private static final int WIDENINGS = 8;

  /** Steps of work at one position that are still quick. */
  private static final double MOST_WORK = 4e7;

  private final int n;
  private final int largestSum;
  private final int largestSquares;
  private double[] chances;

  private DigitCounts(int n, int largestSum, int largestSquares) {
    this.n = n;
    this.largestSum = largestSum;
    this.largestSquares = largestSquares;
    this.chances = new double[(2 * largestSum + 1) * (largestSquares + 1)];
  }

  /** Receives one outcome. */
  interface Visitor {
    void visit(int sum, int squares, double chance);
  }

  /** The distribution for a true value {@code position}, -1/2 to 1/2, above a digit. */
  static DigitCounts of(int n, double sigma, double position) {
    double[] digits = digits(sigma, position);
    double width = 1;
    DigitCounts counts = reaching(n, sigma, position, width);
    counts.addReadings(digits);
    for (int i = 0; i < WIDENINGS && 1 - counts.total() > MOST_LOST; i++) {
      width *= 1.5;
      counts = reaching(n, sigma, position, width);
      counts.addReadings(digits);
    }
    return counts;
  }

  /**
   * Whether the table is made quickly; the work grows with the square of the number of readings.
   */
  static boolean affordable(int n, double sigma) {
    double[] sides = sides(n, sigma, 0.5, 1);
    return 2 * sides[0] * sides[1] * n * digits(sigma, 0.5).length <= MOST_WORK;
  }

  /** A table that reaches about eight standard deviations beyond the means. */
  private static DigitCounts reaching(int n, double sigma, double position, double width) {
    double[] sides = sides(n, sigma, position, width);
    return new DigitCounts(n, (int) Math.ceil(sides[0]), (int) Math.ceil(sides[1]));
  }

  /** The largest sum and the largest sum of squares. */
  private static double[] sides(int n, double sigma, double position, double width) {
    double square = sigma * sigma + position * position + 1.0 / 12;
    double sums = Math.abs(position) * n + width * 8 * Math.sqrt(n * square) + 2;
    double squares = n * square + width * 8 * (Math.sqrt(2.0 * n) * square + square) + 4;
    return new double[] {sums, squares};
  }

  /** The chances of the digits -reach to reach. */
  private static double[] digits(double sigma, double position) {
    int reach = 1;
    while (StandardNormal.upperTail((reach + 0.5 - Math.abs(position)) / sigma) > NEGLIGIBLE) {
      reach++;
    }
    double[] digits = new double[2 * reach + 1];
    for (int k = -reach; k <= reach; k++) {
      double low = (k - 0.5 - position) / sigma;
      digits[k + reach] = StandardNormal.between(low, (k + 0.5 - position) / sigma);
    }
    return digits;
  }

  private void addReadings(double[] digits) {
    chances[index(0, 0)] = 1;
    for (int i = 0; i < n; i++) {
      double[] before = chances;
      chances = new double[before.length];
      int reach = Math.min(largestSum, (i + 1) * digits.length / 2);
      for (int sum = -reach; sum <= reach; sum++) {
        for (int squares = 0; squares <= largestSquares; squares++) {
          addReading(digits, sum, squares, before[index(sum, squares)]);
        }
      }
    }
  }

  private void addReading(double[] digits, int sum, int squares, double chance) {
    if (chance < NEGLIGIBLE) {
      return;
    }
    int reach = digits.length / 2;
    for (int k = -reach; k <= reach; k++) {
      if (Math.abs(sum + k) <= largestSum && squares + k * k <= largestSquares) {
        chances[index(sum + k, squares + k * k)] += chance * digits[k + reach];
      }
    }
  }

  private int index(int sum, int squares) {
    return (sum + largestSum) * (largestSquares + 1) + squares;
  }

  private double total() {
    double total = 0;
    for (double chance : chances) {
      total += chance;
    }
    return total;
  }

  /** Shows each outcome that is not too rare to matter. */
  void forEach(Visitor visitor) {
    for (int sum = -largestSum; sum <= largestSum; sum++) {
      for (int squares = 0; squares <= largestSquares; squares++) {
        double chance = chances[index(sum, squares)];
        if (chance > TOO_RARE) {
          visitor.visit(sum, squares, chance);
        }
      }
    }
  }
}
