package org.evenbeam.metrology;

import org.evenbeam.stats.Arguments;

/**
 * The smallest net weight that a balance may weigh, from its repeatability: {@code factor * max(s,
 * 0.41 d) / tolerance}, which is {@code 2000 max(s, 0.41 d)} by default (USP 41 and Ph. Eur.
 * 2.1.7).
 *
 * @param standardDeviation s of repeated weighings of one load, 0 or more
 * @param resolution d, the scale interval, above 0, in the unit of s
 * @param factor how many standard deviations the tolerance must hold, above 0
 * @param tolerancePercent what they may be of the net weight, in %, above 0 and up to 100
 */
public record MinimumWeight(
    double standardDeviation, double resolution, double factor, double tolerancePercent) {
  /** The pharmacopoeias' number of standard deviations. */
  public static final double USUAL_FACTOR = 2;

  /** The pharmacopoeias' tolerance, in %. */
  public static final double USUAL_TOLERANCE_PERCENT = 0.10;

  /** Below this part of the scale interval a standard deviation only shows the rounding. */
  private static final double LEAST_PART_OF_RESOLUTION = 0.41;

  /**
   * Checks the ranges.
   *
   * @throws IllegalArgumentException if a value is outside its range
   */
  public MinimumWeight {
    Arguments.notNegative("standardDeviation", standardDeviation);
    Arguments.positive("resolution", resolution);
    Arguments.positive("factor", factor);
    Arguments.within("tolerancePercent", tolerancePercent, Double.MIN_NORMAL, 100);
  }

  /**
   * With the pharmacopoeias' factor and tolerance.
   *
   * @throws IllegalArgumentException if a value is outside its range
   */
  public static MinimumWeight of(double standardDeviation, double resolution) {
    return new MinimumWeight(standardDeviation, resolution, USUAL_FACTOR, USUAL_TOLERANCE_PERCENT);
  }

  /** The minimum weight, in the unit of s and d. */
  public double value() {
    return factor * Math.max(standardDeviation, floor()) * 100 / tolerancePercent;
  }

  /** Whether the scale interval decides, because s is below 0.41 d. */
  public boolean isSetByResolution() {
    return standardDeviation < floor();
  }

  private double floor() {
    return LEAST_PART_OF_RESOLUTION * resolution;
  }
}
