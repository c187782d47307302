package org.evenbeam.stats.risk;

/**
 * The chance of each verdict; the three add up to one.
 *
 * @param conforms chance of CONFORMS
 * @param doesNotConform chance of DOES NOT CONFORM
 */
public record VerdictChances(double conforms, double doesNotConform) {
  /** Chances from those of two nested events, rounding errors of the sums removed. */
  static VerdictChances ofNested(double conforms, double notRejected) {
    double passes = Math.min(1, Math.max(0, conforms));
    double remains = Math.min(1, Math.max(passes, notRejected));
    return new VerdictChances(passes, 1 - remains);
  }

  /** The chance of UNDECIDED. */
  public double undecided() {
    return Math.max(0, 1 - conforms - doesNotConform);
  }

  /** The chance that the verdict is not CONFORMS. */
  public double doesNotPass() {
    return 1 - conforms;
  }
}
