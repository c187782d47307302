package org.evenbeam.logbook.run;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.evenbeam.fixture.TestLaboratory.BALANCE;
import static org.evenbeam.fixture.TestLaboratory.PLAN;
import static org.evenbeam.fixture.TestLaboratory.POINT;
import static org.evenbeam.fixture.TestLaboratory.password;

import java.time.Duration;
import java.util.Optional;
import org.evenbeam.fixture.TestConditions;
import org.evenbeam.fixture.TestLaboratory;
import org.evenbeam.logbook.instruments.InstrumentEvent;
import org.evenbeam.logbook.instruments.InstrumentStatus;
import org.evenbeam.verification.Condition;
import org.evenbeam.verification.Note;
import org.evenbeam.verification.RunFindings;
import org.evenbeam.verification.Verdict;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.Test;

class RunsTest {
  private final TestLaboratory laboratory = new TestLaboratory();

  @AfterEach
  void close() {
    laboratory.close();
  }

  private RunSheet sheet(long run) {
    return laboratory.logbook().runs().open(laboratory.technician(), run).sheet();
  }

  private RunState state(long run) {
    return laboratory.logbook().runs().open(laboratory.technician(), run).state();
  }

  @Test
  void anExpiredStandardIsRefusedWithItsDate() {
    laboratory.clock().advance(Duration.ofDays(120));

    assertThatThrownBy(laboratory::start)
        .isInstanceOf(RunRefused.class)
        .hasMessageContaining("run-standard-expired")
        .hasMessageContaining("W-20")
        .hasMessageContaining("2026-05-31");
    assertThat(laboratory.logbook().runs().inState(laboratory.technician(), RunState.DRAFT))
        .isEmpty();
  }

  @Test
  void theStandardsCertificateOfTheDayIsSettledAtTheStart() {
    long run = laboratory.start();

    assertThat(sheet(run).run().standards())
        .containsExactly(new Run.StandardInUse(POINT, "W-20", "C-1"));
    assertThat(sheet(run).checkPoints().get(0).question().reference().standardUncertainty())
        .isEqualTo(0.00002);
  }

  @Test
  void thereIsNoVerdictBeforeAllReadingsAreIn() {
    long run = laboratory.measured("20.0001", "20.0002", "20.0000");

    assertThat(sheet(run).findings().verdict()).isEmpty();
    assertThatThrownBy(
            () ->
                laboratory
                    .logbook()
                    .submissions()
                    .submit(laboratory.technician(), run, password(), false))
        .hasMessageContaining("run-no-verdict");
    assertThat(state(run)).isEqualTo(RunState.DRAFT);
  }

  @Test
  void conditionsOutsideThePlanLeaveNoVerdict() {
    long run = laboratory.measured("20.0001", "20.0002", "20.0000", "20.0001");
    laboratory
        .logbook()
        .bench()
        .recordConditions(laboratory.technician(), run, TestConditions.of("28", "45", "1013"));

    assertThat(sheet(run).findings().verdict()).isEmpty();
    assertThat(sheet(run).findings().notes())
        .containsExactly(new Note.ConditionOutside(Condition.TEMPERATURE));

    RunFindings findings =
        laboratory.logbook().submissions().submit(laboratory.technician(), run, password(), true);
    assertThat(findings.verdict()).isEmpty();
    assertThat(state(run)).isEqualTo(RunState.SUBMITTED);
  }

  @Test
  void aSubmittedRunThatDoesNotConformStopsTheInstrumentAtOnce() {
    long run = laboratory.measured("20.0021", "20.0022", "20.0020", "20.0021");

    RunFindings findings =
        laboratory.logbook().submissions().submit(laboratory.technician(), run, password(), false);

    assertThat(findings.verdict()).contains(Verdict.DOES_NOT_CONFORM);
    assertThat(laboratory.logbook().instruments().all(laboratory.auditor()).get(0).status())
        .isEqualTo(InstrumentStatus.OUT_OF_SERVICE);
  }

  @Test
  void aWrongPasswordSignsNothing() {
    long run = laboratory.measured("20.0001", "20.0002", "20.0000", "20.0001");

    assertThatThrownBy(
            () ->
                laboratory
                    .logbook()
                    .submissions()
                    .submit(laboratory.technician(), run, "wrong".toCharArray(), false))
        .hasMessageContaining("password-wrong");
    assertThat(state(run)).isEqualTo(RunState.DRAFT);
  }

  @Test
  void aStrikeThatDecidesTheVerdictIsSaid() {
    long run = laboratory.measured("20.0001", "20.0002", "20.0100", "20.0001");
    long third = sheet(run).checkPoints().get(0).standing().get(2).id();
    laboratory.logbook().bench().strike(laboratory.technician(), run, third, "draught");
    laboratory.logbook().bench().enter(laboratory.technician(), run, POINT, "20.0000");

    assertThat(sheet(run).findings().verdict()).contains(Verdict.CONFORMS);
    assertThat(sheet(run).findings().notes()).containsExactly(new Note.StruckReadingsDecide(1));
  }

  @Test
  void anAsLeftRunNeedsItsAdjustment() {
    long asFound =
        laboratory
            .logbook()
            .runs()
            .start(
                laboratory.technician(),
                new NewRun(BALANCE, PLAN, RunKind.AS_FOUND, Optional.empty()));

    assertThatThrownBy(() -> asLeft(asFound, 1)).hasMessageContaining("as-left-without-adjustment");

    long adjustment =
        laboratory
            .logbook()
            .instruments()
            .record(
                laboratory.technician(),
                BALANCE,
                InstrumentEvent.Kind.ADJUSTMENT,
                "internal adjustment");
    assertThat(sheet(asLeft(asFound, adjustment)).run().asLeftOf())
        .contains(new Run.AsLeftOf(asFound, adjustment));
  }

  private long asLeft(long asFound, long adjustment) {
    return laboratory
        .logbook()
        .runs()
        .start(
            laboratory.technician(),
            new NewRun(
                BALANCE,
                PLAN,
                RunKind.AS_LEFT,
                Optional.of(new Run.AsLeftOf(asFound, adjustment))));
  }

  @Test
  void anAbandonedRunKeepsItsReasonAndIsNotGoneOnWith() {
    long run = laboratory.measured("20.0001");

    laboratory.logbook().runs().abandon(laboratory.technician(), run, "power cut");

    assertThat(state(run)).isEqualTo(RunState.ABANDONED);
    assertThatThrownBy(
            () ->
                laboratory.logbook().bench().enter(laboratory.technician(), run, POINT, "20.0001"))
        .hasMessageContaining("run-wrong-state");
  }
}
