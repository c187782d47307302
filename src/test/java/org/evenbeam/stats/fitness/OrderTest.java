package org.evenbeam.stats.fitness;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;
import static org.evenbeam.stats.Close.assertClose;

import java.math.BigDecimal;
import java.util.List;
import java.util.Locale;
import java.util.stream.Stream;
import org.evenbeam.stats.ExactSample;
import org.evenbeam.stats.ReferenceTable;
import org.evenbeam.stats.ReferenceTable.Row;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;

/** The von Neumann ratio and the slope: whether readings depend on their order. */
class OrderTest {
  static List<Row> probabilities() {
    return ReferenceTable.rows("r-grid/vonneumann_cdf.csv");
  }

  static List<Row> criticalValues() {
    return ReferenceTable.rows("r-grid/vonneumann_critical.csv");
  }

  static List<Row> nistSets() {
    return ReferenceTable.rows("nist-strd/certified.csv");
  }

  private static ExactSample sample(String... readings) {
    return ExactSample.of(Stream.of(readings).map(BigDecimal::new).toList());
  }

  @ParameterizedTest
  @MethodSource("probabilities")
  void probabilitiesAgree(Row row) {
    double p = SuccessiveDifferences.lowerTail(row.count("n"), row.number("ratio"));

    assertThat(p).isEqualTo(row.number("cdf"), within(2e-12));
  }

  @ParameterizedTest
  @MethodSource("criticalValues")
  void criticalValuesHaveTheirProbability(Row row) {
    int n = row.count("n");

    assertThat(SuccessiveDifferences.lowerTail(n, row.number("crit_ss")))
        .isEqualTo(row.number("alpha"), within(1e-11));
    assertThat(SuccessiveDifferences.lowerTail(n, row.number("crit_upper_ss")))
        .isEqualTo(1 - row.number("alpha"), within(1e-11));
  }

  /** With two eigenvalues the ratio is an angle: P = (2 / pi) atan sqrt((r - 1) / (3 - r)). */
  @ParameterizedTest
  @ValueSource(doubles = {1.0001, 1.2, 2, 2.7, 2.9999})
  void threeReadingsHaveAClosedForm(double r) {
    double expected = 2 / Math.PI * Math.atan(Math.sqrt((r - 1) / (3 - r)));

    assertThat(SuccessiveDifferences.lowerTail(3, r)).isEqualTo(expected, within(1e-12));
  }

  @ParameterizedTest
  @ValueSource(doubles = {1.75, 1.8, 1.9, 1.99, 2, 2.05, 2.2})
  void theApproximationForManyReadingsMeetsTheIntegral(double r) {
    double exact = SuccessiveDifferences.lowerTail(1000, r);

    assertThat(SuccessiveDifferences.edgeworth(1000, r)).isEqualTo(exact, within(1e-6));
  }

  @ParameterizedTest
  @MethodSource("nistSets")
  void ratiosOfTheNistSets(Row set) {
    String file = "nist-strd/" + set.text("dataset").toLowerCase(Locale.ROOT) + ".csv";
    ExactSample sample = ExactSample.of(ReferenceTable.decimals(file, "y"));
    VonNeumannRatio ratio = VonNeumannRatio.of(sample).orElseThrow();
    double n = sample.n();

    assertClose("ratio", ratio.statistic(), set.number("vonneumann_mp") * n / (n - 1), 1e-15);
    assertThat(ratio.pLower()).isBetween(0.0, 1.0);
  }

  @Test
  void readingsThatClimbHaveASmallLowerP() {
    VonNeumannRatio climbing =
        VonNeumannRatio.of(sample("1", "2", "3", "4", "5", "6", "7", "8")).orElseThrow();
    VonNeumannRatio alternating =
        VonNeumannRatio.of(sample("1", "8", "2", "7", "1", "8", "2", "7")).orElseThrow();

    assertThat(climbing.pLower()).isLessThan(0.005);
    assertThat(alternating.pUpper()).isLessThan(0.005);
    assertThat(alternating.pTwoSided()).isEqualTo(2 * alternating.pUpper());
  }

  @Test
  void slopeAndItsTestAgree() {
    OrderSlope slope = OrderSlope.of(sample("1.1", "1.9", "3.2", "3.8", "5.3")).orElseThrow();

    // R 4.2.2: summary(lm(c(1.1,1.9,3.2,3.8,5.3) ~ seq(5)))$coefficients[2,]
    assertClose("slope", slope.slope(), 1.03, 1e-14);
    assertClose("standard error", slope.standardError(), 0.07371114795832003, 1e-13);
    assertClose("t", slope.statistic(), 13.973463017865539, 1e-13);
    assertClose("p", slope.p(), 0.0007936131568373453, 1e-12);
    assertThat(slope.degreesOfFreedom()).isEqualTo(3);
  }

  @Test
  void theOffsetCostsNoDigitOfTheSlope() {
    OrderSlope near = OrderSlope.of(sample("1.1", "1.9", "3.2", "3.8", "5.3")).orElseThrow();
    OrderSlope far =
        OrderSlope.of(
                sample(
                    "1000000001.1", "1000000001.9", "1000000003.2", "1000000003.8", "1000000005.3"))
            .orElseThrow();

    assertThat(far).isEqualTo(near);
  }

  @Test
  void readingsOnALineHaveNoDoubt() {
    OrderSlope slope = OrderSlope.of(sample("0.5", "1", "1.5")).orElseThrow();

    assertThat(slope.slope()).isEqualTo(0.5);
    assertThat(slope.p()).isLessThan(1e-7);
    assertThat(OrderSlope.of(sample("1", "3", "1")).orElseThrow().p()).isEqualTo(1.0);
  }

  @Test
  void whatCannotBeAskedIsEmpty() {
    assertThat(VonNeumannRatio.of(sample("1", "2"))).isEmpty();
    assertThat(VonNeumannRatio.of(sample("1", "1", "1"))).isEmpty();
    assertThat(OrderSlope.of(sample("1", "2"))).isEmpty();
    assertThat(OrderSlope.of(sample("1", "1", "1"))).isEmpty();
  }
}
