package org.evenbeam.verification.plan;

/**
 * The conditions under which a plan's verdict holds.
 *
 * @param temperature of the room, in °C
 * @param humidity relative, in %
 * @param pressure of the air, in hPa
 */
public record EnvironmentLimits(Bounds temperature, Bounds humidity, Bounds pressure) {
  /** Nothing is asked of the room. */
  public static final EnvironmentLimits NONE =
      new EnvironmentLimits(Bounds.NONE, Bounds.NONE, Bounds.NONE);
}
