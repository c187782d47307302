package org.evenbeam.stats.risk;

import java.util.Optional;
import java.util.OptionalDouble;
import org.evenbeam.stats.Arguments;
import org.evenbeam.stats.UncertaintyComponent;

/**
 * All that decides how a check point turns readings into a verdict.
 *
 * @param n number of readings: 2 or more, or 1 with an established standard deviation
 * @param resolution step of the readings; 0 where it is not known or of no account
 * @param reference standard uncertainty of the reference value
 * @param referenceInRule whether the rule takes that uncertainty into account; it moves the bias in
 *     any case
 * @param establishedSigma the standard deviation known beforehand, which the rule then uses in
 *     place of s; the precision is then not judged
 * @param bias what is asked of the bias, if anything
 * @param precision what is asked of the standard deviation, if anything
 */
public record CheckDesign(
    int n,
    double resolution,
    UncertaintyComponent reference,
    boolean referenceInRule,
    OptionalDouble establishedSigma,
    Optional<BiasCriterion> bias,
    Optional<PrecisionCriterion> precision) {
  /**
   * Makes a design.
   *
   * @throws IllegalArgumentException if an argument is outside its range, or nothing is judged
   */
  public CheckDesign {
    Arguments.atLeast("n", n, establishedSigma.isPresent() ? 1 : 2);
    Arguments.notNegative("resolution", resolution);
    establishedSigma.ifPresent(sigma -> Arguments.positive("establishedSigma", sigma));
    boolean precisionJudged = precision.isPresent() && establishedSigma.isEmpty();
    if (bias.isEmpty() && !precisionJudged) {
      throw new IllegalArgumentException("neither bias nor precision is judged");
    }
  }

  /** A design for the bias alone, without resolution, the reference taken as exact. */
  public static CheckDesign ofBias(int n, BiasCriterion bias) {
    return new CheckDesign(
        n,
        0,
        UncertaintyComponent.known(0),
        true,
        OptionalDouble.empty(),
        Optional.of(bias),
        Optional.empty());
  }

  /**
   * A design for the bias with a standard deviation established beforehand, without resolution, the
   * reference taken as exact.
   */
  public static CheckDesign ofBias(int n, double establishedSigma, BiasCriterion bias) {
    return new CheckDesign(
        n,
        0,
        UncertaintyComponent.known(0),
        true,
        OptionalDouble.of(establishedSigma),
        Optional.of(bias),
        Optional.empty());
  }

  /** A design for the precision alone, without resolution. */
  public static CheckDesign ofPrecision(int n, PrecisionCriterion precision) {
    return new CheckDesign(
        n,
        0,
        UncertaintyComponent.known(0),
        true,
        OptionalDouble.empty(),
        Optional.empty(),
        Optional.of(precision));
  }

  /** The same with a resolution. */
  public CheckDesign withResolution(double step) {
    return new CheckDesign(n, step, reference, referenceInRule, establishedSigma, bias, precision);
  }

  /** The same with an uncertain reference, in the rule or left out of it. */
  public CheckDesign withReference(UncertaintyComponent uncertainty, boolean inRule) {
    return new CheckDesign(n, resolution, uncertainty, inRule, establishedSigma, bias, precision);
  }

  /** The same with a criterion for the precision. */
  public CheckDesign withPrecision(PrecisionCriterion criterion) {
    return new CheckDesign(
        n, resolution, reference, referenceInRule, establishedSigma, bias, Optional.of(criterion));
  }

  /** The same with another number of readings. */
  public CheckDesign withReadings(int number) {
    return new CheckDesign(
        number, resolution, reference, referenceInRule, establishedSigma, bias, precision);
  }

  /** The bias criterion alone. */
  public CheckDesign biasAlone() {
    return new CheckDesign(
        n, resolution, reference, referenceInRule, establishedSigma, bias, Optional.empty());
  }

  /** The precision criterion alone. */
  public CheckDesign precisionAlone() {
    return new CheckDesign(
        n, resolution, reference, referenceInRule, establishedSigma, Optional.empty(), precision);
  }
}
