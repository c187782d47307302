package org.evenbeam.stats.risk;

import org.evenbeam.stats.Arguments;
import org.evenbeam.stats.Interval;

/** The chances where the readings are normal and their rounding is of no account. */
final class ContinuousCharacteristic implements BiasCharacteristic {
  private final PassingChance conforms;
  private final PassingChance notRejected;
  private final double ownDeviation;
  private final double reference;

  ContinuousCharacteristic(
      PassingChance conforms, PassingChance notRejected, double ownDeviation, double reference) {
    this.conforms = conforms;
    this.notRejected = notRejected;
    this.ownDeviation = ownDeviation;
    this.reference = reference;
  }

  @Override
  public VerdictChances at(double bias) {
    return chances(bias, Math.hypot(ownDeviation, reference));
  }

  @Override
  public VerdictChances given(double bias, double referenceError) {
    Arguments.finite("referenceError", referenceError);
    return chances(bias + referenceError * reference, ownDeviation);
  }

  @Override
  public Interval conformsByPosition(double bias) {
    return Interval.about(at(bias).conforms(), 0);
  }

  @Override
  public double referenceInOwn() {
    return reference / ownDeviation;
  }

  private VerdictChances chances(double bias, double deviation) {
    Arguments.finite("bias", bias);
    ErrorOfMean error = ErrorOfMean.normal(deviation);
    return VerdictChances.ofNested(conforms.at(bias, error), notRejected.at(bias, error));
  }
}
