package org.evenbeam.stats.risk;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import org.assertj.core.data.Offset;
import org.evenbeam.stats.BiasLimits;
import org.evenbeam.stats.ReferenceTable;
import org.evenbeam.stats.ReferenceTable.Row;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** Special cases of the verdicts' chances that are known from elsewhere. */
class PublishedPowerTest {
  private static final Offset<Double> TIGHT = within(1e-12);

  static List<Row> noncentralT() {
    return ReferenceTable.rows("r-grid/nct_cdf.csv");
  }

  static List<Row> equivalence() {
    return ReferenceTable.rows("r-grid/tost_power.csv");
  }

  static List<Row> student() {
    return ReferenceTable.rows("r-grid/ttest_power.csv");
  }

  static List<Row> variance() {
    return ReferenceTable.rows("r-grid/vartest_power.csv");
  }

  private static VerdictChances biasAlone(
      int n, BiasLimits limits, DecisionRule rule, double alpha, double bias) {
    CheckDesign design = CheckDesign.ofBias(n, new BiasCriterion(limits, rule, alpha));
    return OperatingCharacteristic.of(design).at(bias, 1);
  }

  @ParameterizedTest
  @MethodSource("noncentralT")
  void noncentralTAgrees(Row row) {
    NoncentralT t = NoncentralT.of(row.number("df"), row.number("ncp"));
    double lower = t.lowerTail(row.number("t"));

    assertThat(lower).isEqualTo(row.number("lower_mp"), within(2e-14));
    assertThat(lower + t.upperTail(row.number("t"))).isEqualTo(1, within(2e-14));
  }

  @ParameterizedTest
  @MethodSource("equivalence")
  void guardedAcceptanceIsTheEquivalenceTest(Row row) {
    VerdictChances chances =
        biasAlone(
            row.count("n"),
            BiasLimits.symmetric(row.number("Delta")),
            DecisionRule.GUARDED_ACCEPTANCE,
            row.number("alpha"),
            row.number("delta"));

    assertThat(chances.conforms()).isEqualTo(row.number("power_mp"), TIGHT);
  }

  @ParameterizedTest
  @MethodSource("student")
  void guardedRejectionAtALimitOfZeroIsTheTTest(Row row) {
    int n = row.count("n");
    double alpha = row.number("alpha");
    double delta = row.number("delta");
    VerdictChances one =
        biasAlone(n, BiasLimits.onlyAbove(0), DecisionRule.GUARDED_REJECTION, alpha, delta);
    VerdictChances two =
        biasAlone(n, BiasLimits.symmetric(0), DecisionRule.GUARDED_REJECTION, alpha / 2, delta);

    assertThat(one.doesNotConform()).isEqualTo(row.number("power_one_mp"), TIGHT);
    assertThat(two.doesNotConform()).isEqualTo(row.number("power_two_strict_mp"), TIGHT);
    assertThat(two.undecided()).isZero();
  }

  @ParameterizedTest
  @MethodSource("variance")
  void precisionAloneIsTheChiSquaredTest(Row row) {
    PrecisionCriterion criterion =
        new PrecisionCriterion(1, DecisionRule.GUARDED_ACCEPTANCE, row.number("alpha"));
    VerdictChances chances =
        OperatingCharacteristic.of(CheckDesign.ofPrecision(row.count("n"), criterion))
            .at(0, row.number("sigma_ratio"));

    assertThat(chances.conforms()).isEqualTo(row.number("power_lower_mp"), TIGHT);
    assertThat(chances.doesNotConform()).isEqualTo(row.number("power_upper_mp"), TIGHT);
  }
}
