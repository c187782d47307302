package org.evenbeam.logbook.signoff;

import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import org.evenbeam.logbook.Desk;
import org.evenbeam.logbook.Session;
import org.evenbeam.logbook.Transaction;
import org.evenbeam.logbook.UseCase;
import org.evenbeam.logbook.people.People;
import org.evenbeam.logbook.run.Reasons;
import org.evenbeam.logbook.run.RunEvent;
import org.evenbeam.logbook.run.RunRecords;
import org.evenbeam.logbook.run.RunSheet;
import org.evenbeam.logbook.run.RunState;
import org.evenbeam.logbook.run.RunStep;
import org.evenbeam.logbook.run.RunSummary;
import org.evenbeam.logbook.run.SheetReader;
import org.evenbeam.logbook.run.Signature;
import org.evenbeam.verification.Verdict;

/** Approving and returning submitted runs. Nobody approves a run that they submitted. */
public final class SignOff {
  private final Desk desk;
  private final RunRecords runs;
  private final SheetReader sheets;
  private final People people;

  /** Works on the given store. */
  public SignOff(Desk desk, RunRecords runs, SheetReader sheets, People people) {
    this.desk = desk;
    this.runs = runs;
    this.sheets = sheets;
    this.people = people;
  }

  /** The runs that wait for a manager, oldest first. */
  public List<RunSummary> queue(Session session) {
    return desk.read(
        session, UseCase.READ_RUNS, transaction -> runs.inState(transaction, RunState.SUBMITTED));
  }

  /**
   * Approves a submitted run.
   *
   * @param reason what the manager decides and why; needed unless the run CONFORMS
   * @throws SignOffRefused when it is the manager's own run, is not submitted, lacks its reason, or
   *     its content is no longer what was signed
   * @throws org.evenbeam.logbook.people.PasswordWrong when the password is not the manager's
   */
  public void approve(Session session, long run, char[] password, String reason) {
    people.confirm(session, password);
    Optional<String> why = Optional.of(reason.strip()).filter(text -> !text.isEmpty());
    answer(session, run, UseCase.APPROVE_RUN, RunStep.APPROVED, why);
  }

  /**
   * Returns a submitted run to its technician.
   *
   * @throws SignOffRefused when it is not submitted
   * @throws org.evenbeam.logbook.run.RunRefused when the reason is missing
   * @throws org.evenbeam.logbook.people.PasswordWrong when the password is not the manager's
   */
  public void giveBack(Session session, long run, char[] password, String reason) {
    Optional<String> why = Optional.of(Reasons.required(reason));
    people.confirm(session, password);
    answer(session, run, UseCase.RETURN_RUN, RunStep.RETURNED, why);
  }

  private void answer(
      Session session, long run, UseCase useCase, RunStep step, Optional<String> reason) {
    desk.change(
        session,
        useCase,
        reason,
        transaction -> {
          List<RunEvent> events = runs.events(transaction, run);
          RunEvent submission = submission(run, events);
          RunSheet sheet = sheets.read(transaction, run);
          if (step == RunStep.APPROVED) {
            refuseApproval(session, sheet, submission, reason);
          }
          sign(transaction, session, sheet, submission, step, reason);
          return run;
        });
  }

  private static RunEvent submission(long run, List<RunEvent> events) {
    RunEvent last = events.stream().max(Comparator.comparingInt(RunEvent::sequence)).orElseThrow();
    if (last.step() != RunStep.SUBMITTED) {
      throw SignOffRefused.notSubmitted(run, last.step().state());
    }
    return last;
  }

  private static void refuseApproval(
      Session session, RunSheet sheet, RunEvent submission, Optional<String> reason) {
    long run = sheet.run().number();
    if (submission.personId() == session.person().id()) {
      throw SignOffRefused.ownRun(run);
    }
    boolean conforms = sheet.findings().verdict().equals(Optional.of(Verdict.CONFORMS));
    if (!conforms && reason.isEmpty()) {
      throw SignOffRefused.reasonNeeded(run);
    }
  }

  private void sign(
      Transaction transaction,
      Session session,
      RunSheet sheet,
      RunEvent submission,
      RunStep step,
      Optional<String> reason) {
    long run = sheet.run().number();
    String content = sheet.contentSha256();
    boolean asSigned =
        runs.signatures(transaction, run).stream()
            .filter(signature -> signature.meaning() == Signature.Meaning.PREPARED)
            .reduce((earlier, later) -> later)
            .filter(prepared -> prepared.contentSha256().equals(content))
            .isPresent();
    if (!asSigned) {
      throw SignOffRefused.contentChanged(run);
    }
    long eventId =
        runs.addEvent(
            transaction,
            run,
            new RunEvent(
                0,
                submission.sequence() + 1,
                step,
                session.person().id(),
                session.now(),
                reason,
                Optional.of(new RunEvent.Answered(submission.id(), submission.personId()))));
    Signature.Meaning meaning =
        step == RunStep.APPROVED ? Signature.Meaning.APPROVED : Signature.Meaning.RETURNED;
    runs.addSignature(
        transaction,
        eventId,
        new Signature(session.person().id(), meaning, session.now(), content));
  }
}
