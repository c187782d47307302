package org.evenbeam.verification;

/** A condition of the room that a run records. */
public enum Condition {
  /** In °C. */
  TEMPERATURE,
  /** Relative, in %. */
  HUMIDITY,
  /** Of the air, in hPa. */
  PRESSURE
}
