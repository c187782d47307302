package org.evenbeam.metrology;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.evenbeam.stats.Close.assertClose;

import java.util.List;
import org.evenbeam.stats.ReferenceTable;
import org.evenbeam.stats.ReferenceTable.Row;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;

class AirDensityTest {
  // Tolerances of 6e-15: the table has 15 digits, so it is itself up to 5e-15 away.
  static List<Row> table() {
    return ReferenceTable.rows("metrology/air_density_cipm2007.csv");
  }

  private static AmbientAir air(Row row) {
    return new AmbientAir(
        row.number("t_degC"), row.number("p_Pa"), row.number("h_fraction"), row.number("xCO2"));
  }

  @ParameterizedTest
  @MethodSource("table")
  void bothFormulasGiveTheirTable(Row row) {
    assertClose("full", AirDensity.CIPM_2007.of(air(row)), row.number("rho_full"), 6e-15);
    assertClose("simple", AirDensity.ISO_TR_20461.of(air(row)), row.number("rho_simple"), 6e-15);
  }

  @ParameterizedTest
  @MethodSource("table")
  void eachStepOfTheFullFormGivesItsTable(Row row) {
    MoistAir air = new MoistAir(air(row));

    assertClose("psv", air.saturationPressure(), row.number("psv_Pa"), 2e-14);
    assertClose("f", air.enhancementFactor(), row.number("f"), 1e-15);
    assertClose("xv", air.vapourFraction(), row.number("xv"), 2e-14);
    assertClose("Z", air.compressibilityFactor(), row.number("Z"), 1e-15);
  }

  /** The published forms differ by up to 2.0e-6, since 0.3780 is a rounded 1 - Mv/Ma. */
  @ParameterizedTest
  @MethodSource("table")
  void theShortFormAgreesAsFarAsItsRoundedConstantsAllow(Row row) {
    assertClose("short", AirDensity.CIPM_2007.of(air(row)), row.number("rho_short"), 2.1e-6);
  }

  @Test
  void aRoomIsReadInItsOwnUnits() {
    assertThat(AmbientAir.ofRoom(21.5, 1013, 50))
        .isEqualTo(new AmbientAir(21.5, 101_300, 0.5, 0.0004));
  }

  @ParameterizedTest
  @CsvSource({
    "-0.1, 101325, 0.5, 0.0004, air temperature in °C is -0.1",
    "40.1, 101325, 0.5, 0.0004, air temperature in °C is 40.1",
    "20, 1013.25, 0.5, 0.0004, pressure in Pa is 1013.25",
    "20, 110001, 0.5, 0.0004, pressure in Pa is 110001.0",
    "20, 101325, 50, 0.0004, relative humidity as a fraction is 50.0",
    "20, 101325, -0.1, 0.0004, relative humidity as a fraction is -0.1",
    "20, 101325, 0.5, 400, mole fraction of carbon dioxide is 400.0",
    "20, 101325, 0.5, NaN, mole fraction of carbon dioxide is NaN"
  })
  void valuesOutsideTheirRangeAreNamed(double t, double p, double h, double co2, String message) {
    assertThatThrownBy(() -> new AmbientAir(t, p, h, co2))
        .isInstanceOf(IllegalArgumentException.class)
        .hasMessageStartingWith(message + ", allowed: ");
  }
}
