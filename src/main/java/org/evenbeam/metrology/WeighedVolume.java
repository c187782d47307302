package org.evenbeam.metrology;

import java.math.BigDecimal;
import org.evenbeam.stats.Arguments;

/**
 * A volume of water found by weighing, {@code V = (m + m_evap) Z} (ISO 8655-6). The masses count as
 * the decimals that they are.
 *
 * @param milligrams m, the balance's reading in mg
 * @param evaporatedMilligrams m_evap, what evaporated meanwhile, in mg; the mean of control
 *     weighings may be negative by chance
 * @param zFactor Z in µL/mg, 0.9 to 1.1; see {@link ZFactor}
 */
public record WeighedVolume(
    BigDecimal milligrams, BigDecimal evaporatedMilligrams, double zFactor) {
  /** The temperature to which volumes are referred, in °C (ISO 8655-6). */
  public static final double REFERENCE_CELSIUS = 20;

  /**
   * Checks the range of Z.
   *
   * @throws IllegalArgumentException if it is outside, as in another unit it would be
   */
  public WeighedVolume {
    Arguments.within("Z in µL/mg", zFactor, 0.9, 1.1);
  }

  /** The volume in µL, as the device held it at its own temperature. */
  public BigDecimal microlitres() {
    return milligrams.add(evaporatedMilligrams).multiply(BigDecimal.valueOf(zFactor));
  }

  /**
   * The volume in µL that the device would hold at 20 °C, {@code V (1 - γ (t - 20))} (ISO 4787,
   * ISO/TR 20461).
   *
   * @param cubicExpansion γ of the device in 1/°C, 0 to 0.001 (borosilicate glass near 1e-5,
   *     polypropylene near 4.5e-4; common practice)
   * @param deviceCelsius t, the device's temperature in °C, 0 to 40
   * @throws IllegalArgumentException if either is outside
   */
  public BigDecimal microlitresAt20(double cubicExpansion, double deviceCelsius) {
    Arguments.within("cubic expansion in 1/°C", cubicExpansion, 0, 1e-3);
    Arguments.within("device temperature in °C", deviceCelsius, 0, 40);
    double back = 1 - cubicExpansion * (deviceCelsius - REFERENCE_CELSIUS);
    return microlitres().multiply(BigDecimal.valueOf(back));
  }
}
