package org.evenbeam.stats;

/**
 * One standard uncertainty, already multiplied by its sensitivity coefficient, with the degrees of
 * freedom that say how well it is itself known.
 *
 * @param standardUncertainty 0 or more
 * @param degreesOfFreedom 0.5 to infinity
 */
public record UncertaintyComponent(double standardUncertainty, double degreesOfFreedom) {
  /**
   * Makes a component.
   *
   * @throws IllegalArgumentException if an argument is outside its range
   */
  public UncertaintyComponent {
    Arguments.notNegative("standardUncertainty", standardUncertainty);
    Arguments.degreesOfFreedom(degreesOfFreedom);
  }

  /** A component taken as exactly known, with infinite degrees of freedom. */
  public static UncertaintyComponent known(double standardUncertainty) {
    return new UncertaintyComponent(standardUncertainty, Double.POSITIVE_INFINITY);
  }
}
