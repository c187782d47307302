package org.evenbeam.stats.samplesize;

import java.util.OptionalDouble;
import org.evenbeam.stats.Arguments;
import org.evenbeam.stats.StandardNormal;

/** Trials needed to estimate a failure rate. */
public final class TrialsForRate {
  private TrialsForRate() {}

  /**
   * For the half-width of the normal interval of a rate, {@code z^2 p (1 - p) / E^2}. Source: NIST/
   * SEMATECH e-Handbook of Statistical Methods, 7.2.4.2.
   *
   * @param planned the planning value p; where absent {@code p (1 - p)} is taken as 1/4, its
   *     largest
   * @param halfWidth E, above 0 and below 1
   * @param alpha 1 - alpha is the level
   * @throws IllegalArgumentException if an argument is outside its range
   */
  public static ReadingsNeeded forHalfWidth(
      OptionalDouble planned, double halfWidth, double alpha) {
    Arguments.probability("halfWidth", halfWidth);
    double z = StandardNormal.quantileOfUpperTail(Arguments.significance(alpha) / 2);
    double variance = 0.25;
    if (planned.isPresent()) {
      double p = Arguments.probability("planned", planned.getAsDouble());
      variance = p * (1 - p);
    }
    double ratio = z / halfWidth;
    return ReadingsNeeded.roundedUp(ratio * ratio * variance, 1);
  }
}
