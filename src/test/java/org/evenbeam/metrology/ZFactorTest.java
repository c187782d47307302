package org.evenbeam.metrology;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.evenbeam.stats.Close.assertClose;

import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.List;
import org.evenbeam.stats.ReferenceTable;
import org.evenbeam.stats.ReferenceTable.Row;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;

class ZFactorTest {
  static List<Row> computed() {
    return ReferenceTable.rows("metrology/z_factors.csv");
  }

  static List<Row> published() {
    return ReferenceTable.rows("metrology/z_factors_published.csv");
  }

  private static double z(ZFactor formulas, Row row) {
    double t = row.number("t_degC");
    double pascals = row.number("p_kPa") * 1000;
    return formulas.at(t, new AmbientAir(t, pascals, 0.5, AmbientAir.USUAL_CARBON_DIOXIDE));
  }

  private static BigDecimal toFourDecimals(double z) {
    return new BigDecimal(z).setScale(4, RoundingMode.HALF_UP);
  }

  private static boolean roundsToPublished(double z, Row row) {
    return toFourDecimals(z).compareTo(row.decimal("Z_published")) == 0;
  }

  @ParameterizedTest
  @MethodSource("computed")
  void bothSetsOfFormulasGiveTheirTable(Row row) {
    double tanaka = z(ZFactor.TANAKA_CIPM_2007, row);
    double iso = z(ZFactor.ISO_TR_20461, row);

    assertClose("Tanaka and CIPM", tanaka, row.number("Z_tanaka_cipm"), 6e-15);
    assertClose("ISO/TR 20461", iso, row.number("Z_isotr20461"), 6e-15);
    assertThat(toFourDecimals(tanaka)).isEqualTo(row.decimal("Z_4dec_tanaka_cipm"));
    assertThat(toFourDecimals(iso)).isEqualTo(row.decimal("Z_4dec_isotr20461"));
  }

  @ParameterizedTest
  @MethodSource("published")
  void theTechnicalReportGivesEachPublishedValue(Row row) {
    assertThat(toFourDecimals(z(ZFactor.ISO_TR_20461, row))).isEqualTo(row.decimal("Z_published"));
  }

  @Test
  void tanakaAndCipmTurnTwoOfThePublishedValues() {
    assertThat(published())
        .filteredOn(row -> !roundsToPublished(z(ZFactor.TANAKA_CIPM_2007, row), row))
        .extracting(row -> row.text("t_degC"))
        .containsExactly("24.0", "28.5");
  }

  @Test
  void theWaterCountsAtItsOwnTemperature() {
    AmbientAir room = AmbientAir.ofRoom(22, 1013, 50);
    double cold = ZFactor.TANAKA_CIPM_2007.at(18, room);

    double air = AirDensity.CIPM_2007.of(room);
    double expected = 1000 * (1 - air / 8000) / (WaterDensity.TANAKA.at(18) - air);
    assertThat(cold).isEqualTo(expected);
    assertThat(cold).isLessThan(ZFactor.TANAKA_CIPM_2007.at(22, room));
  }

  @Test
  void denserWeightsDisplaceLessAir() {
    AmbientAir room = AmbientAir.ofRoom(20, 1013.25, 50);
    double steel = ZFactor.TANAKA_CIPM_2007.at(20, room);
    double brass = new ZFactor(WaterDensity.TANAKA, AirDensity.CIPM_2007, 8400).at(20, room);

    double air = AirDensity.CIPM_2007.of(room);
    assertClose("ratio", brass / steel, (1 - air / 8400) / (1 - air / 8000), 1e-15);
  }

  @ParameterizedTest
  @ValueSource(doubles = {8, 999, 25_001, Double.NaN})
  void weightsInAnotherUnitAreRefused(double density) {
    assertThatThrownBy(() -> new ZFactor(WaterDensity.TANAKA, AirDensity.CIPM_2007, density))
        .isInstanceOf(IllegalArgumentException.class)
        .hasMessage(
            "density of the weights in kg/m³ is " + density + ", allowed: 1000.0 to 25000.0");
  }
}
