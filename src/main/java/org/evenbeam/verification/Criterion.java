package org.evenbeam.verification;

/** What a check point asks of an instrument. */
public enum Criterion {
  /** Systematic error against the maximum permissible bias (VIM 4.20, instrumental bias). */
  BIAS,
  /**
   * Within-run repeatability against the maximum permissible standard deviation (VIM 2.20, 2.21).
   */
  PRECISION
}
