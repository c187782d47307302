package org.evenbeam.stats;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.evenbeam.stats.Close.assertClose;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class VarianceTestTest {
  /** For n = 10 the bounds at 0.05 are s times 0.7294 and 1.6453. */
  @ParameterizedTest
  @CsvSource({"1.7,WITHIN", "1.6,NEITHER", "0.73,NEITHER", "0.72,BEYOND"})
  void whatIsShownFollowsTheOneSidedBounds(double limit, Shown expected) {
    VarianceTest test = VarianceTest.of(1, 10, limit, 0.05);

    assertThat(test.shown()).isEqualTo(expected);
    assertThat(test.statistic() <= test.criticalLower()).isEqualTo(expected == Shown.WITHIN);
    assertThat(test.statistic() > test.criticalUpper()).isEqualTo(expected == Shown.BEYOND);
    assertThat(test.pLower() <= 0.05).isEqualTo(expected == Shown.WITHIN);
    assertThat(test.pUpper() < 0.05).isEqualTo(expected == Shown.BEYOND);
  }

  @Test
  void theLimitIsClosed() {
    StandardDeviationBounds bounds = StandardDeviationBounds.of(0.3, 7, 0.05);

    assertThat(bounds.shownAgainst(bounds.upperBound())).isEqualTo(Shown.WITHIN);
    assertThat(bounds.shownAgainst(bounds.lowerBound())).isEqualTo(Shown.NEITHER);
    assertThat(bounds.shownAgainst(Math.nextDown(bounds.lowerBound()))).isEqualTo(Shown.BEYOND);
  }

  @Test
  void oneSidedBoundsAreTheEndsOfTheIntervalAtTwiceAlpha() {
    StandardDeviationBounds bounds = StandardDeviationBounds.of(2, 6, 0.05);
    Interval wider = StandardDeviationBounds.of(2, 6, 0.1).interval();

    assertThat(new Interval(bounds.lowerBound(), bounds.upperBound())).isEqualTo(wider);
  }

  @Test
  void theFloorRaisesOnlyTheOneSidedUpperBound() {
    StandardDeviationBounds bounds = StandardDeviationBounds.of(0.1, 10, 0.05);
    StandardDeviationBounds raised = bounds.raisedTo(0.45);

    assertThat(raised.upperBound()).isEqualTo(0.45);
    assertThat(raised.interval()).isEqualTo(bounds.interval());
    assertThat(raised.lowerBound()).isEqualTo(bounds.lowerBound());
    assertThat(raised.raisedTo(0.2)).isEqualTo(raised);
    assertThat(VarianceTest.of(bounds, 0.4).shown()).isEqualTo(Shown.WITHIN);
    assertThat(VarianceTest.of(raised, 0.4).shown()).isEqualTo(Shown.NEITHER);
  }

  @ParameterizedTest
  @ValueSource(ints = {2, 3, 30, 1000, 1_000_000})
  void everyLegalLevelHasFiniteBounds(int n) {
    for (double alpha : new double[] {1e-12, 1e-6, 0.05, 0.5}) {
      StandardDeviationBounds bounds = StandardDeviationBounds.of(1, n, alpha);
      VarianceTest at = VarianceTest.of(bounds, bounds.upperBound());

      assertThat(bounds.interval().low()).isPositive().isLessThanOrEqualTo(bounds.lowerBound());
      assertThat(bounds.interval().high()).isFinite().isGreaterThanOrEqualTo(bounds.upperBound());
      assertClose("p at the bound", at.pLower(), alpha, 1e-9);
    }
  }

  @Test
  void badArgumentsAreNamed() {
    assertThatThrownBy(() -> VarianceTest.of(0, 5, 1, 0.05))
        .hasMessageStartingWith("standardDeviation is 0.0");
    assertThatThrownBy(() -> VarianceTest.of(1, 5, 0, 0.05)).hasMessageStartingWith("limit is 0.0");
    assertThatThrownBy(() -> VarianceTest.of(1, 1, 1, 0.05)).hasMessageStartingWith("n is 1");
    assertThatThrownBy(() -> StandardDeviationBounds.of(1, 5, 0.05).raisedTo(-1))
        .hasMessageStartingWith("floor is -1.0");
  }
}
