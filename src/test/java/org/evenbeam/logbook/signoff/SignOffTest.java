package org.evenbeam.logbook.signoff;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.evenbeam.fixture.TestLaboratory.BALANCE;
import static org.evenbeam.fixture.TestLaboratory.PLAN;
import static org.evenbeam.fixture.TestLaboratory.POINT;
import static org.evenbeam.fixture.TestLaboratory.password;

import java.util.Optional;
import org.evenbeam.fixture.TestConditions;
import org.evenbeam.fixture.TestLaboratory;
import org.evenbeam.logbook.Session;
import org.evenbeam.logbook.run.NewRun;
import org.evenbeam.logbook.run.OpenSheet;
import org.evenbeam.logbook.run.RunKind;
import org.evenbeam.logbook.run.RunState;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.Test;

class SignOffTest {
  private final TestLaboratory laboratory = new TestLaboratory();

  @AfterEach
  void close() {
    laboratory.close();
  }

  private SignOff signOff() {
    return laboratory.logbook().signOff();
  }

  private RunState state(long run) {
    OpenSheet sheet = laboratory.logbook().runs().open(laboratory.auditor(), run);
    return sheet.state();
  }

  @Test
  void aManagerApprovesWhatATechnicianSubmitted() {
    long run = laboratory.submitted();

    signOff().approve(laboratory.manager(), run, password(), "");

    assertThat(state(run)).isEqualTo(RunState.APPROVED);
    assertThat(laboratory.logbook().instruments().all(laboratory.auditor()).get(0).nextDue())
        .hasValueSatisfying(due -> assertThat(due).isEqualTo("2026-05-31"));
  }

  @Test
  void nobodyApprovesTheirOwnRun() {
    Session manager = laboratory.manager();
    long run =
        laboratory
            .logbook()
            .runs()
            .start(manager, new NewRun(BALANCE, PLAN, RunKind.AS_FOUND_LEFT_SO, Optional.empty()));
    laboratory
        .logbook()
        .bench()
        .recordConditions(manager, run, TestConditions.of("20", "45", "1013"));
    for (String reading : new String[] {"20.0001", "20.0002", "20.0000", "20.0001"}) {
      laboratory.logbook().bench().enter(manager, run, POINT, reading);
    }
    laboratory.logbook().submissions().submit(manager, run, password(), false);

    assertThatThrownBy(() -> signOff().approve(manager, run, password(), ""))
        .isInstanceOf(SignOffRefused.class)
        .hasMessageContaining("sign-off-own-run");
    signOff().approve(laboratory.otherManager(), run, password(), "");
    assertThat(state(run)).isEqualTo(RunState.APPROVED);
  }

  @Test
  void techniciansAndAuditorsApproveNothing() {
    long run = laboratory.submitted();

    assertThatThrownBy(() -> signOff().approve(laboratory.technician(), run, password(), ""))
        .hasMessageContaining("not-allowed");
    assertThatThrownBy(() -> signOff().approve(laboratory.auditor(), run, password(), ""))
        .hasMessageContaining("not-allowed");
    assertThat(state(run)).isEqualTo(RunState.SUBMITTED);
  }

  @Test
  void theSecondOfTwoManagersIsToldThatItIsDone() {
    long run = laboratory.submitted();
    signOff().approve(laboratory.manager(), run, password(), "");

    assertThatThrownBy(() -> signOff().approve(laboratory.otherManager(), run, password(), ""))
        .hasMessageContaining("sign-off-not-submitted");
  }

  @Test
  void aReturnedRunIsTakenUpAndSubmittedAgainWithItsHistory() {
    long run = laboratory.submitted();
    signOff().giveBack(laboratory.manager(), run, password(), "wrong room noted");
    assertThat(state(run)).isEqualTo(RunState.RETURNED);

    laboratory.logbook().runs().takeUp(laboratory.technician(), run);
    laboratory.logbook().submissions().submit(laboratory.technician(), run, password(), false);
    signOff().approve(laboratory.manager(), run, password(), "");

    assertThat(laboratory.logbook().runs().open(laboratory.auditor(), run).events()).hasSize(6);
    assertThat(state(run)).isEqualTo(RunState.APPROVED);
  }

  @Test
  void approvingWhatDoesNotConformNeedsADecisionInWords() {
    long run = laboratory.measured("20.0021", "20.0022", "20.0020", "20.0021");
    laboratory.logbook().submissions().submit(laboratory.technician(), run, password(), false);

    assertThatThrownBy(() -> signOff().approve(laboratory.manager(), run, password(), " "))
        .hasMessageContaining("sign-off-reason-needed");
    signOff().approve(laboratory.manager(), run, password(), "Out of service until adjusted.");
    assertThat(state(run)).isEqualTo(RunState.APPROVED);
  }

  @Test
  void aReturnNeedsItsReasonAndTheRightPassword() {
    long run = laboratory.submitted();

    assertThatThrownBy(() -> signOff().giveBack(laboratory.manager(), run, password(), " "))
        .hasMessageContaining("reason-missing");
    assertThatThrownBy(
            () -> signOff().giveBack(laboratory.manager(), run, "guess".toCharArray(), "why"))
        .hasMessageContaining("password-wrong");
    assertThat(state(run)).isEqualTo(RunState.SUBMITTED);
  }
}
