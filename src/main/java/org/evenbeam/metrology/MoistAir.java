package org.evenbeam.metrology;

/**
 * The density of moist air by CIPM-2007 in its full form, {@code p Ma / (Z R T) * (1 - xv (1 - Mv /
 * Ma))}: A. Picard, R. S. Davis, M. Gläser, K. Fujii, Metrologia 45 (2008) 149-155,
 * doi:10.1088/0026-1394/45/2/004, equation 1 and its appendix. The short form printed there has
 * rounded constants and differs by up to 2e-6.
 */
final class MoistAir {
  /** In J/(mol K), CODATA 2006, as the formula was published. */
  private static final double GAS_CONSTANT = 8.314472;

  /** Of water, in kg/mol. */
  private static final double WATER_MOLAR_MASS = 18.01528e-3;

  private final double celsius;
  private final double kelvin;
  private final double pascals;
  private final double relativeHumidity;
  private final double dryMolarMass;

  MoistAir(AmbientAir air) {
    this.celsius = air.celsius();
    this.kelvin = air.celsius() + 273.15;
    this.pascals = air.pascals();
    this.relativeHumidity = air.relativeHumidity();
    this.dryMolarMass = 28.96546e-3 + 12.011e-3 * (air.carbonDioxide() - 0.0004);
  }

  /** In kg/m³. */
  double density() {
    double dry = pascals * dryMolarMass / (compressibilityFactor() * GAS_CONSTANT * kelvin);
    return dry * (1 - vapourFraction() * (1 - WATER_MOLAR_MASS / dryMolarMass));
  }

  /** Saturation vapour pressure, in Pa. */
  double saturationPressure() {
    double square = 1.2378847e-5 * kelvin * kelvin;
    return Math.exp(square - 1.9121316e-2 * kelvin + 33.93711047 - 6.3431645e3 / kelvin);
  }

  /** Enhancement factor. */
  double enhancementFactor() {
    return 1.00062 + 3.14e-8 * pascals + 5.6e-7 * celsius * celsius;
  }

  /** Mole fraction of water vapour. */
  double vapourFraction() {
    return relativeHumidity * enhancementFactor() * saturationPressure() / pascals;
  }

  /** Compressibility factor. */
  double compressibilityFactor() {
    double t = celsius;
    double xv = vapourFraction();
    double ratio = pascals / kelvin;
    double dry = 1.58123e-6 + t * (-2.9331e-8 + t * 1.1043e-10);
    double moist = xv * (5.707e-6 - 2.051e-8 * t + xv * (1.9898e-4 - 2.376e-6 * t));
    return 1 - ratio * (dry + moist) + ratio * ratio * (1.83e-11 - 0.765e-8 * xv * xv);
  }
}
