package org.evenbeam.stats;

import org.apache.commons.math3.analysis.solvers.BrentSolver;

/**
 * The probability that n readings of a normal instrument, rounded to whole digits, are all equal.
 * All lengths are in units of the resolution.
 */
final class EqualReadings {
  /** Where the sum over cells and its integral agree to more than the solver asks. */
  private static final double SMOOTH_FROM = 100;

  private static final double NEGLIGIBLE = 1e-17;
  private static final double LOG_ACCURACY = 1e-14;
  private static final int MOST_EVALUATIONS = 500;

  private EqualReadings() {}

  /**
   * The sigma at which the largest probability over the position between two digits is alpha. That
   * position is the middle of a cell: no other was larger for n from 2 to 1000 and sigma from 0.03
   * to 6 (a test looks again), and for larger sigma the sum no longer depends on it.
   */
  static double sigmaOfProbability(int n, double alpha) {
    double low = Math.log(centralCellAlone(n, alpha));
    double high = low + 1;
    while (logProbability(n, Math.exp(high)) > Math.log(alpha)) {
      high += 1;
    }
    BrentSolver solver = new BrentSolver(LOG_ACCURACY, LOG_ACCURACY);
    double root =
        solver.solve(
            MOST_EVALUATIONS,
            logSigma -> logProbability(n, Math.exp(logSigma)) - Math.log(alpha),
            low - 1,
            high);
    return Math.exp(root);
  }

  /** The sigma at which the central cell alone has probability alpha: never above the answer. */
  static double centralCellAlone(int n, double alpha) {
    double outside = -Math.expm1(Math.log(alpha) / n);
    return 0.5 / StandardNormal.quantileOfUpperTail(outside / 2);
  }

  /** Logarithm of the probability, the true value being in the middle of a cell. */
  static double logProbability(int n, double sigma) {
    return sigma > SMOOTH_FROM * Math.sqrt(n) ? logIntegral(n, sigma) : logProbability(n, sigma, 0);
  }

  /**
   * Logarithm of the sum over cells, the true value being {@code delta} from the middle of one. The
   * cells are taken relative to the most probable one, so that no nth power underflows.
   */
  static double logProbability(int n, double sigma, double delta) {
    double central = cell(sigma, delta);
    double sum = 1;
    double pair = 1;
    for (int k = 1; pair > sum * NEGLIGIBLE; k++) {
      double below = cell(sigma, k - delta) / central;
      double above = cell(sigma, k + delta) / central;
      pair = Math.pow(below, n) + Math.pow(above, n);
      sum += pair;
    }
    return n * Math.log(central) + Math.log(sum);
  }

  private static double cell(double sigma, double distance) {
    return StandardNormal.between((distance - 0.5) / sigma, (distance + 0.5) / sigma);
  }

  /**
   * The sum as an integral over the density's nth power, with the cell's width to first order:
   * {@code n^(-1/2) (2 pi sigma^2)^(-(n-1)/2) (1 - (n-1) / (24 sigma^2))}. The sum differs from it
   * by exp(-2 pi^2 sigma^2 / n), the order left out by (n / sigma^2)^2 / 1000.
   */
  private static double logIntegral(int n, double sigma) {
    return -0.5 * Math.log(n)
        - (n - 1) * (0.5 * Math.log(2 * Math.PI) + Math.log(sigma))
        + Math.log1p(-(n - 1) / (24 * sigma * sigma));
  }
}
