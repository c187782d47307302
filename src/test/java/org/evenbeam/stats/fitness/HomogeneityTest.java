package org.evenbeam.stats.fitness;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;
import static org.evenbeam.stats.Close.assertClose;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class HomogeneityTest {
  @Test
  void pooledVarianceWeighsRunsByTheirFreedom() {
    PooledDeviation pooled =
        PooledDeviation.of(List.of(new Spread(3, 5), new Spread(1, 2), new Spread(0, 10)));

    assertClose("s_p", pooled.standardDeviation(), Math.sqrt(37.0 / 14), 1e-15);
    assertThat(pooled.degreesOfFreedom()).isEqualTo(14);
    assertThat(PooledDeviation.of(List.of(new Spread(0, 3)))).isEqualTo(new PooledDeviation(0, 2));
    assertClose(
        "huge",
        PooledDeviation.of(List.of(new Spread(1e200, 3), new Spread(1e200, 3))).standardDeviation(),
        1e200,
        1e-15);
  }

  /**
   * ISO 5725-2:1994, Table 4 (from memory): critical C at 1 % and 5 % for p runs of n readings. The
   * p at the printed value is the level, to the printed digits.
   */
  @ParameterizedTest
  @CsvSource({
    "5,3,0.05,0.684",
    "5,3,0.01,0.788",
    "10,2,0.05,0.602",
    "10,2,0.01,0.718",
    "20,4,0.05,0.221",
    "20,4,0.01,0.265",
    "8,5,0.05,0.391",
    "8,5,0.01,0.463"
  })
  void criticalValuesOfTheStandard(int runs, int n, double alpha, double critical) {
    assertThat(pAt(runs, n, critical - 0.0006)).isGreaterThan(alpha);
    assertThat(pAt(runs, n, critical + 0.0006)).isLessThan(alpha);
  }

  /** The p of a set of runs of which one has the share {@code c} and the rest are alike. */
  private static double pAt(int runs, int n, double c) {
    List<Spread> spreads = new ArrayList<>(Collections.nCopies(runs - 1, new Spread(1, n)));
    spreads.add(new Spread(Math.sqrt(c * (runs - 1) / (1 - c)), n));
    Cochran cochran = Cochran.of(spreads).orElseThrow();
    assertThat(cochran.index()).isEqualTo(runs - 1);
    assertThat(cochran.statistic()).isEqualTo(c, within(1e-12));
    return cochran.pBound();
  }

  @Test
  void aLongRunStandsOutWithASmallerShare() {
    Cochran cochran =
        Cochran.of(List.of(new Spread(1, 3), new Spread(2.5, 40), new Spread(2.6, 2)))
            .orElseThrow();

    assertThat(cochran.index()).isEqualTo(1);
  }

  @Test
  void likeRunsDoNotStandOut() {
    assertThat(Cochran.of(List.of(new Spread(1, 6), new Spread(1, 6))).orElseThrow().pBound())
        .isEqualTo(1.0);
  }

  @Test
  void whatCannotBeAskedIsEmpty() {
    assertThat(Cochran.of(List.of(new Spread(1, 6)))).isEmpty();
    assertThat(Cochran.of(List.of(new Spread(0, 6), new Spread(0, 6)))).isEmpty();
    assertThatThrownBy(() -> PooledDeviation.of(List.of()))
        .hasMessageStartingWith("number of runs");
    assertThatThrownBy(() -> new Spread(1, 1)).hasMessageStartingWith("n is 1");
  }
}
