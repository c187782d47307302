package org.evenbeam.stats;

import org.apache.commons.statistics.distribution.TDistribution;

/** Student's t distribution; with infinite degrees of freedom it is the normal distribution. */
public final class Student {
  /**
   * Below this t the library's probabilities lose digits, as they are taken at nu / (nu + t^2); the
   * series about zero has all of them.
   */
  private static final double SMALL = 5e-3;

  private final double degreesOfFreedom;
  private final TDistribution distribution;

  private Student(double degreesOfFreedom) {
    this.degreesOfFreedom = degreesOfFreedom;
    this.distribution = TDistribution.of(degreesOfFreedom);
  }

  /**
   * The distribution with the given degrees of freedom.
   *
   * @param degreesOfFreedom 0.5 to infinity
   * @throws IllegalArgumentException if they are outside the range
   */
  public static Student of(double degreesOfFreedom) {
    return new Student(Arguments.degreesOfFreedom(degreesOfFreedom));
  }

  /**
   * The value that t exceeds with the probability {@code upperTail}, taken as it is, so that small
   * tails keep their digits.
   *
   * @param upperTail 0 to 1
   */
  public double quantileOfUpperTail(double upperTail) {
    return distribution.inverseSurvivalProbability(upperTail);
  }

  /** The probability of a value of {@code t} or more. */
  public double upperTail(double t) {
    return Math.abs(t) < small() ? 0.5 - fromZero(t) : distribution.survivalProbability(t);
  }

  /** The probability of a value of {@code t} or less. */
  public double lowerTail(double t) {
    return upperTail(-t);
  }

  private double small() {
    return SMALL * Math.min(1, Math.sqrt(degreesOfFreedom));
  }

  /** The integral of the density from zero to t: three terms of its power series in t. */
  private double fromZero(double t) {
    double reciprocal = 1 / degreesOfFreedom;
    double square = t * t;
    double second = (1 + reciprocal) / 6;
    double fourth = (1 + reciprocal) * (1 + 3 * reciprocal) / 40;
    return distribution.density(0) * t * (1 - square * (second - square * fourth));
  }
}
