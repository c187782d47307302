package org.evenbeam.stats.fitness;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;
import static org.evenbeam.stats.Close.assertClose;

import java.math.BigDecimal;
import java.util.List;
import java.util.Map;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import org.evenbeam.stats.ExactSample;
import org.evenbeam.stats.ReferenceTable;
import org.evenbeam.stats.ReferenceTable.Row;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

class GrubbsTest {
  private static final Map<String, ExactSample> SAMPLES =
      ReferenceTable.rows("r-grid/samples100_data.csv").stream()
          .collect(
              Collectors.groupingBy(
                  row -> row.text("id"),
                  Collectors.collectingAndThen(
                      Collectors.mapping(row -> row.decimal("x"), Collectors.toList()),
                      ExactSample::of)));

  static List<Row> criticalValues() {
    return ReferenceTable.rows("r-grid/grubbs_critical.csv");
  }

  static List<Row> isoTable() {
    return ReferenceTable.rows("r-grid/grubbs_iso5725_table.csv");
  }

  static Stream<Row> samples() {
    return ReferenceTable.rows("r-grid/samples100_decimal.csv").stream()
        .filter(row -> row.has("grubbs_G"));
  }

  private static ExactSample sample(String... readings) {
    return ExactSample.of(Stream.of(readings).map(BigDecimal::new).toList());
  }

  @ParameterizedTest
  @MethodSource("criticalValues")
  void criticalValuesAgree(Row row) {
    int n = row.count("n");
    double alpha = row.number("alpha");

    assertClose("one-sided", Grubbs.critical(n, 1, alpha), row.number("g_one_sided_mp"), 1e-13);
    assertClose("two-sided", Grubbs.critical(n, 2, alpha), row.number("g_two_sided_mp"), 1e-13);
  }

  @ParameterizedTest
  @MethodSource("isoTable")
  void theTableOfTheStandardAgreesToOneInItsLastDigit(Row row) {
    double critical = Grubbs.critical(row.count("n"), 2, row.number("alpha_two_sided"));

    assertThat(critical).isEqualTo(row.number("published"), within(0.00151));
  }

  @ParameterizedTest
  @MethodSource("samples")
  void theFurthestReadingAgrees(Row row) {
    Grubbs grubbs = Grubbs.furthest(SAMPLES.get(row.text("id"))).orElseThrow();

    assertClose("G", grubbs.statistic(), row.number("grubbs_G"), 1e-14);
    assertThat(grubbs.index()).isEqualTo((int) row.number("grubbs_index") - 1);
    assertClose("p", grubbs.pBound(), row.number("grubbs_p_two"), 1e-13);
    double critical = grubbs.critical(row.number("alpha"));
    assertClose("critical", critical, row.number("grubbs_crit_two"), 1e-13);
  }

  @Test
  void handbookUranium() {
    ExactSample readings =
        ExactSample.of(ReferenceTable.decimals("nist-handbook/grubbs_uranium.csv", "y"));
    Grubbs largest = Grubbs.largest(readings).orElseThrow();

    // e-Handbook 1.3.5.17.1: G = 2.4687 (truncated there), critical value 2.032
    assertClose("G", largest.statistic(), 2.46876461121245, 1e-13);
    assertThat(largest.critical(0.05)).isEqualTo(2.032, within(5e-4));
    assertThat(largest.index()).isEqualTo(7);
    assertThat(largest.pBound()).isLessThan(1e-4);
  }

  @Test
  void eachSideHasItsOwnReading() {
    ExactSample readings = sample("5.1", "4.9", "7.0", "5.0", "2.0", "5.2");

    assertThat(Grubbs.largest(readings).orElseThrow().index()).isEqualTo(2);
    assertThat(Grubbs.smallest(readings).orElseThrow().index()).isEqualTo(4);
    assertThat(Grubbs.furthest(readings).orElseThrow().index()).isEqualTo(4);
    assertThat(Grubbs.furthest(readings).orElseThrow().pBound())
        .isEqualTo(2 * Grubbs.smallest(readings).orElseThrow().pBound());
  }

  @Test
  void theOffsetCostsNoDigit() {
    ExactSample near = sample("0.0013", "-0.0002", "0.0007", "0.0121");
    ExactSample far = sample("1e9", "999999999.9985", "999999999.9994", "1000000000.0108");

    assertThat(Grubbs.furthest(far)).isEqualTo(Grubbs.furthest(near));
  }

  /** Of three readings, two equal, the third lies as far out as it can. */
  @Test
  void theLargestPossibleValueIsNoError() {
    Grubbs grubbs = Grubbs.furthest(sample("1", "1", "2")).orElseThrow();

    assertClose("G", grubbs.statistic(), 2 / Math.sqrt(3), 1e-15);
    assertThat(grubbs.pBound()).isZero();
  }

  @Test
  void whatCannotBeAskedIsEmpty() {
    assertThat(Grubbs.furthest(sample("1", "2"))).isEmpty();
    assertThat(Grubbs.largest(sample("1", "1.0", "1.00"))).isEmpty();
  }
}
