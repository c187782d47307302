package org.evenbeam.stats;

/** What readings have shown about a limit, at the significance level of the test. */
public enum Shown {
  /** The true value has been shown to be within the limit. */
  WITHIN,
  /** The true value has been shown to be beyond the limit. */
  BEYOND,
  /** Neither has been shown. */
  NEITHER
}
