package org.evenbeam.metrology;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.math.BigDecimal;
import java.util.List;
import java.util.OptionalDouble;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class VolumeErrorsTest {
  private static final BigDecimal HUNDRED = new BigDecimal("100");

  private static VolumeErrors errors(String nominal, String... volumes) {
    List<BigDecimal> typed = Stream.of(volumes).map(BigDecimal::new).toList();
    return VolumeErrors.of(typed, new BigDecimal(nominal));
  }

  @Test
  void systematicIsOfTheNominalAndRandomOfTheMean() {
    VolumeErrors errors = errors("200", "96", "98", "100", "102", "104");

    assertThat(errors.mean()).isEqualTo(100);
    assertThat(errors.systematic()).isEqualTo(-100);
    assertThat(errors.systematicPercent()).isEqualTo(-50);
    assertThat(errors.random()).hasValue(Math.sqrt(10));
    assertThat(errors.randomPercent()).hasValue(Math.sqrt(10));
    assertThat(errors("200", "48", "49", "50", "51", "52").randomPercent().orElseThrow())
        .isCloseTo(2 * Math.sqrt(2.5), within(1e-15));
  }

  @Test
  void aSmallErrorOfALargeVolumeKeepsItsDigits() {
    VolumeErrors errors = errors("1000000000", "1000000000.001", "1000000000.003");

    assertThat(errors.systematic()).isEqualTo(0.002);
    assertThat(errors.random()).hasValue(Math.sqrt(2e-6));
  }

  @Test
  void weighingsBecomeErrors() {
    List<BigDecimal> volumes =
        Stream.of("99.71", "99.61")
            .map(BigDecimal::new)
            .map(mass -> new WeighedVolume(mass, BigDecimal.ZERO, 1.0029).microlitres())
            .toList();

    assertThat(VolumeErrors.of(volumes, HUNDRED).systematic()).isEqualTo(-0.050986);
  }

  @Test
  void oneVolumeHasNoRandomError() {
    VolumeErrors errors = errors("100", "100.2");

    assertThat(errors.systematicPercent()).isEqualTo(0.2);
    assertThat(errors.random()).isEmpty();
    assertThat(errors.randomPercent()).isEmpty();
  }

  @Test
  void aMeanOfNothingHasNoCoefficientOfVariation() {
    VolumeErrors errors = errors("1", "-0.1", "0.1");

    assertThat(errors.random()).isNotEqualTo(OptionalDouble.empty());
    assertThat(errors.randomPercent()).isEmpty();
  }

  @ParameterizedTest
  @ValueSource(strings = {"0", "-100"})
  void aNominalVolumeOfNothingIsRefused(String nominal) {
    assertThatThrownBy(() -> errors(nominal, "1", "2"))
        .isInstanceOf(IllegalArgumentException.class)
        .hasMessage("nominal volume is " + nominal + ", allowed: above 0");
  }

  @Test
  void noVolumesAreRefused() {
    assertThatThrownBy(() -> errors("100"))
        .isInstanceOf(IllegalArgumentException.class)
        .hasMessageContaining("is 0, allowed: 1+");
  }
}
