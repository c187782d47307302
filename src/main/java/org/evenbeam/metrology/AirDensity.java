package org.evenbeam.metrology;

/** The density of moist air, by published formula. */
public enum AirDensity {
  /**
   * CIPM-2007, full form: A. Picard, R. S. Davis, M. Gläser, K. Fujii, Metrologia 45 (2008)
   * 149-155, doi:10.1088/0026-1394/45/2/004. Its authors recommend it from 15 °C to 27 °C; the rest
   * of what {@link AmbientAir} allows is served too, without their statement of uncertainty.
   */
  CIPM_2007 {
    @Override
    public double of(AmbientAir air) {
      return new MoistAir(air).density();
    }
  },
  /**
   * The simple formula of ISO/TR 20461 and ISO 4787, {@code (0.34844 p + φ(0.020582 - 0.00252 t)) /
   * (t + 273.15)} with p in hPa and φ in % (constants from memory); carbon dioxide is not in it.
   */
  ISO_TR_20461 {
    @Override
    public double of(AmbientAir air) {
      double t = air.celsius();
      double humidity = air.relativeHumidity() * 100 * (2.0582e-2 - 2.52e-3 * t);
      return (0.34844 * (air.pascals() / 100) + humidity) / (t + 273.15);
    }
  };

  /** The density in kg/m³. */
  public abstract double of(AmbientAir air);
}
