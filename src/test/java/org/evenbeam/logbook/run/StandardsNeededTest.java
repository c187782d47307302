package org.evenbeam.logbook.run;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.evenbeam.fixture.TestLaboratory.BALANCE;

import java.math.BigDecimal;
import java.util.List;
import java.util.Optional;
import org.evenbeam.fixture.TestLaboratory;
import org.evenbeam.logbook.standards.ReferenceStandard;
import org.evenbeam.verification.plan.LimitTerms;
import org.evenbeam.verification.plan.PlanRevision;
import org.evenbeam.verification.plan.PlannedCheckPoint;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.Test;

class StandardsNeededTest {
  private final TestLaboratory laboratory = new TestLaboratory();

  @AfterEach
  void close() {
    laboratory.close();
  }

  private void addPlan(String title, String standard, Optional<LimitTerms> bias) {
    PlannedCheckPoint usual = TestLaboratory.plan(1).checkPoints().get(0);
    PlannedCheckPoint point =
        new PlannedCheckPoint(
            usual.label(),
            usual.nominal(),
            standard,
            usual.valueLabel(),
            usual.readings(),
            bias,
            bias,
            usual.maximumStandardDeviation(),
            usual.alpha(),
            usual.biasRule(),
            usual.precisionRule(),
            Optional.empty());
    PlanRevision plan =
        new PlanRevision(
            BALANCE, title, 1, "Weigh.", 90, TestLaboratory.plan(1).environment(), List.of(point));
    laboratory.logbook().plans().add(laboratory.manager(), plan);
  }

  private long start(String title) {
    return laboratory
        .logbook()
        .runs()
        .start(
            laboratory.technician(),
            new NewRun(BALANCE, title, RunKind.AS_FOUND_LEFT_SO, Optional.empty()));
  }

  @Test
  void aPlanWithAMissingStandardIsRefusedByItsTag() {
    assertThatThrownBy(
            () -> addPlan("Other", "W-99", Optional.of(LimitTerms.of(new BigDecimal("0.1")))))
        .hasMessageContaining("not-found")
        .hasMessageContaining("W-99");
    assertThat(laboratory.logbook().plans().current(laboratory.manager(), BALANCE)).hasSize(1);
  }

  @Test
  void aRunWithAStandardThatHasNoCertificateIsRefusedByItsTag() {
    laboratory
        .logbook()
        .standards()
        .add(laboratory.manager(), new ReferenceStandard("W-21", "weight", "Maker", "1", "g"));
    addPlan("Other", "W-21", Optional.of(LimitTerms.of(new BigDecimal("0.1"))));

    assertThatThrownBy(() -> start("Other"))
        .hasMessageContaining("run-standard-without-certificate")
        .hasMessageContaining("W-21");
    assertThat(laboratory.logbook().runs().inState(laboratory.technician(), RunState.DRAFT))
        .isEmpty();
  }

  @Test
  void aStandardInAnotherUnitIsRefused() {
    laboratory
        .logbook()
        .standards()
        .add(laboratory.manager(), new ReferenceStandard("B-7", "buffer", "Maker", "1", "[pH]"));

    assertThatThrownBy(
            () -> addPlan("Other", "B-7", Optional.of(LimitTerms.of(new BigDecimal("0.1")))))
        .hasMessageContaining("plan-other-unit");
  }

  @Test
  void aShareOfTheReferenceIsResolvedExactly() {
    LimitTerms share =
        new LimitTerms(
            Optional.of(new BigDecimal("0.001")),
            Optional.of(new BigDecimal("0.01")),
            Optional.empty(),
            LimitTerms.Combination.SUM);
    addPlan("Other", "W-20", Optional.of(share));
    long run = start("Other");

    assertThat(
            laboratory
                .logbook()
                .runs()
                .open(laboratory.technician(), run)
                .sheet()
                .checkPoints()
                .get(0)
                .question()
                .criteria()
                .biasAbove())
        .hasValueSatisfying(
            limit -> assertThat(limit).isEqualByComparingTo(new BigDecimal("0.003000002")));
  }
}
