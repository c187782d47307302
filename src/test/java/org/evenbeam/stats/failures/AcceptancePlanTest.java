package org.evenbeam.stats.failures;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import org.evenbeam.stats.Shown;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class AcceptancePlanTest {
  /** Clean trials that show 10, 5 and 1 % at 5 %: the smallest n with (1 - p)^n at most 0.05. */
  @ParameterizedTest
  @CsvSource({"0.10,29", "0.05,59", "0.01,299"})
  void cleanTrialsNeeded(double limit, int expected) {
    assertThat(AcceptancePlan.fewestTrials(0, limit, 0.05)).hasValue(expected);
  }

  @ParameterizedTest
  @CsvSource({"1,0.1", "3,0.02", "10,0.3", "0,0.00001"})
  void oneTrialLessIsNotEnough(int acceptance, double limit) {
    int n = AcceptancePlan.fewestTrials(acceptance, limit, 0.05).orElseThrow();

    assertThat(new FailureCount(acceptance, n).bounds(0.05).shownAgainst(limit))
        .isEqualTo(Shown.WITHIN);
    assertThat(new FailureCount(acceptance, n - 1).bounds(0.05).shownAgainst(limit))
        .isEqualTo(Shown.NEITHER);
  }

  @Test
  void whatAMillionTrialsCannotShowIsAbsent() {
    assertThat(AcceptancePlan.fewestTrials(0, 1e-9, 0.05)).isEmpty();
    assertThat(AcceptancePlan.fewestTrials(2_000_000, 0.5, 0.05)).isEmpty();
    assertThat(AcceptancePlan.fewest(0.1, 0.05, 0.1000001, 0.05)).isEmpty();
  }

  @Test
  void theFewestTrialsMeetBothRisks() {
    AcceptancePlan plan = AcceptancePlan.fewest(0.01, 0.05, 0.08, 0.1).orElseThrow();

    assertThat(plan.passes(0.01)).isGreaterThanOrEqualTo(0.95);
    assertThat(plan.passes(0.08)).isLessThanOrEqualTo(0.1);
    for (int n = 1; n < plan.n(); n++) {
      for (int c = 0; c <= n; c++) {
        AcceptancePlan smaller = new AcceptancePlan(n, c);
        assertThat(smaller.passes(0.01) >= 0.95 && smaller.passes(0.08) <= 0.1).isFalse();
      }
    }
  }

  @Test
  void atTheDetectableRateATenthPasses() {
    AcceptancePlan plan = new AcceptancePlan(50, 2);

    assertThat(plan.passes(plan.detectableRate(0.1))).isEqualTo(0.1, within(1e-12));
    assertThat(new AcceptancePlan(3, 3).detectableRate(0.1)).isEqualTo(1.0);
  }

  @Test
  void badArgumentsAreNamed() {
    assertThatThrownBy(() -> new AcceptancePlan(3, 4)).hasMessageStartingWith("acceptance is 4");
    assertThatThrownBy(() -> AcceptancePlan.fewest(0.2, 0.05, 0.1, 0.05))
        .hasMessageStartingWith("goodRate is 0.2");
  }
}
