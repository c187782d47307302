package org.evenbeam.metrology;

import java.math.BigDecimal;
import java.util.List;
import java.util.OptionalDouble;
import org.evenbeam.stats.ExactSample;

/**
 * The errors of repeated volumes about the volume that was asked for (ISO 8655-6).
 *
 * @param mean the mean volume, in the unit of the volumes
 * @param systematic mean less nominal, in the unit of the volumes
 * @param systematicPercent the same in % of the nominal volume
 * @param random the standard deviation with n - 1, in the unit of the volumes; empty for a single
 *     volume
 * @param randomPercent the coefficient of variation, in % of the mean volume; empty for a single
 *     volume, or where the mean is not above 0
 */
public record VolumeErrors(
    double mean,
    double systematic,
    double systematicPercent,
    OptionalDouble random,
    OptionalDouble randomPercent) {

  /**
   * The errors of volumes in their order.
   *
   * @param volumes at least one, in the unit of the nominal volume
   * @param nominal the nominal or selected volume, above 0
   * @throws IllegalArgumentException if there is no volume, one is absent or beyond what an
   *     instrument reads, or the nominal volume is not above 0
   */
  public static VolumeErrors of(List<BigDecimal> volumes, BigDecimal nominal) {
    if (nominal.signum() <= 0) {
      throw new IllegalArgumentException("nominal volume is " + nominal + ", allowed: above 0");
    }
    ExactSample sample = ExactSample.of(volumes);
    double mean = sample.mean();
    double systematic = sample.meanMinus(nominal);
    OptionalDouble random = sample.standardDeviation();
    return new VolumeErrors(
        mean,
        systematic,
        100 * systematic / nominal.doubleValue(),
        random,
        random.isPresent() && mean > 0
            ? OptionalDouble.of(100 * random.getAsDouble() / mean)
            : OptionalDouble.empty());
  }
}
