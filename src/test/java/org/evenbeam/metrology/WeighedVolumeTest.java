package org.evenbeam.metrology;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.math.BigDecimal;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class WeighedVolumeTest {
  private static WeighedVolume weighed(String mass, String evaporated, double z) {
    return new WeighedVolume(new BigDecimal(mass), new BigDecimal(evaporated), z);
  }

  @ParameterizedTest
  @CsvSource({
    "99.71, 0, 1.0029, 99.999159",
    "99.69, 0.02, 1.0029, 99.999159",
    "9.98, -0.01, 1.0032, 10.001904",
    "0, 0, 1.0029, 0"
  })
  void whatWasWeighedAndWhatEvaporatedTimesZ(String mass, String lost, double z, String volume) {
    assertThat(weighed(mass, lost, z).microlitres()).isEqualByComparingTo(volume);
  }

  @ParameterizedTest
  @CsvSource({"20, 1000", "24, 998.2", "15, 1002.25"})
  void aWarmDeviceHoldsLessAt20(double celsius, String volume) {
    assertThat(weighed("1000", "0", 1).microlitresAt20(4.5e-4, celsius))
        .isEqualByComparingTo(volume);
  }

  @Test
  void aRigidDeviceNeedsNoCorrection() {
    WeighedVolume volume = weighed("100", "0.1", 1.0035);

    assertThat(volume.microlitresAt20(0, 31)).isEqualByComparingTo(volume.microlitres());
  }

  @ParameterizedTest
  @ValueSource(doubles = {0.0010029, 1.1001, 1002.9, 0.89, Double.NaN})
  void zInAnotherUnitIsRefused(double z) {
    assertThatThrownBy(() -> weighed("1", "0", z))
        .isInstanceOf(IllegalArgumentException.class)
        .hasMessage("Z in µL/mg is " + z + ", allowed: 0.9 to 1.1");
  }

  @ParameterizedTest
  @CsvSource({
    "-1e-6, 20, cubic expansion in 1/°C is -1.0E-6",
    "0.0011, 20, cubic expansion in 1/°C is 0.0011",
    "1e-5, 293, device temperature in °C is 293.0",
    "1e-5, -1, device temperature in °C is -1.0"
  })
  void anImpossibleDeviceIsRefused(double expansion, double celsius, String message) {
    assertThatThrownBy(() -> weighed("1", "0", 1).microlitresAt20(expansion, celsius))
        .isInstanceOf(IllegalArgumentException.class)
        .hasMessageStartingWith(message + ", allowed: ");
  }
}
