package org.evenbeam.stats.failures;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;
import static org.evenbeam.stats.Close.assertClose;

import java.util.List;
import org.evenbeam.stats.ReferenceTable;
import org.evenbeam.stats.ReferenceTable.Row;
import org.evenbeam.stats.Shown;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;

class FailureCountTest {
  static List<Row> tests() {
    return ReferenceTable.rows("r-grid/binom_test.csv");
  }

  static List<Row> intervals() {
    return ReferenceTable.rows("r-grid/binom_ci.csv");
  }

  @ParameterizedTest
  @MethodSource("tests")
  void exactTestAgrees(Row row) {
    BinomialTest test =
        new FailureCount(row.count("x"), row.count("n")).testAgainst(row.number("p0"));

    assertThat(test.pTwoSided()).isEqualTo(row.number("p_two_mp"), within(1e-13));
    assertThat(test.pLess()).isEqualTo(row.number("p_less_mp"), within(1e-13));
    assertThat(test.pGreater()).isEqualTo(row.number("p_greater_mp"), within(1e-13));
  }

  @ParameterizedTest
  @MethodSource("intervals")
  void intervalsAgree(Row row) {
    FailureCount count = new FailureCount(row.count("x"), row.count("n"));
    FailureBounds bounds = count.bounds(1 - row.number("conf"));

    assertEnd(bounds.clopperPearson().low(), row.number("cp_lower_mp"));
    assertEnd(bounds.clopperPearson().high(), row.number("cp_upper_mp"));
    assertEnd(bounds.lowerBound(), row.number("cp_lower_onesided_mp"));
    assertEnd(bounds.upperBound(), row.number("cp_upper_onesided_mp"));
    assertEnd(bounds.wilson().low(), row.number("wilson_lower_mp"));
    assertEnd(bounds.wilson().high(), row.number("wilson_upper_mp"));
  }

  private static void assertEnd(double actual, double expected) {
    assertThat(actual).isEqualTo(expected, within(1e-14 + 1e-12 * expected));
  }

  @Test
  void handbookProportion() {
    ProportionZ z = new FailureCount(26, 200).approximateTestAgainst(0.1);

    // e-Handbook 7.2.4: z = 1.414, that is the square root of 2
    assertClose("z", z.statistic(), Math.sqrt(2), 1e-14);
    assertThat(z.applicable()).isTrue();
    // R 4.2.2: 2*pnorm(-sqrt(2))
    assertClose("p", z.pTwoSided(), 0.15729920705028502, 1e-13);
    assertClose("greater", z.pGreater(), z.pTwoSided() / 2, 1e-15);
  }

  @ParameterizedTest
  @CsvSource({"100,0.1,true", "99,0.1,false", "100,0.9,true", "99,0.9,false", "20,0.5,true"})
  void theApproximationNeedsTenExpectedOfEach(int n, double rate, boolean applicable) {
    assertThat(new FailureCount(3, n).approximateTestAgainst(rate).applicable())
        .isEqualTo(applicable);
  }

  @Test
  void noFailuresInTenCouldHideAQuarter() {
    FailureBounds bounds = new FailureCount(0, 10).bounds(0.05);

    assertClose("upper", bounds.upperBound(), 1 - Math.pow(0.05, 0.1), 1e-14);
    assertThat(bounds.shownAgainst(0.25)).isEqualTo(Shown.NEITHER);
    assertThat(bounds.shownAgainst(0.26)).isEqualTo(Shown.WITHIN);
    assertThat(new FailureCount(6, 10).bounds(0.05).shownAgainst(0.25)).isEqualTo(Shown.BEYOND);
  }

  @Test
  void everyLegalCountHasBoundsInOrder() {
    for (int n : new int[] {1, 2, 30, 1_000_000}) {
      for (int k : new int[] {0, 1, n / 2, n - 1, n}) {
        for (double alpha : new double[] {1e-12, 0.05, 0.5}) {
          FailureBounds bounds = new FailureCount(Math.min(k, n), n).bounds(alpha);
          double rate = (double) Math.min(k, n) / n;
          assertThat(bounds.lowerBound()).isBetween(0.0, rate);
          assertThat(bounds.upperBound()).isBetween(rate, 1.0);
          assertThat(new FailureCount(Math.min(k, n), n).testAgainst(1e-9).pTwoSided())
              .isBetween(0.0, 1.0);
        }
      }
    }
  }

  @Test
  void badArgumentsAreNamed() {
    assertThatThrownBy(() -> new FailureCount(3, 2)).hasMessage("failures is 3, allowed: 0 to 2");
    assertThatThrownBy(() -> new FailureCount(0, 0)).hasMessageStartingWith("n is 0");
    assertThatThrownBy(() -> new FailureCount(0, 1).testAgainst(0)).hasMessageStartingWith("rate");
    assertThatThrownBy(() -> new FailureCount(0, 1).bounds(0)).hasMessageStartingWith("alpha");
  }
}
