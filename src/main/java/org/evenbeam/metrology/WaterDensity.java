package org.evenbeam.metrology;

import org.evenbeam.stats.Arguments;

/**
 * The density of pure water against its temperature (ITS-90), by published formula.
 *
 * <p>Compressibility and the effect of dissolved air are those that Tanaka et al. give; their
 * constants are from memory, recomputed independently.
 */
public enum WaterDensity {
  /**
   * Air-free Standard Mean Ocean Water, 0 °C to 40 °C: M. Tanaka, G. Girard, R. Davis, A. Peuto, N.
   * Bignell, Metrologia 38 (2001) 301-309, equation 1, doi:10.1088/0026-1394/38/4/3.
   */
  TANAKA(0) {
    @Override
    double formula(double t) {
      double fromDensest = t - 3.983035;
      double bend = fromDensest * fromDensest * (t + 301.797) / (522528.9 * (t + 69.34881));
      return 999.974950 * (1 - bend);
    }
  },
  /**
   * As {@link #TANAKA}, with the water saturated with air: {@code -4.612e-3 + 0.106e-3 t} kg/m³
   * (Bignell 1983, as given by Tanaka et al. for 0 °C to 25 °C). Between 25 °C and 40 °C the
   * correction is extrapolated; it is then less than 2e-6 of the density.
   */
  TANAKA_AIR_SATURATED(0) {
    @Override
    double formula(double t) {
      return TANAKA.formula(t) - 4.612e-3 + 0.106e-3 * t;
    }
  },
  /**
   * Air-free water, 5 °C to 40 °C, as ISO/TR 20461 uses it: F. E. Jones, G. L. Harris, Journal of
   * Research of NIST 97 (1992) 335-340, doi:10.6028/jres.097.013. At each temperature up to 4.1e-6
   * below {@link #TANAKA}, since it rests on older measurements.
   */
  JONES_HARRIS(5) {
    @Override
    double formula(double t) {
      return 999.85308
          + t * (6.32693e-2 + t * (-8.523829e-3 + t * (6.943248e-5 - t * 3.821216e-7)));
    }
  };

  /** The pressure at which the formulas hold without a correction, in Pa. */
  public static final double STANDARD_PRESSURE = 101_325;

  private static final double WARMEST = 40;

  private final double coldest;

  WaterDensity(double coldest) {
    this.coldest = coldest;
  }

  abstract double formula(double celsius);

  /**
   * The density in kg/m³ at 101 325 Pa.
   *
   * @param celsius the water's temperature in °C, 0 to 40 (5 to 40 for Jones and Harris)
   * @throws IllegalArgumentException if the temperature is outside
   */
  public double at(double celsius) {
    return formula(Arguments.within("water temperature in °C", celsius, coldest, WARMEST));
  }

  /**
   * The density in kg/m³ under another pressure, {@code 1 + (50.74e-11 - 0.326e-11 t + 0.00416e-11
   * t²)(p - 101325)} times that at 101 325 Pa (Tanaka et al., section on compressibility).
   *
   * @param celsius the water's temperature in °C, 0 to 40 (5 to 40 for Jones and Harris)
   * @param pascals the pressure, 60 000 Pa to 110 000 Pa as for the air above it
   * @throws IllegalArgumentException if either is outside
   */
  public double at(double celsius, double pascals) {
    double compressibility = 50.74e-11 + celsius * (-0.326e-11 + celsius * 0.00416e-11);
    double excess = AmbientAir.checkedPressure(pascals) - STANDARD_PRESSURE;
    return at(celsius) * (1 + compressibility * excess);
  }
}
