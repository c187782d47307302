package org.evenbeam.metrology;

/** How a stated half-width becomes a standard uncertainty (GUM 4.3). */
public enum Spread {
  /** The stated value is already a standard uncertainty. */
  NORMAL(1),
  /** Equal chance within plus or minus the stated value (GUM 4.3.7). */
  RECTANGULAR(Math.sqrt(3)),
  /** Most often near the middle (GUM 4.3.9). */
  TRIANGULAR(Math.sqrt(6));

  private final double divisor;

  Spread(double divisor) {
    this.divisor = divisor;
  }

  /** What the stated value is divided by. */
  public double divisor() {
    return divisor;
  }
}
