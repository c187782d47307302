package org.evenbeam.stats.risk;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import org.evenbeam.stats.BiasLimits;
import org.evenbeam.stats.StandardNormal;
import org.evenbeam.stats.UncertaintyComponent;
import org.junit.jupiter.api.Test;

class RunRiskTest {
  private static final BiasCriterion CRITERION =
      new BiasCriterion(BiasLimits.symmetric(1), DecisionRule.SIMPLE_ACCEPTANCE, 0.05);

  private static AssumedPoint point(double referenceUncertainty, double sigma, double bias) {
    CheckDesign design =
        CheckDesign.ofBias(4, CRITERION)
            .withReference(UncertaintyComponent.known(referenceUncertainty), true);
    return new AssumedPoint(OperatingCharacteristic.of(design).atSigma(sigma), bias);
  }

  private static double alone(AssumedPoint point) {
    return point.characteristic().at(point.bias()).conforms();
  }

  @Test
  void independentReferencesMultiply() {
    AssumedPoint one = point(0.3, 1, 0.4);
    AssumedPoint other = point(0.5, 0.8, -0.2);

    VerdictChances run = RunRisk.of(List.of(List.of(one), List.of(other)));

    assertThat(run.conforms()).isEqualTo(alone(one) * alone(other), within(1e-15));
    assertThat(run.doesNotConform()).isEqualTo(1 - run.conforms(), within(1e-15));
  }

  @Test
  void anExactSharedReferenceMultipliesToo() {
    AssumedPoint one = point(0, 1, 0.4);
    AssumedPoint other = point(0, 0.8, -0.2);

    assertThat(RunRisk.of(List.of(List.of(one, other))).conforms())
        .isEqualTo(alone(one) * alone(other), within(1e-13));
  }

  /** Two nearly noiseless points fail together, when the one reference is off. */
  @Test
  void aSharedReferenceMakesPointsFailTogether() {
    AssumedPoint one = point(0.5, 1e-4, 0);
    double together = RunRisk.of(List.of(List.of(one, one, one))).conforms();

    assertThat(together).isEqualTo(alone(one), within(1e-4));
    assertThat(RunRisk.of(List.of(List.of(one), List.of(one), List.of(one))).conforms())
        .isEqualTo(Math.pow(alone(one), 3), within(1e-12));
  }

  /** For equal points of simple acceptance the joint chance is that of two correlated means. */
  @Test
  void theSharedErrorIsAveraged() {
    AssumedPoint one = point(0.4, 1, 0.2);
    AssumedPoint other = point(0.4, 1, -0.3);
    double expected = 0;
    double step = 1e-3;
    for (double z = -8; z <= 8; z += step) {
      double weight = Math.exp(-z * z / 2) / Math.sqrt(2 * Math.PI) * step;
      expected += weight * band(0.2 + 0.4 * z) * band(-0.3 + 0.4 * z);
    }

    assertThat(RunRisk.of(List.of(List.of(one, other))).conforms())
        .isEqualTo(expected, within(1e-12));
  }

  private static double band(double bias) {
    return StandardNormal.lowerTail((1 - bias) / 0.5) - StandardNormal.lowerTail((-1 - bias) / 0.5);
  }
}
