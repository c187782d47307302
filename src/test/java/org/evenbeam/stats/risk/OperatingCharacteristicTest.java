package org.evenbeam.stats.risk;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.Locale;
import java.util.stream.DoubleStream;
import org.evenbeam.stats.BiasLimits;
import org.evenbeam.stats.EqualReadingsBound;
import org.evenbeam.stats.ReferenceTable;
import org.evenbeam.stats.ReferenceTable.Row;
import org.evenbeam.stats.StandardNormal;
import org.evenbeam.stats.UncertaintyComponent;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.EnumSource;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;

class OperatingCharacteristicTest {
  private static final BiasCriterion GUARDED =
      new BiasCriterion(BiasLimits.symmetric(2), DecisionRule.GUARDED_ACCEPTANCE, 0.05);

  static List<Row> integrals() {
    return ReferenceTable.rows("risk/verdict_chances.csv");
  }

  private static CheckDesign design(Row row) {
    double alpha = row.number("alpha");
    CheckDesign design =
        CheckDesign.ofBias(
                row.count("n"),
                new BiasCriterion(
                    new BiasLimits(row.number("below"), row.number("above")),
                    rule(row, "bias_rule"),
                    alpha))
            .withReference(
                new UncertaintyComponent(row.number("u_r"), row.number("nu_r")),
                Boolean.parseBoolean(row.text("in_rule")))
            .withResolution(row.number("resolution"));
    return row.number("sigma0") == 0
        ? design
        : design.withPrecision(
            new PrecisionCriterion(row.number("sigma0"), rule(row, "precision_rule"), alpha));
  }

  private static DecisionRule rule(Row row, String column) {
    return DecisionRule.valueOf(row.text(column).toUpperCase(Locale.ROOT));
  }

  /**
   * Where even equal readings cannot show the precision, nothing conforms, whatever the integral.
   */
  private static boolean hiddenByResolution(CheckDesign design) {
    return design.resolution() > 0
        && design
            .precision()
            .filter(p -> p.rule() == DecisionRule.GUARDED_ACCEPTANCE)
            .filter(
                p ->
                    EqualReadingsBound.of(design.n(), design.resolution(), p.alpha()).upperBound()
                        > p.limit())
            .isPresent();
  }

  @ParameterizedTest
  @MethodSource("integrals")
  void chancesAgreeWithAnIndependentIntegral(Row row) {
    CheckDesign design = design(row);
    VerdictChances chances =
        OperatingCharacteristic.of(design).continuousAt(row.number("sigma")).at(row.number("beta"));
    double conforms = hiddenByResolution(design) ? 0 : row.number("conforms");

    assertThat(chances.conforms()).isEqualTo(conforms, within(1e-11));
    assertThat(1 - chances.doesNotConform())
        .isEqualTo(Math.max(conforms, row.number("not_rejected")), within(1e-11));
  }

  @ParameterizedTest
  @EnumSource(DecisionRule.class)
  void anEstablishedStandardDeviationGivesTheClosedForm(DecisionRule rule) {
    BiasCriterion bias = new BiasCriterion(new BiasLimits(1, 1.5), rule, 0.05);
    CheckDesign design =
        CheckDesign.ofBias(1, 0.4, bias).withReference(UncertaintyComponent.known(0.3), true);

    VerdictChances chances = OperatingCharacteristic.of(design).at(0.2, 0.6);

    // u_b = 0.5 in the rule, tau^2 = 0.6^2 + 0.3^2
    double guard = StandardNormal.quantileOfUpperTail(0.05) * 0.5;
    double inner = rule == DecisionRule.GUARDED_ACCEPTANCE ? -guard : guard;
    double shift = rule == DecisionRule.SIMPLE_ACCEPTANCE ? 0 : 1;
    double tau = Math.sqrt(0.45);
    assertThat(chances.conforms()).isEqualTo(band(shift * inner, tau), within(1e-14));
    assertThat(1 - chances.doesNotConform()).isEqualTo(band(shift * guard, tau), within(1e-14));
  }

  private static double band(double widening, double tau) {
    return StandardNormal.lowerTail((1.5 + widening - 0.2) / tau)
        - StandardNormal.lowerTail((-1 - widening - 0.2) / tau);
  }

  @ParameterizedTest
  @MethodSource("integrals")
  void averagedOverTheReferenceTheConditionalChancesAreTheChances(Row row) {
    BiasCharacteristic characteristic =
        OperatingCharacteristic.of(design(row)).continuousAt(row.number("sigma"));
    double beta = row.number("beta");
    double step = 0.01;
    double conforms = 0;
    for (double z = -8; z <= 8; z += step) {
      double density = Math.exp(-z * z / 2) / Math.sqrt(2 * Math.PI);
      conforms += characteristic.given(beta, z).conforms() * density * step;
    }
    assertThat(conforms).isEqualTo(characteristic.at(beta).conforms(), within(1e-9));
  }

  /** Simulated readings, judged by the tests themselves, meet the integrals. */
  @ParameterizedTest
  @CsvSource({
    "GUARDED_ACCEPTANCE,0.4,0.6",
    "GUARDED_ACCEPTANCE,3,1",
    "GUARDED_REJECTION,2.4,1.4",
    "SIMPLE_ACCEPTANCE,-0.9,1"
  })
  void simulatedChecksFollowTheChances(DecisionRule rule, double bias, double sigma) {
    CheckDesign design =
        CheckDesign.ofBias(5, new BiasCriterion(new BiasLimits(1.2, 1.6), rule, 0.05))
            .withReference(new UncertaintyComponent(0.3, 6), true)
            .withPrecision(new PrecisionCriterion(1.1, rule, 0.05));
    SimulatedCheck simulated = new SimulatedCheck(design, bias, sigma, 40_000, 20260401);
    VerdictChances chances = OperatingCharacteristic.of(design).at(bias, sigma);

    assertThat(simulated.conforms()).isEqualTo(chances.conforms(), within(0.01));
    assertThat(simulated.doesNotConform()).isEqualTo(chances.doesNotConform(), within(0.01));
    assertThat(chances.doesNotPass()).isBetween(0.05, 1.0);
  }

  @Test
  void theChanceFallsAwayFromTheMiddleOfTheLimitsAndWithTheStandardDeviation() {
    OperatingCharacteristic curve = OperatingCharacteristic.of(CheckDesign.ofBias(6, GUARDED));
    double[] grid = DoubleStream.iterate(0.05, x -> x + 0.05).limit(80).toArray();

    assertFalls(curve.acrossBias(0.8, grid));
    assertFalls(curve.acrossSigma(0, grid));
    assertThat(curve.at(-0.7, 0.8)).isEqualTo(curve.at(0.7, 0.8));
  }

  private static void assertFalls(List<VerdictChances> curve) {
    for (int i = 1; i < curve.size(); i++) {
      assertThat(curve.get(i).conforms()).isLessThan(curve.get(i - 1).conforms() + 1e-14);
    }
    assertThat(curve.get(curve.size() - 1).conforms()).isLessThan(0.1);
  }

  @Test
  void unitsDoNotMatter() {
    BiasCriterion small = new BiasCriterion(BiasLimits.symmetric(2e-6), GUARDED.rule(), 0.05);
    VerdictChances one =
        OperatingCharacteristic.of(CheckDesign.ofBias(4, GUARDED).withResolution(0.5)).at(0.3, 1);
    VerdictChances other =
        OperatingCharacteristic.of(CheckDesign.ofBias(4, small).withResolution(0.5e-6))
            .at(0.3e-6, 1e-6);

    assertThat(other.conforms()).isEqualTo(one.conforms(), within(1e-13));
  }

  @Test
  void criteriaAloneAreNoStricterThanTogether() {
    CheckDesign both =
        CheckDesign.ofBias(5, GUARDED)
            .withPrecision(new PrecisionCriterion(1, DecisionRule.GUARDED_REJECTION, 0.05));
    double together = OperatingCharacteristic.of(both).at(0.5, 0.9).conforms();

    assertThat(OperatingCharacteristic.of(both.biasAlone()).at(0.5, 0.9).conforms())
        .isGreaterThan(together);
    assertThat(OperatingCharacteristic.of(both.precisionAlone()).at(0.5, 0.9).conforms())
        .isGreaterThan(together);
  }

  @ParameterizedTest
  @ValueSource(ints = {2, 3, 10, 1000, 1_000_000})
  void everyLegalDesignHasChances(int n) {
    for (double alpha : new double[] {1e-12, 1e-4, 0.5}) {
      for (DecisionRule rule : DecisionRule.values()) {
        for (double sigma : new double[] {1e-100, 1e-6, 1, 1e6, 1e100}) {
          assertChances(n, alpha, rule, sigma);
        }
      }
    }
  }

  private static void assertChances(int n, double alpha, DecisionRule rule, double sigma) {
    CheckDesign design =
        CheckDesign.ofBias(n, new BiasCriterion(new BiasLimits(1, 2), rule, alpha))
            .withPrecision(new PrecisionCriterion(1, rule, alpha))
            .withReference(new UncertaintyComponent(1e-3, 0.5), true)
            .withResolution(0.1);
    for (double bias : new double[] {0, 0.9, -1e3, 1e200}) {
      VerdictChances chances = OperatingCharacteristic.of(design).at(bias, sigma);
      assertThat(chances.conforms()).isBetween(0.0, 1.0);
      assertThat(chances.doesNotConform()).isBetween(0.0, 1.0);
      assertThat(chances.conforms() + chances.undecided() + chances.doesNotConform())
          .isEqualTo(1, within(1e-15));
    }
  }

  @Test
  void aDesignThatJudgesNothingIsRefused() {
    CheckDesign precision =
        CheckDesign.ofPrecision(5, new PrecisionCriterion(1, DecisionRule.GUARDED_REJECTION, 0.05));

    assertThatThrownBy(precision::biasAlone).hasMessageContaining("neither");
    assertThatThrownBy(() -> CheckDesign.ofBias(1, GUARDED)).hasMessageStartingWith("n is 1");
    assertThatThrownBy(() -> OperatingCharacteristic.of(precision).at(0, 0))
        .hasMessageStartingWith("sigma is 0.0");
    assertThatThrownBy(() -> OperatingCharacteristic.of(precision).at(Double.NaN, 1))
        .hasMessageStartingWith("bias is NaN");
  }
}
