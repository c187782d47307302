package org.evenbeam.stats.risk;

import java.util.Arrays;
import java.util.List;
import org.evenbeam.stats.Arguments;

/**
 * What a check can see and what it can miss: the chance of each verdict for an instrument of a true
 * bias and a true standard deviation. The error of the reference moves the observed bias also where
 * the plan leaves it out of the rule.
 *
 * <p>The readings are taken as normal, and the chances are integrals with an absolute error below
 * 1e-10; rounding to the resolution d adds its variance d^2 / 12 to theirs (Sheppard, Proc. London
 * Math. Soc. 29 (1898) 353, doi:10.1112/plms/s1-29.1.353). Below a standard deviation of one
 * resolution that no longer holds, and they are taken as rounded normal readings, averaged over
 * where the true value lies between two digits.
 */
public final class OperatingCharacteristic {
  private final CheckDesign design;
  private final PassingRegion conforming;
  private final PassingRegion notRejected;
  private final BiasMargin margin;
  private final SpreadRatio ratio;

  private OperatingCharacteristic(CheckDesign design) {
    this.design = design;
    this.conforming = PassingRegion.conforming(design);
    this.notRejected = PassingRegion.notRejected(design);
    this.margin = BiasMargin.of(design, design.bias().map(BiasCriterion::alpha).orElse(0.5));
    this.ratio = new SpreadRatio(Math.max(1, design.n() - 1));
  }

  /** Prepares what does not depend on the instrument. */
  public static OperatingCharacteristic of(CheckDesign design) {
    return new OperatingCharacteristic(design);
  }

  /** The design that it belongs to. */
  public CheckDesign design() {
    return design;
  }

  /**
   * The chances for one instrument.
   *
   * @param bias its true bias, finite
   * @param sigma its true standard deviation, above zero
   * @throws IllegalArgumentException if an argument is outside its range
   */
  public VerdictChances at(double bias, double sigma) {
    return atSigma(sigma).at(bias);
  }

  /**
   * The chances for instruments of one true standard deviation.
   *
   * @throws IllegalArgumentException if {@code sigma} is not above zero
   */
  public BiasCharacteristic atSigma(double sigma) {
    Arguments.positive("sigma", sigma);
    double d = design.resolution();
    return sigma < d ? roundedAt(sigma) : continuousAt(Math.hypot(sigma, d / Math.sqrt(12)));
  }

  BiasCharacteristic continuousAt(double sigma) {
    PassingChance conforms = chance(conforming, sigma);
    PassingChance remains = notRejected.equals(conforming) ? conforms : chance(notRejected, sigma);
    double ownDeviation = sigma / Math.sqrt(design.n());
    double reference = design.reference().standardUncertainty();
    return new ContinuousCharacteristic(conforms, remains, ownDeviation, reference);
  }

  private BiasCharacteristic roundedAt(double sigma) {
    return RoundedCharacteristic.of(design, conforming, notRejected, margin, sigma);
  }

  /** The curve over the bias at one standard deviation. */
  public List<VerdictChances> acrossBias(double sigma, double... biases) {
    BiasCharacteristic characteristic = atSigma(sigma);
    return Arrays.stream(biases).mapToObj(characteristic::at).toList();
  }

  /** The curve over the standard deviation at one bias. */
  public List<VerdictChances> acrossSigma(double bias, double... sigmas) {
    return Arrays.stream(sigmas).mapToObj(sigma -> at(bias, sigma)).toList();
  }

  private PassingChance chance(PassingRegion region, double sigma) {
    if (design.establishedSigma().isPresent()) {
      return PassingChance.ofFixedLimits(region, margin.at(0), 1);
    }
    if (region.guard() == 0) {
      double largest = Math.max(0, region.largestSpread() / sigma);
      return PassingChance.ofFixedLimits(region, 0, ratio.lowerTail(largest));
    }
    return PassingChance.ofMovingLimits(region, margin, ratio, design.n(), sigma);
  }
}
