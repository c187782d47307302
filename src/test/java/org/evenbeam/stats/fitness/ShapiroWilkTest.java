package org.evenbeam.stats.fitness;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;
import static org.evenbeam.stats.Close.assertClose;

import java.math.BigDecimal;
import java.util.List;
import java.util.Map;
import java.util.stream.Collectors;
import java.util.stream.IntStream;
import java.util.stream.Stream;
import org.evenbeam.stats.ExactSample;
import org.evenbeam.stats.ReferenceTable;
import org.evenbeam.stats.ReferenceTable.Row;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

class ShapiroWilkTest {
  private static final Map<String, List<BigDecimal>> DATA =
      ReferenceTable.rows("r-grid/shapiro_data.csv").stream()
          .collect(
              Collectors.groupingBy(
                  row -> row.text("id"),
                  Collectors.mapping(row -> row.decimal("x"), Collectors.toList())));

  static List<Row> published() {
    return ReferenceTable.rows("r-grid/shapiro_expected.csv");
  }

  private static ShapiroWilk test(Stream<BigDecimal> readings) {
    return ShapiroWilk.of(ExactSample.of(readings.toList())).orElseThrow();
  }

  /** The expected values belong to the doubles nearest to the typed decimals. */
  @ParameterizedTest
  @MethodSource("published")
  void statisticAndPAgree(Row row) {
    ShapiroWilk test =
        test(DATA.get(row.text("id")).stream().map(x -> new BigDecimal(x.doubleValue())));

    assertClose("W", test.statistic(), row.number("W_mp"), 1e-14);
    assertThat(test.p()).isEqualTo(row.number("p_mp"), within(2e-12 * row.number("p_mp") + 1e-15));
  }

  @ParameterizedTest
  @MethodSource("published")
  void anOffsetOfABillionCostsNoDigit(Row row) {
    List<BigDecimal> readings = DATA.get(row.text("id"));
    BigDecimal offset = new BigDecimal("1e9");

    assertThat(test(readings.stream().map(offset::add))).isEqualTo(test(readings.stream()));
  }

  @Test
  void whatCannotBeAskedIsEmpty() {
    assertThat(ShapiroWilk.of(sample(1, 2))).isEmpty();
    assertThat(ShapiroWilk.of(sample(2, 2, 2, 2))).isEmpty();
    assertThat(ShapiroWilk.of(sample(IntStream.range(0, 5001).toArray()))).isEmpty();
    assertThat(ShapiroWilk.of(sample(IntStream.range(0, 5000).toArray()))).isPresent();
  }

  private static ExactSample sample(int... readings) {
    return ExactSample.of(IntStream.of(readings).mapToObj(BigDecimal::valueOf).toList());
  }
}
