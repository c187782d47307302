package org.evenbeam.stats.risk;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.evenbeam.stats.BiasLimits;
import org.evenbeam.stats.Interval;
import org.evenbeam.stats.StandardNormal;
import org.evenbeam.stats.UncertaintyComponent;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class RoundedCharacteristicTest {
  private static CheckDesign design(int n, DecisionRule rule, double referenceUncertainty) {
    return CheckDesign.ofBias(n, new BiasCriterion(new BiasLimits(1.2, 1.6), rule, 0.05))
        .withResolution(1)
        .withReference(new UncertaintyComponent(referenceUncertainty, 6), true)
        .withPrecision(new PrecisionCriterion(1.1, rule, 0.05));
  }

  /** Simulated rounded readings, judged by the tests themselves, meet the model. */
  @ParameterizedTest
  @CsvSource({
    "3,SIMPLE_ACCEPTANCE,0.9,0.5,0.25", "5,GUARDED_ACCEPTANCE,0.6,0.4,0",
    "5,GUARDED_REJECTION,1.6,0.8,0", "10,SIMPLE_ACCEPTANCE,1.5,0.3,0.1",
    "4,GUARDED_REJECTION,-1.4,0.95,0.3", "60,GUARDED_REJECTION,1.8,0.95,0.2",
    "60,GUARDED_ACCEPTANCE,1.2,0.6,0", "60,SIMPLE_ACCEPTANCE,1.55,0.1,0.05"
  })
  void simulatedRoundedChecksFollowTheChances(
      int n, DecisionRule rule, double bias, double sigma, double reference) {
    CheckDesign design = design(n, rule, reference);
    VerdictChances chances = OperatingCharacteristic.of(design).at(bias, sigma);
    SimulatedCheck simulated = new SimulatedCheck(design, bias, sigma, 20_000, 20260402);

    assertThat(simulated.conforms()).isEqualTo(chances.conforms(), within(0.0145));
    assertThat(simulated.doesNotConform()).isEqualTo(chances.doesNotConform(), within(0.0145));
    assertThat(chances.conforms()).isBetween(0.01, 0.99);
  }

  @ParameterizedTest
  @CsvSource({"2,0.035", "5,0.012", "10,0.005", "50,0.002", "70,0.002", "200,0.002"})
  void theModelMeetsTheIntegralWhereTheStandardDeviationIsOneResolution(int n, double allowed) {
    OperatingCharacteristic curve =
        OperatingCharacteristic.of(design(n, DecisionRule.GUARDED_REJECTION, 0.3));

    assertThat(curve.at(1.4, 0.9999999).conforms())
        .isEqualTo(curve.at(1.4, 1).conforms(), within(allowed));
  }

  @ParameterizedTest
  @CsvSource({"0.1,0.35", "0.3,0.45", "0.5,0.55", "0.9,1.0"})
  void momentsMeetTheExactDistributionWhereOneTakesOverFromTheOther(double sigma, double limit) {
    int n = 50;
    while (DigitCounts.affordable(n + 1, sigma)) {
      n++;
    }
    PrecisionCriterion precision =
        new PrecisionCriterion(limit, DecisionRule.SIMPLE_ACCEPTANCE, 0.05);
    CheckDesign bias = design(n, DecisionRule.GUARDED_ACCEPTANCE, 0.2).biasAlone();
    CheckDesign spread = CheckDesign.ofPrecision(n, precision).withResolution(1);

    assertThat(conforms(bias.withReadings(n + 1), 1.1, sigma))
        .isEqualTo(conforms(bias, 1.1, sigma), within(0.005));
    assertThat(conforms(spread.withReadings(n + 1), 0, sigma))
        .isEqualTo(conforms(spread, 0, sigma), within(0.03));
  }

  /** Rounded readings have a fourth moment of their own, on which the scatter of s depends. */
  @Test
  void theFourthMomentOfARoundedReadingCounts() {
    PrecisionCriterion precision =
        new PrecisionCriterion(0.45, DecisionRule.SIMPLE_ACCEPTANCE, 0.05);
    CheckDesign design = CheckDesign.ofPrecision(50, precision).withResolution(1);
    PassingRegion region = PassingRegion.conforming(design);
    RoundedPositions source =
        new RoundedPositions(design, region, region, BiasMargin.of(design, 0.05), 0.3);
    double exact = 0;
    double byMoments = 0;
    for (double position = 1.0 / 32; position < 0.5; position += 1.0 / 16) {
      exact += source.exact(position).get(0).at(0, 0, 0.1).conforms() / 8;
      byMoments += source.byMoments(position).get(0).at(0, 0, 0.1).conforms() / 8;
    }

    assertThat(byMoments).isEqualTo(exact, within(0.02));
  }

  private static double conforms(CheckDesign design, double bias, double sigma) {
    return OperatingCharacteristic.of(design).at(bias, sigma).conforms();
  }

  /** With next to no scatter all readings are the same digit, and the bias is that of rounding. */
  @Test
  void aSteadyInstrumentIsOffByItsRounding() {
    BiasCriterion criterion =
        new BiasCriterion(BiasLimits.symmetric(0.25), DecisionRule.SIMPLE_ACCEPTANCE, 0.05);
    CheckDesign design = CheckDesign.ofBias(6, criterion).withResolution(1);
    BiasCharacteristic steady = OperatingCharacteristic.of(design).atSigma(1e-6);

    assertThat(steady.at(0).conforms()).isEqualTo(0.5, within(1e-9));
    assertThat(steady.at(0.6).conforms()).isEqualTo(0.15, within(1e-9));
    assertThat(steady.conformsByPosition(0)).isEqualTo(new Interval(0, 1));
  }

  @Test
  void theAverageLiesBetweenTheWorstAndTheBestPosition() {
    BiasCharacteristic coarse =
        OperatingCharacteristic.of(design(3, DecisionRule.SIMPLE_ACCEPTANCE, 0.1)).atSigma(0.3);
    Interval range = coarse.conformsByPosition(1.3);

    assertThat(range.contains(coarse.at(1.3).conforms())).isTrue();
    assertThat(range.high() - range.low()).isGreaterThan(0.1);
  }

  @Test
  void averagedOverTheReferenceTheConditionalChancesAreTheChances() {
    BiasCharacteristic coarse =
        OperatingCharacteristic.of(design(5, DecisionRule.GUARDED_ACCEPTANCE, 0.3)).atSigma(0.4);
    double conforms = 0;
    double step = 0.02;
    for (double z = -8; z <= 8; z += step) {
      double density = Math.exp(-z * z / 2) / Math.sqrt(2 * Math.PI);
      conforms += coarse.given(0.5, z).conforms() * density * step;
    }

    assertThat(conforms).isEqualTo(coarse.at(0.5).conforms(), within(1e-4));
  }

  @ParameterizedTest
  @CsvSource({"1,0.3", "2,1e-9", "50,0.99", "1000000,0.99", "1000000,0.01"})
  void everyNumberOfReadingsHasChances(int n, double sigma) {
    CheckDesign design =
        n == 1
            ? CheckDesign.ofBias(
                    1,
                    0.3,
                    new BiasCriterion(
                        BiasLimits.symmetric(2), DecisionRule.GUARDED_ACCEPTANCE, 0.05))
                .withResolution(1)
            : design(n, DecisionRule.GUARDED_ACCEPTANCE, 0);
    VerdictChances chances = OperatingCharacteristic.of(design).at(0.2, sigma);

    assertThat(chances.conforms()).isBetween(0.0, 1.0);
    assertThat(chances.doesNotConform()).isBetween(0.0, 1.0);
  }

  @Test
  void noChanceIsLostInTheTable() {
    double[] totals = new double[3];
    DigitCounts.of(7, 0.6, 0.3)
        .forEach(
            (sum, squares, chance) -> {
              totals[0] += chance;
              totals[1] += chance * sum;
              totals[2] += chance * squares;
            });

    // mean and second moment of one rounded reading, by its cells
    double mean = 0;
    double square = 0;
    for (int k = -8; k <= 8; k++) {
      double cell = StandardNormal.between((k - 0.8) / 0.6, (k + 0.2) / 0.6);
      mean += k * cell;
      square += k * k * cell;
    }
    assertThat(totals[0]).isEqualTo(1, within(1e-7));
    assertThat(totals[1]).isEqualTo(7 * mean, within(1e-6));
    assertThat(totals[2]).isEqualTo(7 * square, within(1e-6));
  }
}
