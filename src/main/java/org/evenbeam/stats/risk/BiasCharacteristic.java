package org.evenbeam.stats.risk;

import org.evenbeam.stats.Arguments;

/** The chance of each verdict over the true bias, for one true standard deviation. */
public final class BiasCharacteristic {
  private final PassingChance conforms;
  private final PassingChance notRejected;
  private final double ownDeviation;
  private final double reference;

  BiasCharacteristic(
      PassingChance conforms, PassingChance notRejected, double ownDeviation, double reference) {
    this.conforms = conforms;
    this.notRejected = notRejected;
    this.ownDeviation = ownDeviation;
    this.reference = reference;
  }

  /**
   * The chances over the reference's error.
   *
   * @throws IllegalArgumentException if {@code bias} is not finite
   */
  public VerdictChances at(double bias) {
    return chances(bias, Math.hypot(ownDeviation, reference));
  }

  /**
   * The chances once the error of the reference is given, for averages over an error that several
   * check points share.
   *
   * @param bias the true bias
   * @param referenceError the error of the reference value, in its standard uncertainties; a
   *     reference that is too low makes the bias look larger, so it is added
   * @throws IllegalArgumentException if an argument is not finite
   */
  public VerdictChances given(double bias, double referenceError) {
    Arguments.finite("referenceError", referenceError);
    return chances(bias + referenceError * reference, ownDeviation);
  }

  /** The reference's standard uncertainty in units of the mean's own standard deviation. */
  double referenceInOwn() {
    return reference / ownDeviation;
  }

  private VerdictChances chances(double bias, double deviation) {
    Arguments.finite("bias", bias);
    return VerdictChances.ofNested(conforms.at(bias, deviation), notRejected.at(bias, deviation));
  }
}
