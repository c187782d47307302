package org.evenbeam.stats;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.evenbeam.stats.Close.assertClose;

import java.util.List;
import java.util.Random;
import org.apache.commons.statistics.distribution.NormalDistribution;
import org.evenbeam.stats.ReferenceTable.Row;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;

class EqualReadingsBoundTest {
  private static final NormalDistribution NORMAL = NormalDistribution.of(0, 1);

  static List<Row> bounds() {
    return ReferenceTable.rows("r-grid/equal_readings_bound.csv");
  }

  @ParameterizedTest
  @MethodSource("bounds")
  void boundsAgree(Row row) {
    EqualReadingsBound bound = EqualReadingsBound.of(row.count("n"), 1, row.number("alpha"));

    assertClose("sigma_U / d", bound.upperBound(), row.number("sigma_upper_over_d"), 2e-11);
  }

  @Test
  void theBoundScalesWithTheResolution() {
    double relative = EqualReadingsBound.of(5, 1, 0.05).upperBound();

    assertClose(
        "sigma_U", EqualReadingsBound.of(5, 1e-4, 0.05).upperBound(), relative * 1e-4, 1e-15);
  }

  @ParameterizedTest
  @ValueSource(ints = {2, 3, 4, 10, 100, 1000, 30_000, 1_000_000})
  void everyLegalLevelHasABoundAboveThatOfTheCentralCell(int n) {
    double previous = Double.POSITIVE_INFINITY;
    for (double alpha : new double[] {1e-12, 1e-9, 1e-6, 1e-4, 0.01, 0.05, 0.2, 0.5}) {
      double bound = EqualReadingsBound.of(n, 1, alpha).upperBound();

      assertThat(bound).isFinite().isLessThan(previous);
      assertThat(bound)
          .isGreaterThanOrEqualTo(EqualReadings.centralCellAlone(n, alpha) * 0.9999999);
      assertClose("alpha", Math.exp(EqualReadings.logProbability(n, bound)), alpha, 1e-9);
      previous = bound;
    }
  }

  @ParameterizedTest
  @ValueSource(ints = {2, 3, 4, 5, 10, 50, 1000})
  void noPositionBetweenDigitsIsMoreLikelyThanTheMiddleOfACell(int n) {
    for (double sigma = 0.05; sigma < 8; sigma *= 1.3) {
      double middle = EqualReadings.logProbability(n, sigma, 0);
      for (double delta = 0.01; delta <= 0.5; delta += 0.01) {
        assertThat(EqualReadings.logProbability(n, sigma, delta)).isLessThan(middle + 1e-12);
      }
    }
  }

  @ParameterizedTest
  @ValueSource(ints = {2, 3, 10, 30})
  void sumAndIntegralMeet(int n) {
    double sigma = 100 * Math.sqrt(n);

    double summed = EqualReadings.logProbability(n, sigma, 0);
    double integrated = EqualReadings.logProbability(n, Math.nextUp(sigma));

    assertThat(integrated).isBetween(summed - 1e-10, summed + 1e-10);
  }

  @Test
  void aSimulatedInstrumentAtTheBoundShowsEqualReadingsAtAlpha() {
    Random random = new Random(41);
    double sigma = EqualReadingsBound.of(3, 1, 0.05).upperBound();
    int trials = 200_000;
    int equal = 0;
    for (int i = 0; i < trials; i++) {
      long shown =
          random
              .doubles(3)
              .map(NORMAL::inverseCumulativeProbability)
              .mapToLong(z -> Math.round(sigma * z))
              .distinct()
              .count();
      if (shown == 1) {
        equal++;
      }
    }
    // four standard errors of the simulated share
    assertThat((double) equal / trials).isBetween(0.05 - 0.00195, 0.05 + 0.00195);
  }

  @Test
  void equalReadingsNeverShowTheLimitExceeded() {
    EqualReadingsBound bound = EqualReadingsBound.of(10, 0.1, 0.05);

    assertThat(bound.shownAgainst(bound.upperBound())).isEqualTo(Shown.WITHIN);
    assertThat(bound.shownAgainst(Math.nextDown(bound.upperBound()))).isEqualTo(Shown.NEITHER);
    assertThat(bound.shownAgainst(1e-9)).isEqualTo(Shown.NEITHER);
  }

  @Test
  void badArgumentsAreNamed() {
    assertThatThrownBy(() -> EqualReadingsBound.of(1, 1, 0.05)).hasMessageStartingWith("n is 1");
    assertThatThrownBy(() -> EqualReadingsBound.of(2, 0, 0.05))
        .hasMessageStartingWith("resolution is 0.0");
    assertThatThrownBy(() -> EqualReadingsBound.of(2, 1, 1e-13)).hasMessageStartingWith("alpha is");
  }
}
