package org.evenbeam.stats.fitness;

import java.util.Optional;
import org.apache.commons.math3.stat.regression.SimpleRegression;
import org.evenbeam.stats.ExactSample;
import org.evenbeam.stats.Student;

/**
 * The straight line through the readings in their order, and the t test of its slope. Source:
 * NIST/SEMATECH e-Handbook of Statistical Methods, 4.1.4.1.
 *
 * @param slope change from one reading to the next
 * @param standardError its standard error; 0 where the readings lie on a line
 * @param statistic t, infinite where the readings lie on a line
 * @param degreesOfFreedom n - 2
 * @param p two-sided: small where the readings climb or fall
 */
public record OrderSlope(
    double slope, double standardError, double statistic, int degreesOfFreedom, double p) {
  /** The fewest readings that it takes. */
  public static final int FEWEST = 3;

  /** Fits readings against their order; empty below 3 readings or where all are equal. */
  public static Optional<OrderSlope> of(ExactSample sample) {
    if (sample.n() < FEWEST || sample.allEqual()) {
      return Optional.empty();
    }
    SimpleRegression regression = new SimpleRegression();
    double[] deviations = sample.deviations();
    for (int i = 0; i < deviations.length; i++) {
      regression.addData(i, deviations[i]);
    }
    double slope = regression.getSlope();
    double error = regression.getSlopeStdErr();
    double t = slope == 0 ? 0 : slope / error;
    int freedom = sample.n() - 2;
    double p = Math.min(1, 2 * Student.of(freedom).upperTail(Math.abs(t)));
    return Optional.of(new OrderSlope(slope, error, t, freedom, p));
  }
}
