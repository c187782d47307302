package org.evenbeam.verification;

import java.util.Optional;
import org.evenbeam.stats.CombinedUncertainty;
import org.evenbeam.stats.Interval;
import org.evenbeam.stats.LimitTest;
import org.evenbeam.stats.Shown;

/**
 * The outcome of the bias criterion.
 *
 * @param uncertainty the standard uncertainty of the bias with its effective degrees of freedom;
 *     empty where the readings give none
 * @param interval of the bias at level 1 − 2α
 * @param test against the limits; empty where not asked or without an uncertainty
 * @param outcome what was decided; empty where not asked or where something is missing
 */
public record BiasFinding(
    Optional<CombinedUncertainty> uncertainty,
    Optional<Interval> interval,
    Optional<LimitTest> test,
    Optional<Verdict> outcome) {

  /** What was shown, where the test could be made. */
  public Optional<Shown> shown() {
    return test.map(LimitTest::shown);
  }
}
