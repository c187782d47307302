package org.evenbeam.store.tables;

import java.time.Instant;
import java.util.List;
import java.util.Optional;
import org.evenbeam.logbook.Transaction;
import org.evenbeam.logbook.run.KeptFinding;
import org.evenbeam.logbook.run.Reading;
import org.evenbeam.logbook.run.Run;
import org.evenbeam.logbook.run.RunEvent;
import org.evenbeam.logbook.run.RunRecords;
import org.evenbeam.logbook.run.RunState;
import org.evenbeam.logbook.run.RunSummary;
import org.evenbeam.logbook.run.Scratch;
import org.evenbeam.logbook.run.Signature;
import org.evenbeam.verification.Verdict;
import org.evenbeam.verification.plan.Conditions;

/** Runs and all that belongs to them, each part in a class of its own. */
public final class RunTable implements RunRecords {
  /** A table of any open store. */
  public RunTable() {}

  @Override
  public long add(Transaction transaction, Run run) {
    return Runs.add(transaction, run);
  }

  @Override
  public Optional<Run> find(Transaction transaction, long number) {
    return Runs.find(transaction, number);
  }

  @Override
  public List<RunSummary> inState(Transaction transaction, RunState state) {
    return RunSummaries.inState(transaction, state);
  }

  @Override
  public List<RunSummary> ofInstrument(Transaction transaction, String instrumentTag, int most) {
    return RunSummaries.ofInstrument(transaction, instrumentTag, most);
  }

  @Override
  public long addEvent(Transaction transaction, long run, RunEvent event) {
    return RunEvents.add(transaction, run, event);
  }

  @Override
  public List<RunEvent> events(Transaction transaction, long run) {
    return RunEvents.of(transaction, run);
  }

  @Override
  public void addSignature(Transaction transaction, long eventId, Signature signature) {
    RunEvents.sign(transaction, eventId, signature);
  }

  @Override
  public List<Signature> signatures(Transaction transaction, long run) {
    return RunEvents.signatures(transaction, run);
  }

  @Override
  public void addConditions(
      Transaction transaction, long run, Conditions conditions, long personId, Instant at) {
    RunConditions.add(transaction, run, conditions, personId, at);
  }

  @Override
  public Conditions conditions(Transaction transaction, long run) {
    return RunConditions.newest(transaction, run);
  }

  @Override
  public long addReading(Transaction transaction, long run, Reading reading) {
    return Readings.add(transaction, run, reading);
  }

  @Override
  public void addStrike(Transaction transaction, long readingId, Reading.Strike strike) {
    Readings.strike(transaction, readingId, strike);
  }

  @Override
  public List<Reading> readings(Transaction transaction, long run) {
    return Readings.of(transaction, run);
  }

  @Override
  public void addFindings(
      Transaction transaction,
      long submissionEventId,
      Optional<Verdict> verdict,
      List<KeptFinding> findings) {
    Findings.add(transaction, submissionEventId, verdict, findings);
  }

  @Override
  public List<KeptFinding> findings(Transaction transaction, long submissionEventId) {
    return Findings.of(transaction, submissionEventId);
  }

  @Override
  public void keepScratch(Transaction transaction, long run, Scratch scratch) {
    Scratches.keep(transaction, run, scratch);
  }

  @Override
  public List<Scratch> scratches(Transaction transaction, long run) {
    return Scratches.of(transaction, run);
  }
}
