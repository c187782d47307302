package org.evenbeam.metrology;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.math.BigDecimal;
import java.util.List;
import java.util.stream.Stream;
import org.evenbeam.metrology.Eccentricity.Indication;
import org.junit.jupiter.api.Test;

class EccentricityTest {
  private static Eccentricity shown(String... pairs) {
    List<Indication> indications =
        Stream.of(pairs)
            .map(pair -> pair.split(" ", -1))
            .map(parts -> new Indication(parts[0], new BigDecimal(parts[1])))
            .toList();
    return new Eccentricity(indications);
  }

  @Test
  void theLargestDifferenceIsBetweenAnyTwoPositions() {
    Eccentricity test =
        shown(
            "centre 100.0001", "front 100.0003", "left 99.9998", "back 100.0002", "right 99.9998");

    assertThat(test.largestDifference()).isEqualTo("0.0005");
    assertThat(test.highest().position()).isEqualTo("front");
    assertThat(test.lowest().position()).isEqualTo("left");
  }

  @Test
  void theFirstOfEqualIndicationsIsNamed() {
    Eccentricity even = shown("centre 50.00", "left 50.0");

    assertThat(even.largestDifference()).isEqualByComparingTo("0");
    assertThat(even.highest().position()).isEqualTo("centre");
    assertThat(even.lowest().position()).isEqualTo("centre");
  }

  @Test
  void onePositionTellsNothing() {
    assertThatThrownBy(() -> shown("centre 100"))
        .isInstanceOf(IllegalArgumentException.class)
        .hasMessage("number of positions is 1, allowed: 2 or more");
  }

  @Test
  void aPositionIsWeighedOnce() {
    assertThatThrownBy(() -> shown("centre 100", "left 100", "left 101"))
        .isInstanceOf(IllegalArgumentException.class)
        .hasMessageStartingWith("number of different positions is 2 for 3 indications");
  }
}
