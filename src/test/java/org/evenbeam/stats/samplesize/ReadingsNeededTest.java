package org.evenbeam.stats.samplesize;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.util.List;
import java.util.OptionalDouble;
import org.evenbeam.stats.BiasLimits;
import org.evenbeam.stats.ReferenceTable;
import org.evenbeam.stats.ReferenceTable.Row;
import org.evenbeam.stats.StandardDeviationBounds;
import org.evenbeam.stats.risk.BiasCriterion;
import org.evenbeam.stats.risk.CheckDesign;
import org.evenbeam.stats.risk.DecisionRule;
import org.evenbeam.stats.risk.OperatingCharacteristic;
import org.evenbeam.stats.risk.PrecisionCriterion;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.EnumSource;
import org.junit.jupiter.params.provider.MethodSource;

class ReadingsNeededTest {
  static List<Row> studentPower() {
    return ReferenceTable.rows("r-grid/ttest_samplesize.csv");
  }

  static List<Row> variancePower() {
    return ReferenceTable.rows("r-grid/vartest_samplesize.csv");
  }

  private static ReadingsNeeded enough(int n) {
    return new ReadingsNeeded.Enough(n);
  }

  @ParameterizedTest
  @MethodSource("studentPower")
  void powerOfTheTTest(Row row) {
    double delta = row.number("delta");
    double alpha = row.number("alpha");
    double power = row.number("power");
    ReadingsNeeded needed =
        row.text("alternative").equals("two.sided")
            ? ReadingsForMean.forTwoSidedPower(delta, 1, alpha, power)
            : ReadingsForMean.forOneSidedPower(delta, 1, alpha, power);

    assertThat(needed).isEqualTo(enough(row.count("n_int_strict")));
  }

  @ParameterizedTest
  @MethodSource("variancePower")
  void powerOfTheVarianceTest(Row row) {
    double ratio = row.number("sigma_ratio");
    double alpha = row.number("alpha");
    double power = row.number("power");

    assertThat(ReadingsForSpread.forPower(ratio, alpha, power))
        .isEqualTo(enough(row.count("n_upper")));
    assertThat(ReadingsForSpread.forPower(1 / ratio, alpha, power))
        .isEqualTo(enough(row.count("n_lower_for_inverse_ratio")));
  }

  /** (1.96 * 2 / 0.5)^2 = 61.46; by t the half-width at 64 is 0.4996, at 63 0.5037. */
  @Test
  void halfWidthOfAMean() {
    assertThat(ReadingsForMean.forHalfWidth(2, 0.5, 0.05)).isEqualTo(enough(62));
    assertThat(ReadingsForMean.forHalfWidthByT(2, 0.5, 0.05)).isEqualTo(enough(64));
    assertThat(ReadingsForMean.forHalfWidth(1, 100, 0.05)).isEqualTo(enough(1));
    assertThat(ReadingsForMean.forHalfWidthByT(1, 100, 0.05)).isEqualTo(enough(2));
  }

  @ParameterizedTest
  @CsvSource({"0.3,0.05", "0.1,0.05", "0.5,0.01", "0.02,0.1"})
  void intervalOfAStandardDeviation(double share, double alpha) {
    int n = ((ReadingsNeeded.Enough) ReadingsForSpread.forInterval(share, alpha)).n();

    assertThat(StandardDeviationBounds.of(1, n, alpha).interval().high())
        .isLessThanOrEqualTo(1 + share);
    assertThat(StandardDeviationBounds.of(1, n - 1, alpha).interval().high())
        .isGreaterThan(1 + share);
  }

  /** 1.96^2 / 4 / 0.05^2 = 384.1 and, planned at 0.1, 138.3. */
  @Test
  void halfWidthOfARate() {
    assertThat(TrialsForRate.forHalfWidth(OptionalDouble.empty(), 0.05, 0.05))
        .isEqualTo(enough(385));
    assertThat(TrialsForRate.forHalfWidth(OptionalDouble.of(0.1), 0.05, 0.05))
        .isEqualTo(enough(139));
  }

  @Test
  void whatTheCapDoesNotReachIsAnAnswer() {
    ReadingsNeeded none = new ReadingsNeeded.NotUpTo(1_000_000);

    assertThat(ReadingsForMean.forHalfWidth(1, 1e-6, 0.05)).isEqualTo(none);
    assertThat(ReadingsForMean.forHalfWidthByT(1, 1e-6, 0.05)).isEqualTo(none);
    assertThat(ReadingsForMean.forTwoSidedPower(1e-6, 1, 0.05, 0.9)).isEqualTo(none);
    assertThat(ReadingsForSpread.forPower(1.0001, 0.05, 0.9)).isEqualTo(none);
    assertThat(TrialsForRate.forHalfWidth(OptionalDouble.empty(), 1e-6, 0.05)).isEqualTo(none);
  }

  private static CheckDesign design(DecisionRule rule) {
    return CheckDesign.ofBias(2, new BiasCriterion(BiasLimits.symmetric(1), rule, 0.05));
  }

  @ParameterizedTest
  @EnumSource(DecisionRule.class)
  void aCheckFindsTheBiasAndPassesTheFaultless(DecisionRule rule) {
    ReadingsForCheck needed = ReadingsForCheck.of(design(rule), 0.8, 0.9);
    int n = ((ReadingsNeeded.Enough) needed.toFindBias(1.5)).n();
    OperatingCharacteristic at = OperatingCharacteristic.of(design(rule).withReadings(n));
    OperatingCharacteristic before = OperatingCharacteristic.of(design(rule).withReadings(n - 1));

    assertThat(at.at(1.5, 0.8).conforms()).isLessThanOrEqualTo(0.1);
    assertThat(at.at(0, 0.8).conforms()).isGreaterThanOrEqualTo(0.9);
    assertThat(before.at(1.5, 0.8).conforms() > 0.1 || before.at(0, 0.8).conforms() < 0.9).isTrue();
  }

  @Test
  void aBiasInsideTheLimitsIsNeverFound() {
    ReadingsForCheck needed = ReadingsForCheck.of(design(DecisionRule.GUARDED_REJECTION), 0.8, 0.9);

    assertThat(needed.toFindBias(0.9)).isEqualTo(new ReadingsNeeded.NotUpTo(500));
  }

  @Test
  void onlySidesWithALimitCount() {
    CheckDesign design =
        CheckDesign.ofBias(
            2, new BiasCriterion(BiasLimits.onlyAbove(1), DecisionRule.GUARDED_ACCEPTANCE, 0.05));

    assertThat(ReadingsForCheck.of(design, 0.8, 0.9).toFindBias(1.5))
        .isInstanceOf(ReadingsNeeded.Enough.class);
  }

  @Test
  void aStandardDeviationIsFoundByThePrecisionCriterion() {
    CheckDesign design =
        CheckDesign.ofPrecision(2, new PrecisionCriterion(1, DecisionRule.GUARDED_REJECTION, 0.05));
    int n =
        ((ReadingsNeeded.Enough) ReadingsForCheck.of(design, 1, 0.9).toFindStandardDeviation(2))
            .n();

    assertThat(ReadingsForSpread.forPower(2, 0.05, 0.9)).isEqualTo(enough(n));
  }

  @Test
  void badArgumentsAreNamed() {
    assertThatThrownBy(() -> ReadingsForSpread.forPower(1, 0.05, 0.9))
        .hasMessageStartingWith("ratio is 1.0");
    assertThatThrownBy(() -> ReadingsForMean.forHalfWidth(1, 0, 0.05))
        .hasMessageStartingWith("halfWidth is 0.0");
    assertThatThrownBy(() -> ReadingsForMean.forTwoSidedPower(1, 1, 0.05, 1))
        .hasMessageStartingWith("power is 1.0");
    CheckDesign precision =
        CheckDesign.ofPrecision(2, new PrecisionCriterion(1, DecisionRule.GUARDED_REJECTION, 0.05));
    assertThatThrownBy(() -> ReadingsForCheck.of(precision, 1, 0.9).toFindBias(1))
        .hasMessageContaining("judges no bias");
  }
}
