package org.evenbeam.stats.risk;

import org.evenbeam.stats.Interval;

/** The chance of each verdict over the true bias, for one true standard deviation. */
public sealed interface BiasCharacteristic permits ContinuousCharacteristic, RoundedCharacteristic {
  /**
   * The chances over the reference's error and, for rounded readings, over where the true value
   * lies between two digits.
   *
   * @throws IllegalArgumentException if {@code bias} is not finite
   */
  VerdictChances at(double bias);

  /**
   * The chances once the error of the reference is given, for averages over an error that several
   * check points share.
   *
   * @param bias the true bias
   * @param referenceError the error of the reference value, in its standard uncertainties; a
   *     reference that is too low makes the bias look larger, so it is added
   * @throws IllegalArgumentException if an argument is not finite
   */
  VerdictChances given(double bias, double referenceError);

  /**
   * The smallest and the largest chance of CONFORMS over where the true value lies between two
   * digits; a single point where readings are not rounded.
   *
   * @throws IllegalArgumentException if {@code bias} is not finite
   */
  Interval conformsByPosition(double bias);

  /** The reference's standard uncertainty in units of the mean's own standard deviation. */
  double referenceInOwn();
}
