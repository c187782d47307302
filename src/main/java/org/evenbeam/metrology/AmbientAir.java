package org.evenbeam.metrology;

import org.evenbeam.stats.Arguments;

/**
 * The air around a balance.
 *
 * @param celsius temperature in °C, 0 to 40
 * @param pascals pressure in Pa, 60 000 to 110 000
 * @param relativeHumidity as a fraction, 0 to 1
 * @param carbonDioxide mole fraction of carbon dioxide, 0 to 0.01
 */
public record AmbientAir(
    double celsius, double pascals, double relativeHumidity, double carbonDioxide) {
  /** The mole fraction of carbon dioxide that CIPM-2007 takes where none is measured. */
  public static final double USUAL_CARBON_DIOXIDE = 0.0004;

  /**
   * Checks the ranges.
   *
   * @throws IllegalArgumentException if a value is outside its range
   */
  public AmbientAir {
    Arguments.within("air temperature in °C", celsius, 0, 40);
    checkedPressure(pascals);
    Arguments.within("relative humidity as a fraction", relativeHumidity, 0, 1);
    Arguments.within("mole fraction of carbon dioxide", carbonDioxide, 0, 0.01);
  }

  /**
   * Air with the usual carbon dioxide, in the units in which a room's conditions are recorded.
   *
   * @param celsius temperature in °C, 0 to 40
   * @param hectopascals pressure in hPa, 600 to 1100
   * @param humidityPercent relative humidity in %, 0 to 100
   * @throws IllegalArgumentException if a value is outside its range
   */
  public static AmbientAir ofRoom(double celsius, double hectopascals, double humidityPercent) {
    return new AmbientAir(celsius, hectopascals * 100, humidityPercent / 100, USUAL_CARBON_DIOXIDE);
  }

  /** The range of CIPM-2007; other units than Pa fall outside it. */
  static double checkedPressure(double pascals) {
    return Arguments.within("pressure in Pa", pascals, 60_000, 110_000);
  }
}
