package org.evenbeam.stats;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.evenbeam.stats.Close.assertClose;

import java.math.BigDecimal;
import java.util.List;
import java.util.Map;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import org.evenbeam.stats.ReferenceTable.Row;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;

/** The t, chi-square and limit tests on a hundred samples, against 40-digit arithmetic. */
class ClassicalTestsTest {
  private static final double TOLERANCE = 2e-13;
  private static final Map<String, ExactSample> SAMPLES = samples();

  private static Map<String, ExactSample> samples() {
    return ReferenceTable.rows("r-grid/samples100_data.csv").stream()
        .collect(
            Collectors.groupingBy(
                row -> row.text("id"),
                Collectors.collectingAndThen(
                    Collectors.mapping(row -> row.decimal("x"), Collectors.toList()),
                    ExactSample::of)));
  }

  static Stream<Row> varyingSamples() {
    return ReferenceTable.rows("r-grid/samples100_decimal.csv").stream().filter(r -> r.has("t"));
  }

  private static ExactSample sample(Row row) {
    return SAMPLES.get(row.text("id"));
  }

  private static double bias(Row row) {
    return sample(row).meanMinus(row.decimal("mu0"));
  }

  private static double sd(Row row) {
    return sample(row).standardDeviation().orElseThrow();
  }

  @Test
  void allHundredSamplesAreThere() {
    assertThat(SAMPLES).hasSize(100);
    assertThat(varyingSamples().count()).isGreaterThanOrEqualTo(95);
  }

  @ParameterizedTest
  @MethodSource("varyingSamples")
  void momentsAreTheNearestDoubles(Row row) {
    assertThat(sample(row).mean()).isEqualTo(row.number("mean"));
    assertThat(sd(row)).isEqualTo(row.number("sd"));
  }

  @ParameterizedTest
  @MethodSource("varyingSamples")
  void tTestAgrees(Row row) {
    StudentTTest test = StudentTTest.of(bias(row), sd(row), row.count("n"), 0.05);

    assertClose("t", test.statistic(), row.number("t"), TOLERANCE);
    assertClose("two-sided p", test.pTwoSided(), row.number("p_two"), TOLERANCE);
    assertClose("p less", test.pLess(), row.number("p_less"), TOLERANCE);
    assertClose("p greater", test.pGreater(), row.number("p_greater"), TOLERANCE);
    assertClose("standard error", test.standardError(), row.number("se"), TOLERANCE);
    assertThat(test.degreesOfFreedom()).isEqualTo(row.number("df"));
  }

  @ParameterizedTest
  @MethodSource("varyingSamples")
  void intervalsOfTheBiasAgree(Row row) {
    for (int level : new int[] {90, 95, 99}) {
      Interval interval =
          StudentTTest.of(bias(row), sd(row), row.count("n"), 1 - level / 100.0).interval();
      assertEnds(interval, row, "ci" + level, row.decimal("mu0"));
    }
  }

  /** Ends are compared relative to the half-width: near zero an end has no digits of its own. */
  private static void assertEnds(Interval interval, Row row, String column, BigDecimal offset) {
    double low = row.decimal(column + "_lo").subtract(offset).doubleValue();
    double high = row.decimal(column + "_hi").subtract(offset).doubleValue();
    double allowed = 1e-12 * (high - low) + 1e-15 * Math.abs(low);
    // The table has 20 digits of the mean itself; of the bias that leaves the following.
    double known = 1e-19 * offset.abs().doubleValue();
    assertThat(Math.abs(interval.low() - low)).as(column).isLessThan(allowed + known);
    assertThat(Math.abs(interval.high() - high)).as(column).isLessThan(allowed + known);
  }

  @ParameterizedTest
  @MethodSource("varyingSamples")
  void varianceTestAgrees(Row row) {
    VarianceTest test = VarianceTest.of(sd(row), row.count("n"), row.number("sigma0"), 0.05);

    assertClose("chi2", test.statistic(), row.number("chi2"), TOLERANCE);
    assertClose("p lower", test.pLower(), row.number("p_chi2_lower"), TOLERANCE);
    assertClose("p upper", test.pUpper(), row.number("p_chi2_upper"), TOLERANCE);
    assertClose("two-sided p", test.pTwoSided(), row.number("p_chi2_two"), TOLERANCE);
    Interval interval = test.bounds().interval();
    assertClose("low", interval.low(), row.number("sd_ci95_lo"), TOLERANCE);
    assertClose("high", interval.high(), row.number("sd_ci95_hi"), TOLERANCE);
  }

  @ParameterizedTest
  @MethodSource("varyingSamples")
  void intervalsOfTheVarianceAgreeAtEachLevel(Row row) {
    for (int level : new int[] {90, 95, 99}) {
      Interval interval =
          StandardDeviationBounds.of(sd(row), row.count("n"), 1 - level / 100.0).interval();
      String column = "var_ci" + level;
      assertClose(column, squared(interval.low()), row.number(column + "_lo"), TOLERANCE);
      assertClose(column, squared(interval.high()), row.number(column + "_hi"), TOLERANCE);
    }
  }

  @ParameterizedTest
  @MethodSource("varyingSamples")
  void limitTestAgreesWhereTheReferenceIsExact(Row row) {
    int n = row.count("n");
    CombinedUncertainty u = new CombinedUncertainty(sd(row) / Math.sqrt(n), n - 1);
    double limit = row.number("Delta");

    LimitTest test = LimitTest.of(bias(row), u, BiasLimits.symmetric(limit), row.number("alpha"));

    assertClose("t lower", test.statisticLower(), row.number("tost_t_lower"), 1e-12);
    assertClose("t upper", test.statisticUpper(), row.number("tost_t_upper"), 1e-12);
    assertClose("p lower", test.pLower(), row.number("tost_p_lower"), 1e-11);
    assertClose("p upper", test.pUpper(), row.number("tost_p_upper"), 1e-11);
    assertClose("p", test.pNotWithin(), row.number("tost_p"), 1e-11);
    assertThat(test.shown() == Shown.WITHIN).isEqualTo(row.number("tost_p") <= row.number("alpha"));
  }

  private static double squared(double x) {
    return x * x;
  }

  private static double published(String name, String quantity) {
    return ReferenceTable.rows("nist-handbook/expected.csv", "case", name)
        .filter(row -> row.text("quantity").equals(quantity))
        .findFirst()
        .orElseThrow()
        .number("computed");
  }

  @Test
  void handbookParticleCounts() {
    ExactSample sample =
        ExactSample.of(ReferenceTable.decimals("nist-handbook/particle_counts.csv", "y"));
    double sd = sample.standardDeviation().orElseThrow();
    StudentTTest test = StudentTTest.of(sample.meanMinus(new BigDecimal(50)), sd, 10, 0.05);

    assertClose("sd", sd, published("particle counts", "sd"), 1e-14);
    assertClose("t", test.statistic(), published("particle counts mu0=50", "t"), 1e-14);
    assertClose("p", test.pTwoSided(), published("particle counts mu0=50", "p two-sided"), 1e-14);
    assertClose(
        "critical",
        test.criticalValue(),
        published("particle counts", "t critical 0.975 df=9"),
        1e-13);
  }

  @ParameterizedTest
  @CsvSource({"CI50,0.5", "CI80,0.2", "CI90,0.1", "CI95,0.05", "CI99,0.01", "CI99.9,0.001"})
  void handbookHeatFlowMeter(String level, double alpha) {
    ExactSample sample = ExactSample.of(ReferenceTable.decimals("nist-handbook/zarr13.csv", "y"));
    double sd = sample.standardDeviation().orElseThrow();
    Interval interval = StudentTTest.of(sample.mean(), sd, sample.n(), alpha).interval();

    assertClose("sd", sd, published("zarr13", "sd"), 1e-14);
    assertClose("low", interval.low(), published("zarr13", level + " lower"), 1e-14);
    assertClose("high", interval.high(), published("zarr13", level + " upper"), 1e-14);
  }

  @Test
  void handbookGearDiameters() {
    ExactSample sample = ExactSample.of(ReferenceTable.decimals("nist-handbook/gear.csv", "y"));
    double sd = sample.standardDeviation().orElseThrow();
    VarianceTest test = VarianceTest.of(sd, 100, 0.1, 0.05);

    assertClose("chi2", test.statistic(), published("gear sigma0=0.1", "chi2"), 1e-14);
    assertClose("p", test.pLower(), published("gear sigma0=0.1", "lower-tail p"), 1e-12);
    assertClose(
        "critical", test.criticalLower(), published("gear", "chi2 critical 0.05 df=99"), 1e-14);
    assertClose(
        "critical", test.criticalUpper(), published("gear", "chi2 critical 0.95 df=99"), 1e-14);
    assertThat(test.shown()).isEqualTo(Shown.WITHIN);
  }

  @Test
  void handbookWaferResistivity() {
    VarianceTest test = VarianceTest.of(13.97, 10, 10, 0.05);

    assertClose("chi2", test.statistic(), 17.564481, 1e-14);
    assertClose("p", test.pUpper(), published("wafer resistivity", "upper-tail p"), 1e-13);
    assertThat(test.shown()).isEqualTo(Shown.BEYOND);
  }

  @Test
  void zTestIsTheLimitOfTheTTest() {
    ZTest z = ZTest.of(0.75, 1.5, 4, 0.05);
    StudentTTest t = StudentTTest.of(0.75, 1.5, 4, 0.05);

    assertThat(z.statistic()).isEqualTo(t.statistic()).isEqualTo(1.0);
    // 2 (1 - Phi(1)) and Phi^-1(0.975), 16 digits: R 4.2.2, 2*pnorm(-1), qnorm(0.975)
    assertClose("p", z.pTwoSided(), 0.3173105078629141, 1e-15);
    assertClose("critical", z.criticalValue(), 1.959963984540054, 1e-15);
    assertThat(z.pLess() + z.pGreater()).isEqualTo(1.0);
    assertClose("half-width", z.interval().high() - 0.75, 1.959963984540054 * 0.75, 1e-15);
  }

  @Test
  void zTestTakesASingleReading() {
    assertThat(ZTest.of(2, 1, 1, 0.05).interval().contains(0)).isFalse();
    assertThat(ZTest.of(1.9, 1, 1, 0.05).interval().contains(0)).isTrue();
  }

  @ParameterizedTest
  @MethodSource("varyingSamples")
  void theTwoSidedTestRejectsWhereTheIntervalExcludesZero(Row row) {
    for (double alpha : List.of(1e-12, 1e-6, 0.01, 0.05, 0.5)) {
      StudentTTest test = StudentTTest.of(bias(row), sd(row), row.count("n"), alpha);
      assertThat(test.pTwoSided() < alpha).isEqualTo(!test.interval().contains(0));
    }
  }

  @ParameterizedTest
  @CsvSource({
    "NaN,1,5,0.05,bias",
    "1,0,5,0.05,standardDeviation",
    "1,-1,5,0.05,standardDeviation",
    "1,1,1,0.05,n",
    "1,1,5,0,alpha",
    "1,1,5,0.51,alpha",
    "1,1,5,NaN,alpha",
    "1,Infinity,5,0.05,standardDeviation"
  })
  void badArgumentsAreNamed(double bias, double sd, int n, double alpha, String name) {
    assertThatThrownBy(() -> StudentTTest.of(bias, sd, n, alpha))
        .isInstanceOf(IllegalArgumentException.class)
        .hasMessageStartingWith(name + " is ")
        .hasMessageContaining("allowed");
  }
}
