package org.evenbeam.stats;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;
import static org.evenbeam.stats.Close.assertClose;

import java.util.List;
import java.util.stream.Stream;
import org.apache.commons.statistics.distribution.ChiSquaredDistribution;
import org.evenbeam.stats.ReferenceTable.Row;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;

/** The library's distributions keep the digits that this package promises. */
class DistributionsTest {
  static Stream<Row> studentUpperTails() {
    return ReferenceTable.rows("r-grid/t_quantile.csv").stream()
        .filter(row -> row.number("p") < 0.5);
  }

  static List<Row> studentTails() {
    return ReferenceTable.rows("r-grid/t_cdf.csv");
  }

  static List<Row> chiSquaredQuantiles() {
    return ReferenceTable.rows("r-grid/chisq_quantile.csv");
  }

  static List<Row> chiSquaredTails() {
    return ReferenceTable.rows("r-grid/chisq_cdf.csv");
  }

  static Stream<Row> coverageFactors() {
    return ReferenceTable.rows("metrology/gum_table_g2.csv").stream();
  }

  @ParameterizedTest
  @MethodSource("studentUpperTails")
  void studentQuantiles(Row row) {
    double t = Student.of(row.number("df")).quantileOfUpperTail(row.number("p"));
    assertClose("t", t, -row.number("q_mp"), 1e-13);
  }

  @ParameterizedTest
  @MethodSource("studentTails")
  void studentProbabilities(Row row) {
    double t = row.number("t");
    assertTail(Student.of(row.number("df")).lowerTail(t), row.number("lower_mp"));
    assertTail(Student.of(row.number("df")).upperTail(t), row.number("upper_mp"));
  }

  /** With one degree of freedom the tail is 1/2 - atan(t) / pi. */
  @ParameterizedTest
  @ValueSource(doubles = {1e-9, 1e-6, 1e-3, 0.004999, 0.005001, -0.004999})
  void studentNearZeroKeepsItsDigits(double t) {
    assertThat(Student.of(1).upperTail(t)).isEqualTo(0.5 - Math.atan(t) / Math.PI, within(1e-14));
  }

  @ParameterizedTest
  @MethodSource("chiSquaredQuantiles")
  void chiSquaredQuantiles(Row row) {
    double p = row.number("p");
    ChiSquaredDistribution chi = ChiSquaredDistribution.of(row.number("df"));
    double quantile =
        p < 0.5 ? chi.inverseCumulativeProbability(p) : chi.inverseSurvivalProbability(1 - p);
    assertClose("chi2", quantile, row.number("q_mp"), 1e-13);
  }

  @ParameterizedTest
  @MethodSource("chiSquaredTails")
  void chiSquaredProbabilities(Row row) {
    ChiSquaredDistribution chi = ChiSquaredDistribution.of(row.number("df"));
    assertTail(chi.cumulativeProbability(row.number("x")), row.number("lower_mp"));
    assertTail(chi.survivalProbability(row.number("x")), row.number("upper_mp"));
  }

  /** Beyond the reach of a double a tail is only asked to be as small. */
  private static void assertTail(double actual, double expected) {
    if (expected < 1e-290) {
      assertThat(actual).isBetween(0.0, 1e-289);
    } else {
      assertClose("tail", actual, expected, 2e-12);
    }
  }

  @ParameterizedTest
  @MethodSource("coverageFactors")
  void coverageFactorsOfTheGum(Row row) {
    double outside = (100 - row.number("p_percent")) / 200;
    double t = Student.of(row.number("nu")).quantileOfUpperTail(outside);
    assertClose("t_p", t, row.number("computed"), 2e-13);
  }

  @ParameterizedTest
  @ValueSource(
      doubles = {0.5, 0.7, 1, 2, 3.5, 17, 400, 1e5, 1e6, 5e6, 1e12, Double.POSITIVE_INFINITY})
  void smallestAndLargestAlphaHaveAQuantile(double degreesOfFreedom) {
    for (double alpha : new double[] {5e-13, 1e-12, 1e-9, 0.3, 0.5}) {
      double t = Student.of(degreesOfFreedom).quantileOfUpperTail(alpha);
      assertThat(t).isFinite().isNotNegative();
      assertClose("alpha", Student.of(degreesOfFreedom).upperTail(t), alpha, 1e-12);
    }
  }
}
