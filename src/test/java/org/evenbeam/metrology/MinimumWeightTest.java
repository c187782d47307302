package org.evenbeam.metrology;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.evenbeam.stats.Close.assertClose;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class MinimumWeightTest {
  @ParameterizedTest
  @CsvSource({
    "0.00008, 0.0001, 0.16, false",
    "0.00003, 0.0001, 0.082, true",
    "0, 0.01, 8.2, true",
    "0.41, 1, 820, false"
  })
  void twoThousandTimesTheLargerOfBoth(double s, double d, double weight, boolean byResolution) {
    MinimumWeight minimum = MinimumWeight.of(s, d);

    assertClose("minimum weight", minimum.value(), weight, 1e-15);
    assertThat(minimum.isSetByResolution()).isEqualTo(byResolution);
  }

  @Test
  void aLaboratoryMayAskForMoreOrLess() {
    assertThat(new MinimumWeight(0.5, 0.1, 3, 1).value()).isEqualTo(150);
  }

  @ParameterizedTest
  @CsvSource({
    "-1, 1, 2, 0.1, standardDeviation is -1.0",
    "NaN, 1, 2, 0.1, standardDeviation is NaN",
    "1, 0, 2, 0.1, resolution is 0.0",
    "1, 1, 0, 0.1, factor is 0.0",
    "1, 1, 2, 0, tolerancePercent is 0.0",
    "1, 1, 2, 101, tolerancePercent is 101.0"
  })
  void valuesOutsideTheirRangeAreNamed(
      double s, double d, double factor, double tolerance, String message) {
    assertThatThrownBy(() -> new MinimumWeight(s, d, factor, tolerance))
        .isInstanceOf(IllegalArgumentException.class)
        .hasMessageStartingWith(message + ", allowed: ");
  }
}
