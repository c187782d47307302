package org.evenbeam.logbook.run;

import java.time.Instant;
import java.util.List;
import java.util.Optional;
import org.evenbeam.logbook.Transaction;
import org.evenbeam.verification.Verdict;
import org.evenbeam.verification.plan.Conditions;

/** Where runs and all that belongs to them are kept. */
public interface RunRecords {
  /** Adds a run with the standards in use and returns its number. */
  long add(Transaction transaction, Run run);

  /** The run of that number. */
  Optional<Run> find(Transaction transaction, long number);

  /** Runs in that state, oldest first. */
  List<RunSummary> inState(Transaction transaction, RunState state);

  /** An instrument's runs, newest first, at most {@code most}. */
  List<RunSummary> ofInstrument(Transaction transaction, String instrumentTag, int most);

  /** Adds a step and returns its key. Two steps of the same sequence cannot both be kept. */
  long addEvent(Transaction transaction, long run, RunEvent event);

  /** The run's steps, oldest first. */
  List<RunEvent> events(Transaction transaction, long run);

  /** Adds the signature of a step. */
  void addSignature(Transaction transaction, long eventId, Signature signature);

  /** The signatures of a run, oldest first. */
  List<Signature> signatures(Transaction transaction, long run);

  /** Adds the conditions as recorded; earlier ones stay as rows. */
  void addConditions(
      Transaction transaction, long run, Conditions conditions, long personId, Instant at);

  /** The conditions recorded last, {@link Conditions#NONE} before any. */
  Conditions conditions(Transaction transaction, long run);

  /** Adds a reading and returns its key. */
  long addReading(Transaction transaction, long run, Reading reading);

  /** Strikes a reading. */
  void addStrike(Transaction transaction, long readingId, Reading.Strike strike);

  /** Every reading of a run, corrected and struck ones too, in the order of entry. */
  List<Reading> readings(Transaction transaction, long run);

  /** Adds the findings and the verdict of a submission. */
  void addFindings(
      Transaction transaction,
      long submissionEventId,
      Optional<Verdict> verdict,
      List<KeptFinding> findings);

  /** The findings of a submission. */
  List<KeptFinding> findings(Transaction transaction, long submissionEventId);

  /** Keeps a scratch in place of the last one of that check point; an empty text removes it. */
  void keepScratch(Transaction transaction, long run, Scratch scratch);

  /** The scratches kept for a run. */
  List<Scratch> scratches(Transaction transaction, long run);
}
