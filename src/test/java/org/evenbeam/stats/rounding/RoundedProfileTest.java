package org.evenbeam.stats.rounding;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;
import static org.evenbeam.stats.Close.assertClose;

import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.Arrays;
import java.util.List;
import java.util.Random;
import java.util.stream.IntStream;
import org.apache.commons.statistics.distribution.ChiSquaredDistribution;
import org.evenbeam.stats.ExactSample;
import org.evenbeam.stats.Interval;
import org.evenbeam.stats.ReferenceTable;
import org.evenbeam.stats.ReferenceTable.Row;
import org.evenbeam.stats.StandardNormal;
import org.evenbeam.stats.StudentTTest;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;

class RoundedProfileTest {
  private static ExactSample sample(double... readings) {
    return ExactSample.of(Arrays.stream(readings).mapToObj(BigDecimal::valueOf).toList());
  }

  private static RoundedProfile profile(double resolution, double... readings) {
    return RoundedProfile.of(sample(readings), resolution, 0.05).orElseThrow();
  }

  /** Where the resolution is fine, the interval of the mean is that of the t test. */
  @ParameterizedTest
  @ValueSource(doubles = {1e-12, 0.05, 0.4})
  void fineReadingsHaveTheClassicalInterval(double alpha) {
    ExactSample readings = sample(9.1, 10.4, 11.3, 9.8, 10.1, 12.0);
    double s = readings.standardDeviation().orElseThrow();
    RoundedProfile profile = RoundedProfile.of(readings, 1e-4, alpha).orElseThrow();
    Interval classical = StudentTTest.of(0, s, 6, alpha).interval();

    assertClose("low", profile.mean().low(), classical.low(), 1e-6);
    assertClose("high", profile.mean().high(), classical.high(), 1e-6);
  }

  /**
   * Both ends of sigma's interval have one likelihood, and chi-square lies between with 1 - alpha.
   */
  @ParameterizedTest
  @CsvSource({"6,0.05", "3,0.01", "40,0.3"})
  void fineReadingsHaveAnIntervalOfSigmaOfTheRightLevel(int n, double alpha) {
    double[] readings = IntStream.range(0, n).mapToDouble(i -> (i * i) % 7 + i / 3.0).toArray();
    ExactSample sample =
        ExactSample.of(
            Arrays.stream(readings)
                .mapToObj(x -> new BigDecimal(x).setScale(3, RoundingMode.HALF_EVEN))
                .toList());
    Interval sigma = RoundedProfile.of(sample, 1e-4, alpha).orElseThrow().standardDeviation();
    double squares = sample.sumOfSquaresAboutMean();
    ChiSquaredDistribution chi = ChiSquaredDistribution.of(n - 1);
    double upper = squares / (sigma.low() * sigma.low());
    double lower = squares / (sigma.high() * sigma.high());

    assertThat(chi.probability(lower, upper)).isEqualTo(1 - alpha, within(1e-6));
    assertThat(upper / n - Math.log(upper / n))
        .isEqualTo(lower / n - Math.log(lower / n), within(1e-6));
  }

  /**
   * Ends for coarse readings: likelihood ratios with the thresholds of this class on a fine grid,
   * by scipy 1.17.1 (norm.cdf, minimize_scalar) in scripts/rounded_profile.py.
   */
  @ParameterizedTest
  @MethodSource("coarse")
  void coarseReadingsAgreeWithAnIndependentSearch(Row row) {
    double[] readings =
        Arrays.stream(row.text("readings").split(" ", -1))
            .mapToDouble(Double::parseDouble)
            .toArray();
    RoundedProfile profile =
        RoundedProfile.of(sample(readings), row.number("resolution"), row.number("alpha"))
            .orElseThrow();
    double d = row.number("resolution");

    assertThat(profile.mean().low()).isEqualTo(row.number("mean_low"), within(2e-3 * d));
    assertThat(profile.mean().high()).isEqualTo(row.number("mean_high"), within(2e-3 * d));
    assertThat(profile.standardDeviation().low())
        .isEqualTo(row.number("sigma_low"), within(2e-3 * d));
    assertThat(profile.standardDeviation().high())
        .isEqualTo(row.number("sigma_high"), within(2e-3 * d));
  }

  static List<Row> coarse() {
    return ReferenceTable.rows("rounding/rounded_profile.csv");
  }

  @Test
  void equalReadingsLeaveTheWholeDigitOpen() {
    RoundedProfile profile = profile(0.1, 5, 5, 5, 5, 5, 5, 5, 5, 5, 5);

    assertThat(profile.mean().low()).isEqualTo(-0.05, within(1e-3));
    assertThat(profile.mean().high()).isEqualTo(0.05, within(1e-3));
    assertThat(profile.standardDeviation().low()).isZero();
    assertThat(profile.standardDeviation().high()).isBetween(0.01, 0.1);
  }

  @Test
  void unitsAndOffsetsDoNotMatter() {
    RoundedProfile one = profile(1, 3, 4, 4, 5, 4);
    RoundedProfile other = profile(0.01, 1000.03, 1000.04, 1000.04, 1000.05, 1000.04);

    assertClose("mean", other.mean().high(), one.mean().high() / 100, 1e-7);
    assertClose(
        "sigma", other.standardDeviation().high(), one.standardDeviation().high() / 100, 1e-7);
  }

  /** The interval of the mean covers the true mean about as often as it says. */
  @Test
  void simulatedCoarseReadingsAreCovered() {
    Random random = new Random(20260403);
    int trials = 600;
    int covered = 0;
    for (int i = 0; i < trials; i++) {
      double position = random.nextDouble() - 0.5;
      double[] readings =
          random
              .doubles(6)
              .map(u -> Math.rint(position + 0.5 * StandardNormal.quantileOfUpperTail(1 - u)))
              .toArray();
      ExactSample sample = sample(readings);
      Interval mean = RoundedProfile.of(sample, 1, 0.05).orElseThrow().mean();
      covered += mean.contains(position - sample.mean()) ? 1 : 0;
    }
    assertThat((double) covered / trials).isBetween(0.925, 0.99);
  }

  @ParameterizedTest
  @ValueSource(doubles = {1e-12, 1e-3, 0.5})
  void everyLevelHasIntervalsWithinTheirSense(double alpha) {
    for (double[] readings : new double[][] {{1, 1}, {1, 2}, {1, 50}, {1, 1, 2, 2, 2, 3}}) {
      RoundedProfile profile = RoundedProfile.of(sample(readings), 1, alpha).orElseThrow();

      assertThat(profile.mean().contains(0)).isTrue();
      assertThat(profile.mean().high()).isFinite();
      assertThat(profile.standardDeviation().high()).isFinite().isPositive();
    }
  }

  @Test
  void readingsOfManyValuesAreNotAsked() {
    double[] many = IntStream.range(0, 201).asDoubleStream().toArray();

    assertThat(RoundedProfile.of(sample(many), 1, 0.05)).isEmpty();
    assertThatThrownBy(() -> RoundedProfile.of(sample(1), 1, 0.05))
        .hasMessageStartingWith("number of readings is 1");
  }
}
