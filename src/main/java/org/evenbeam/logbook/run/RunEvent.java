package org.evenbeam.logbook.run;

import java.time.Instant;
import java.util.Optional;

/**
 * One step of a run's life.
 *
 * @param id the key in the logbook, 0 before it is kept
 * @param sequence 1 for the first step of the run, each next one more; unique in the run
 * @param step what happened
 * @param personId who did it
 * @param at when
 * @param reason why, where one was asked for
 * @param answers for an approval or a return, the submission that it answers
 */
public record RunEvent(
    long id,
    int sequence,
    RunStep step,
    long personId,
    Instant at,
    Optional<String> reason,
    Optional<Answered> answers) {

  /**
   * The submission that a manager answers, with its submitter, so that the store can refuse the
   * same person.
   *
   * @param eventId the submission's key
   * @param personId who submitted
   */
  public record Answered(long eventId, long personId) {}
}
