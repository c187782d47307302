package org.evenbeam.stats.risk;

import org.evenbeam.stats.Arguments;
import org.evenbeam.stats.Interval;
import org.evenbeam.stats.StandardNormal;

/**
 * The noncentral t distribution, that of {@code (Z + delta) / v} with Z normal and v = s / sigma,
 * as the integral of {@code Phi(t v - delta)} over the density of v. Source: Johnson, Kotz,
 * Balakrishnan, Continuous Univariate Distributions 2, 2nd ed., 31.2. Absolute error below 1e-13.
 */
public final class NoncentralT {
  /** Beyond it Phi is 0 or 1 to all digits. */
  private static final double FLAT = 9;

  private static final double PANEL_OF_PHI = 4;

  private final SpreadRatio ratio;
  private final double noncentrality;

  private NoncentralT(SpreadRatio ratio, double noncentrality) {
    this.ratio = ratio;
    this.noncentrality = noncentrality;
  }

  /**
   * The distribution for the given parameters.
   *
   * @param degreesOfFreedom 0.5 or more, finite
   * @param noncentrality any finite number
   * @throws IllegalArgumentException if an argument is outside its range
   */
  public static NoncentralT of(double degreesOfFreedom, double noncentrality) {
    Arguments.finite("degreesOfFreedom", Arguments.degreesOfFreedom(degreesOfFreedom));
    Arguments.finite("noncentrality", noncentrality);
    return new NoncentralT(new SpreadRatio(degreesOfFreedom), noncentrality);
  }

  /** The probability of a value of {@code t} or less. */
  public double lowerTail(double t) {
    double sum = 0;
    for (Interval panel : Panels.halved(ratio.support(), (from, to) -> tooWide(t, from, to))) {
      for (Panels.Node node : Panels.nodes(panel, ratio::density)) {
        sum += node.weight() * StandardNormal.lowerTail(t * node.at() - noncentrality);
      }
    }
    return Math.min(1, sum);
  }

  /** The probability of a value of {@code t} or more. */
  public double upperTail(double t) {
    return new NoncentralT(ratio, -noncentrality).lowerTail(-t);
  }

  private boolean tooWide(double t, double from, double to) {
    double move = Math.abs(bounded(t * to - noncentrality) - bounded(t * from - noncentrality));
    return to - from > ratio.smoothWidth() || move > PANEL_OF_PHI;
  }

  private static double bounded(double argument) {
    return Math.max(-FLAT, Math.min(FLAT, argument));
  }
}
