package org.evenbeam.stats.risk;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;
import static org.evenbeam.stats.Close.assertClose;

import org.apache.commons.statistics.distribution.ChiSquaredDistribution;
import org.evenbeam.stats.BiasLimits;
import org.evenbeam.stats.UncertaintyComponent;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;

class DetectableChangeTest {
  private static DetectableChange of(CheckDesign design) {
    return DetectableChange.of(OperatingCharacteristic.of(design));
  }

  private static CheckDesign bias(int n, BiasLimits limits, DecisionRule rule) {
    return CheckDesign.ofBias(n, new BiasCriterion(limits, rule, 0.05));
  }

  @ParameterizedTest
  @EnumSource(DecisionRule.class)
  void atTheDetectableBiasATenthPasses(DecisionRule rule) {
    CheckDesign design =
        bias(5, new BiasLimits(1.5, 2.5), rule)
            .withReference(new UncertaintyComponent(0.2, 8), true)
            .withPrecision(new PrecisionCriterion(1.5, DecisionRule.GUARDED_REJECTION, 0.05));
    OperatingCharacteristic curve = OperatingCharacteristic.of(design);
    double above = DetectableChange.of(curve).biasAbove(0.6).orElseThrow();
    double below = DetectableChange.of(curve).biasBelow(0.6).orElseThrow();

    assertThat(curve.at(above, 0.6).conforms()).isEqualTo(0.1, within(1e-12));
    assertThat(curve.at(-below, 0.6).conforms()).isEqualTo(0.1, within(1e-12));
    assertThat(curve.at(above * 0.99, 0.6).conforms()).isGreaterThan(0.1);
    assertThat(above - below).isEqualTo(1, within(1e-6));
  }

  /** The middle of the limits lies far above zero, so that the chance first rises. */
  @Test
  void aBiasOnTheWiderSideIsFoundBeyondTheMiddle() {
    CheckDesign design = bias(4, new BiasLimits(0.8, 10), DecisionRule.GUARDED_ACCEPTANCE);
    OperatingCharacteristic curve = OperatingCharacteristic.of(design);
    double above = DetectableChange.of(curve).biasAbove(0.5).orElseThrow();

    assertThat(curve.at(2, 0.5).conforms()).isGreaterThan(curve.at(0, 0.5).conforms());
    assertThat(above).isGreaterThan(4.6);
    assertThat(curve.at(above, 0.5).conforms()).isEqualTo(0.1, within(1e-12));
  }

  @ParameterizedTest
  @EnumSource(DecisionRule.class)
  void atTheDetectableStandardDeviationATenthPasses(DecisionRule rule) {
    PrecisionCriterion precision = new PrecisionCriterion(2e-4, rule, 0.05);
    double sigma = of(CheckDesign.ofPrecision(8, precision)).standardDeviation(0).orElseThrow();
    double nu = 7;
    ChiSquaredDistribution chi = ChiSquaredDistribution.of(nu);
    double allowed =
        switch (rule) {
          case GUARDED_ACCEPTANCE -> chi.inverseCumulativeProbability(0.05);
          case GUARDED_REJECTION -> chi.inverseSurvivalProbability(0.05);
          case SIMPLE_ACCEPTANCE -> nu;
        };

    // closed form: chi-square at 0.1 is the allowed one divided by (sigma / sigma0)^2
    double expected = 2e-4 * Math.sqrt(allowed / chi.inverseCumulativeProbability(0.1));
    assertClose("sigma", sigma, expected, 1e-11);
  }

  @Test
  void oneSideWithoutLimitHidesAnyBias() {
    DetectableChange change = of(bias(5, BiasLimits.onlyAbove(1), DecisionRule.GUARDED_ACCEPTANCE));

    assertThat(change.biasBelow(0.3)).isEmpty();
    assertThat(change.biasAbove(0.3)).isPresent();
  }

  @Test
  void whatNeverFallsToATenthIsAbsent() {
    DetectableChange change = of(bias(5, BiasLimits.symmetric(1), DecisionRule.GUARDED_REJECTION));

    assertThat(change.standardDeviation(0)).isEmpty();
  }

  @Test
  void aPlanThatHardlyPassesAnyoneHasADetectableChangeOfZero() {
    DetectableChange change =
        of(
            bias(5, BiasLimits.symmetric(1), DecisionRule.GUARDED_ACCEPTANCE)
                .withReference(UncertaintyComponent.known(2), true));

    assertThat(change.biasAbove(0.1)).hasValue(0);
    assertThat(change.standardDeviation(0)).hasValue(0);
  }
}
