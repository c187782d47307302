package org.evenbeam.logbook.run;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.evenbeam.logbook.Desk;
import org.evenbeam.logbook.LastingJson;
import org.evenbeam.logbook.Session;
import org.evenbeam.logbook.Transaction;
import org.evenbeam.logbook.UseCase;
import org.evenbeam.logbook.instruments.InstrumentEvent;
import org.evenbeam.logbook.instruments.InstrumentRecords;
import org.evenbeam.logbook.instruments.InstrumentStatus;
import org.evenbeam.logbook.people.People;
import org.evenbeam.verification.CheckPointEvaluation;
import org.evenbeam.verification.CheckPointFindings;
import org.evenbeam.verification.Criteria;
import org.evenbeam.verification.Criterion;
import org.evenbeam.verification.RunFindings;
import org.evenbeam.verification.Verdict;

/**
 * Submitting a run: the technician's signature, the findings kept as they are at that moment, and
 * an instrument that does not conform taken out of service at once.
 */
public final class Submissions {
  private final Desk desk;
  private final RunRecords runs;
  private final InstrumentRecords instruments;
  private final SheetReader sheets;
  private final People people;

  /** Works on the given store. */
  public Submissions(
      Desk desk,
      RunRecords runs,
      InstrumentRecords instruments,
      SheetReader sheets,
      People people) {
    this.desk = desk;
    this.runs = runs;
    this.instruments = instruments;
    this.sheets = sheets;
    this.people = people;
  }

  /**
   * Submits a draft for approval.
   *
   * @param password the technician's, for the signature
   * @param withoutVerdict whether to submit although there is no verdict
   * @return what was found, as kept
   * @throws RunRefused when there is nothing to submit, there is no verdict and {@code
   *     withoutVerdict} is false, or the run is no draft of this person
   * @throws org.evenbeam.logbook.people.PasswordWrong when the password is not the technician's
   */
  public RunFindings submit(Session session, long number, char[] password, boolean withoutVerdict) {
    people.confirm(session, password);
    return desk.change(
        session,
        UseCase.SUBMIT_RUN,
        transaction -> {
          RunSheet sheet = sheets.read(transaction, number);
          List<RunEvent> events = runs.events(transaction, number);
          Drafts.requireOwn(session, sheet, Runs.state(events), RunState.DRAFT);
          RunFindings findings = submittable(sheet, withoutVerdict);
          keep(transaction, session, sheet, findings, events.size() + 1);
          return findings;
        });
  }

  private static RunFindings submittable(RunSheet sheet, boolean withoutVerdict) {
    RunFindings findings = sheet.findings();
    if (findings.checkPoints().isEmpty()) {
      throw RunRefused.noReadings();
    }
    if (findings.verdict().isEmpty() && !withoutVerdict) {
      throw RunRefused.noVerdict();
    }
    return findings;
  }

  private void keep(
      Transaction transaction,
      Session session,
      RunSheet sheet,
      RunFindings findings,
      int sequence) {
    long number = sheet.run().number();
    RunEvent submission =
        new RunEvent(
            0,
            sequence,
            RunStep.SUBMITTED,
            session.person().id(),
            session.now(),
            Optional.empty(),
            Optional.empty());
    long eventId = runs.addEvent(transaction, number, submission);
    runs.addSignature(
        transaction,
        eventId,
        new Signature(
            session.person().id(),
            Signature.Meaning.PREPARED,
            session.now(),
            sheet.contentSha256()));
    runs.addFindings(transaction, eventId, findings.verdict(), kept(findings));
    if (findings.verdict().equals(Optional.of(Verdict.DOES_NOT_CONFORM))) {
      stop(transaction, session, sheet);
    }
  }

  private void stop(Transaction transaction, Session session, RunSheet sheet) {
    instruments.addEvent(
        transaction,
        sheet.run().instrumentTag(),
        new InstrumentEvent(
            0,
            InstrumentEvent.Kind.STOPPED,
            session.now(),
            session.person().id(),
            Long.toString(sheet.run().number()),
            Optional.of(InstrumentStatus.OUT_OF_SERVICE)));
  }

  private static List<KeptFinding> kept(RunFindings findings) {
    List<KeptFinding> kept = new ArrayList<>();
    for (CheckPointFindings found : findings.checkPoints()) {
      Criteria criteria = found.question().criteria();
      String label = found.question().label();
      if (criteria.asksBias()) {
        kept.add(
            new KeptFinding(
                label,
                Criterion.BIAS,
                criteria.biasRule(),
                found.biasFinding().outcome(),
                CheckPointEvaluation.RULES_VERSION,
                LastingJson.write(found.biasFinding())));
      }
      if (criteria.asksPrecision()) {
        kept.add(
            new KeptFinding(
                label,
                Criterion.PRECISION,
                criteria.precisionRule(),
                found.precisionFinding().outcome(),
                CheckPointEvaluation.RULES_VERSION,
                LastingJson.write(found.precisionFinding())));
      }
    }
    return kept;
  }
}
