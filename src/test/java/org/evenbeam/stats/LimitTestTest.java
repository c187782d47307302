package org.evenbeam.stats;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.evenbeam.stats.Close.assertClose;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class LimitTestTest {
  private static final double INFINITE = Double.POSITIVE_INFINITY;

  private static Shown shown(double bias, double u, double below, double above) {
    return LimitTest.of(bias, new CombinedUncertainty(u, 9), new BiasLimits(below, above), 0.05)
        .shown();
  }

  /** t at 0.95 with 9 degrees of freedom is 1.8331, so the interval is the bias with 1.8331. */
  @ParameterizedTest
  @CsvSource({
    "0.1,2,2,WITHIN",
    "0.2,2,2,NEITHER",
    "-0.2,2,2,NEITHER",
    "3.8,2,2,NEITHER",
    "3.9,2,2,BEYOND",
    "-3.9,2,2,BEYOND",
    "-3.9,Infinity,2,WITHIN",
    "3.9,Infinity,2,BEYOND",
    "3.9,2,Infinity,WITHIN",
    "-3.9,2,Infinity,BEYOND",
    "1,2,3,WITHIN",
    "1,3,2,NEITHER",
    "-1,3,2,WITHIN",
    "-1,2,3,NEITHER",
    "0,0,0,NEITHER",
    "2,0,0,BEYOND"
  })
  void whatIsShownFollowsTheIntervalOnEachSide(
      double bias, double below, double above, Shown expected) {
    assertThat(shown(bias, 1, below, above)).isEqualTo(expected);
  }

  @ParameterizedTest
  @CsvSource({
    "2,WITHIN",
    "-2,WITHIN",
    "2.0000000000000004,BEYOND",
    "-2.0000000000000004,BEYOND",
    "0,WITHIN"
  })
  void withoutUncertaintyTheLimitItselfIsWithin(double bias, Shown expected) {
    LimitTest test = LimitTest.of(bias, CombinedUncertainty.of(), BiasLimits.symmetric(2), 0.05);

    assertThat(test.shown()).isEqualTo(expected);
    assertThat(test.pNotWithin()).isEqualTo(expected == Shown.WITHIN ? 0.0 : 1.0);
    assertThat(test.interval()).isEqualTo(new Interval(bias, bias));
  }

  @Test
  void theLimitIsClosedForTheInterval() {
    double u = 0.25;
    double halfWidth = Student.of(INFINITE).quantileOfUpperTail(0.05) * u;
    CombinedUncertainty known = new CombinedUncertainty(u, INFINITE);

    assertThat(LimitTest.of(0, known, BiasLimits.symmetric(halfWidth), 0.05).shown())
        .isEqualTo(Shown.WITHIN);
    assertThat(LimitTest.of(0, known, BiasLimits.symmetric(Math.nextDown(halfWidth)), 0.05).shown())
        .isEqualTo(Shown.NEITHER);
  }

  @Test
  void aBoundOnTheLimitDoesNotClearIt() {
    CombinedUncertainty u = new CombinedUncertainty(0.25, 7);
    double bound = LimitTest.of(3, u, BiasLimits.onlyAbove(1), 0.05).interval().low();

    assertThat(LimitTest.of(3, u, BiasLimits.onlyAbove(bound), 0.05).shown())
        .isEqualTo(Shown.NEITHER);
    assertThat(LimitTest.of(-3, u, BiasLimits.onlyBelow(bound), 0.05).shown())
        .isEqualTo(Shown.NEITHER);
    assertThat(LimitTest.of(3, u, BiasLimits.onlyAbove(Math.nextDown(bound)), 0.05).shown())
        .isEqualTo(Shown.BEYOND);
  }

  @Test
  void aSideWithoutLimitAsksNothing() {
    LimitTest test = LimitTest.of(5, new CombinedUncertainty(1, 4), BiasLimits.onlyAbove(7), 0.05);

    assertThat(test.pLower()).isZero();
    assertThat(test.statisticLower()).isEqualTo(INFINITE);
    // R 4.2.2: pt(-2, 4)
    assertClose("p", test.pUpper(), 0.05805826175840775, 1e-14);
    assertThat(
            LimitTest.of(5, new CombinedUncertainty(1, 4), BiasLimits.onlyBelow(1), 0.05).pUpper())
        .isZero();
  }

  @Test
  void infiniteDegreesOfFreedomMakeItNormal() {
    LimitTest test =
        LimitTest.of(0, new CombinedUncertainty(1, INFINITE), BiasLimits.symmetric(2), 0.025);

    // R 4.2.2: pnorm(-2), qnorm(0.975)
    assertClose("p", test.pUpper(), 0.022750131948179212, 1e-15);
    assertClose("critical", test.criticalValue(), 1.959963984540054, 1e-15);
  }

  @Test
  void withinAndTheLargerPAgree() {
    for (double bias = -3; bias <= 3; bias += 0.0137) {
      LimitTest test =
          LimitTest.of(bias, new CombinedUncertainty(0.4, 5), new BiasLimits(1.5, 2), 0.05);
      assertThat(test.shown() == Shown.WITHIN).isEqualTo(test.pNotWithin() <= 0.05);
      boolean beyond = 1 - test.pUpper() < 0.05 || 1 - test.pLower() < 0.05;
      assertThat(test.shown() == Shown.BEYOND).isEqualTo(beyond);
    }
  }

  @Test
  void badLimitsAreRefused() {
    assertThatThrownBy(() -> new BiasLimits(-1, 1)).hasMessageContaining("-1.0 and 1.0");
    assertThatThrownBy(() -> new BiasLimits(1, Double.NaN)).hasMessageContaining("NaN");
    assertThatThrownBy(() -> BiasLimits.symmetric(INFINITE)).hasMessageContaining("both sides");
    assertThatThrownBy(() -> new Interval(2, 1)).hasMessageContaining("no points");
  }
}
