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

class WaterDensityTest {
  /** The table has 15 digits. */
  private static final double TOLERANCE = 1e-15;

  static List<Row> table() {
    return ReferenceTable.rows("metrology/water_density.csv");
  }

  @ParameterizedTest
  @MethodSource("table")
  void eachFormulaGivesItsTable(Row row) {
    double t = row.number("t_degC");

    assertClose("Tanaka", WaterDensity.TANAKA.at(t), row.number("rho_tanaka"), TOLERANCE);
    assertClose(
        "air-saturated",
        WaterDensity.TANAKA_AIR_SATURATED.at(t),
        row.number("rho_tanaka_airsat"),
        TOLERANCE);
    assertClose(
        "at 90 kPa", WaterDensity.TANAKA.at(t, 90_000), row.number("rho_tanaka_90kPa"), TOLERANCE);
    if (row.has("rho_jones_harris")) {
      assertClose(
          "Jones and Harris",
          WaterDensity.JONES_HARRIS.at(t),
          row.number("rho_jones_harris"),
          TOLERANCE);
    }
  }

  @Test
  void standardPressureChangesNothing() {
    for (WaterDensity formula : WaterDensity.values()) {
      assertThat(formula.at(21.7, WaterDensity.STANDARD_PRESSURE)).isEqualTo(formula.at(21.7));
    }
  }

  @ParameterizedTest
  @CsvSource({
    "TANAKA, -0.01, 0.0 to 40.0",
    "TANAKA, 40.01, 0.0 to 40.0",
    "TANAKA_AIR_SATURATED, 293.15, 0.0 to 40.0",
    "JONES_HARRIS, 4.99, 5.0 to 40.0",
    "JONES_HARRIS, NaN, 5.0 to 40.0"
  })
  void temperaturesOutsideTheFormulaAreRefused(WaterDensity formula, double t, String range) {
    String message = "water temperature in °C is " + t + ", allowed: " + range;

    assertThatThrownBy(() -> formula.at(t))
        .isInstanceOf(IllegalArgumentException.class)
        .hasMessage(message);
    assertThatThrownBy(() -> formula.at(t, 101_325))
        .isInstanceOf(IllegalArgumentException.class)
        .hasMessage(message);
  }

  @ParameterizedTest
  @CsvSource({"1013.25", "101.325", "59999", "110001", "NaN"})
  void pressuresInAnotherUnitAreRefused(double pressure) {
    assertThatThrownBy(() -> WaterDensity.TANAKA.at(20, pressure))
        .isInstanceOf(IllegalArgumentException.class)
        .hasMessage("pressure in Pa is " + pressure + ", allowed: 60000.0 to 110000.0");
  }
}
