package org.evenbeam.verification;

import java.math.BigDecimal;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.stream.DoubleStream;
import org.evenbeam.stats.BiasLimits;
import org.evenbeam.stats.UncertaintyComponent;
import org.evenbeam.stats.risk.BiasCriterion;
import org.evenbeam.stats.risk.CheckDesign;
import org.evenbeam.stats.risk.DetectableChange;
import org.evenbeam.stats.risk.OperatingCharacteristic;
import org.evenbeam.stats.risk.PrecisionCriterion;

/**
 * What a check point's check could miss, under an assumption about the instrument's standard
 * deviation.
 *
 * @param readings the number of readings it holds for
 * @param assumedStandardDeviation the assumed true standard deviation
 * @param origin where the assumption comes from
 * @param conformsAtZeroBias the chance that the bias criterion alone conforms without bias; empty
 *     where not asked
 * @param conformsAtLimit likewise at a bias of its upper limit, or its lower one where there is
 *     only that
 * @param conformsAtTwiceLimit likewise at twice that limit
 * @param detectableBias the smallest bias that passes the bias criterion at most one time in ten;
 *     empty where not asked or never found
 * @param detectableStandardDeviation likewise for the precision criterion
 * @param conformsWithoutBias the chance that an instrument without bias, and of the assumed
 *     standard deviation, CONFORMS in all that is asked
 */
public record CheckRisk(
    int readings,
    double assumedStandardDeviation,
    Origin origin,
    OptionalDouble conformsAtZeroBias,
    OptionalDouble conformsAtLimit,
    OptionalDouble conformsAtTwiceLimit,
    OptionalDouble detectableBias,
    OptionalDouble detectableStandardDeviation,
    double conformsWithoutBias) {

  /** Where the assumed standard deviation comes from. */
  public enum Origin {
    /** The permitted standard deviation. */
    PERMITTED,
    /** The standard deviation of this run's readings. */
    THIS_RUN,
    /** The least that the resolution can hide. */
    RESOLUTION
  }

  private record Assumption(double standardDeviation, Origin origin) {}

  /**
   * The risk of a check point.
   *
   * @param question what is asked
   * @param readings how many readings the check has or will have
   * @param standardDeviation that of this run's readings, where there is one
   * @return empty where nothing is asked, there are fewer than two readings, or nothing is known
   *     that a standard deviation could be assumed from
   */
  public static Optional<CheckRisk> of(
      CheckPointQuestion question, int readings, OptionalDouble standardDeviation) {
    Criteria criteria = question.criteria();
    Optional<Assumption> assumption = assume(question, standardDeviation);
    boolean asked = criteria.asksBias() || criteria.asksPrecision();
    if (!asked || readings < 2 || assumption.isEmpty()) {
      return Optional.empty();
    }
    double sigma = assumption.get().standardDeviation();
    CheckDesign design = design(question, readings);
    OptionalDouble limit = limit(criteria);
    return Optional.of(
        new CheckRisk(
            readings,
            sigma,
            assumption.get().origin(),
            conforms(design, sigma, limit, 0),
            conforms(design, sigma, limit, 1),
            conforms(design, sigma, limit, 2),
            criteria.asksBias()
                ? smaller(
                    detectable(design.biasAlone()).biasAbove(sigma),
                    detectable(design.biasAlone()).biasBelow(sigma))
                : OptionalDouble.empty(),
            criteria.asksPrecision()
                ? detectable(design.precisionAlone()).standardDeviation(0)
                : OptionalDouble.empty(),
            OperatingCharacteristic.of(design).at(0, sigma).conforms()));
  }

  /** The limit on the upper side, or that on the lower where there is no other, with its sign. */
  private static OptionalDouble limit(Criteria criteria) {
    return criteria
        .biasAbove()
        .or(() -> criteria.biasBelow().map(BigDecimal::negate))
        .map(limit -> OptionalDouble.of(limit.doubleValue()))
        .orElse(OptionalDouble.empty());
  }

  private static OptionalDouble conforms(
      CheckDesign design, double sigma, OptionalDouble limit, int times) {
    return limit.isEmpty()
        ? OptionalDouble.empty()
        : OptionalDouble.of(
            OperatingCharacteristic.of(design.biasAlone())
                .at(times * limit.getAsDouble(), sigma)
                .conforms());
  }

  private static OptionalDouble smaller(OptionalDouble one, OptionalDouble other) {
    return DoubleStream.concat(one.stream(), other.stream()).min();
  }

  private static DetectableChange detectable(CheckDesign design) {
    return DetectableChange.of(OperatingCharacteristic.of(design));
  }

  private static CheckDesign design(CheckPointQuestion question, int readings) {
    Criteria criteria = question.criteria();
    Reference reference = question.reference();
    return new CheckDesign(
        readings,
        question.resolution().map(BigDecimal::doubleValue).orElse(0.0),
        new UncertaintyComponent(reference.standardUncertainty(), reference.degreesOfFreedom()),
        criteria.referenceUncertaintyCounts(),
        OptionalDouble.empty(),
        bias(criteria),
        precision(criteria));
  }

  private static Optional<BiasCriterion> bias(Criteria criteria) {
    if (!criteria.asksBias()) {
      return Optional.empty();
    }
    BiasLimits limits =
        new BiasLimits(orInfinite(criteria.biasBelow()), orInfinite(criteria.biasAbove()));
    return Optional.of(new BiasCriterion(limits, rule(criteria.biasRule()), criteria.alpha()));
  }

  private static Optional<PrecisionCriterion> precision(Criteria criteria) {
    return criteria
        .maximumStandardDeviation()
        .map(
            limit ->
                new PrecisionCriterion(
                    limit.doubleValue(), rule(criteria.precisionRule()), criteria.alpha()));
  }

  private static double orInfinite(Optional<BigDecimal> limit) {
    return limit.map(BigDecimal::doubleValue).orElse(Double.POSITIVE_INFINITY);
  }

  private static org.evenbeam.stats.risk.DecisionRule rule(DecisionRule rule) {
    return org.evenbeam.stats.risk.DecisionRule.valueOf(rule.name());
  }

  private static Optional<Assumption> assume(
      CheckPointQuestion question, OptionalDouble standardDeviation) {
    double hidden = question.resolution().map(d -> d.doubleValue() / Math.sqrt(12)).orElse(0.0);
    Optional<Assumption> stated =
        question
            .criteria()
            .maximumStandardDeviation()
            .map(limit -> new Assumption(limit.doubleValue(), Origin.PERMITTED));
    if (stated.isEmpty() && standardDeviation.isPresent()) {
      stated = Optional.of(new Assumption(standardDeviation.getAsDouble(), Origin.THIS_RUN));
    }
    return stated
        .filter(assumed -> assumed.standardDeviation() > hidden)
        .or(
            () ->
                hidden > 0
                    ? Optional.of(new Assumption(hidden, Origin.RESOLUTION))
                    : Optional.empty());
  }
}
