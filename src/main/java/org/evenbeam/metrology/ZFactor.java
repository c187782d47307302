package org.evenbeam.metrology;

import org.evenbeam.stats.Arguments;

/**
 * The factor Z that turns the balance's reading of water into volume, {@code Z = 1000 (1 - ρ_air /
 * ρ_weights) / (ρ_water - ρ_air)} in µL/mg, densities in kg/m³ (ISO 8655-6, ISO/TR 20461). As in
 * the published table, water is taken at 101 325 Pa and the instrument's own expansion is not in
 * it.
 *
 * @param water how the water's density is found
 * @param air how the air's density is found
 * @param weightsDensity density of the weights that adjusted the balance, 1000 to 25 000 kg/m³
 */
public record ZFactor(WaterDensity water, AirDensity air, double weightsDensity) {
  /** The conventional density of weights, in kg/m³ (OIML D 28). */
  public static final double CONVENTIONAL_WEIGHTS = 8000;

  /** Tanaka's water and CIPM-2007's air. */
  public static final ZFactor TANAKA_CIPM_2007 =
      new ZFactor(WaterDensity.TANAKA, AirDensity.CIPM_2007, CONVENTIONAL_WEIGHTS);

  /**
   * The formulas of ISO/TR 20461. At 50 % humidity and 101.3 kPa they give each of the 31 values of
   * the table in ISO 8655-6:2002 (from memory); the other set differs by up to 4.1e-6, which turns
   * two of them.
   */
  public static final ZFactor ISO_TR_20461 =
      new ZFactor(WaterDensity.JONES_HARRIS, AirDensity.ISO_TR_20461, CONVENTIONAL_WEIGHTS);

  /**
   * Checks the range.
   *
   * @throws IllegalArgumentException if the weights' density is outside
   */
  public ZFactor {
    Arguments.within("density of the weights in kg/m³", weightsDensity, 1000, 25_000);
  }

  /**
   * Z in µL/mg.
   *
   * @param waterCelsius the water's temperature in °C, within the water formula's range
   * @param around the air around the balance
   * @throws IllegalArgumentException if the water's temperature is outside
   */
  public double at(double waterCelsius, AmbientAir around) {
    double airDensity = air.of(around);
    double buoyancy = 1 - airDensity / weightsDensity;
    return 1000 * buoyancy / (water.at(waterCelsius) - airDensity);
  }
}
