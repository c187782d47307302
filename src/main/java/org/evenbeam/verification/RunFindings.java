package org.evenbeam.verification;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/**
 * Everything found in one run.
 *
 * @param checkPoints one for each check point that has readings, in the plan's order
 * @param verdict the worst check point decides; empty where any has none or where the run itself
 *     lacks something
 * @param notes what keeps the run from a verdict, or must be known beside it
 */
public record RunFindings(
    List<CheckPointFindings> checkPoints, Optional<Verdict> verdict, List<Note> notes) {
  /** Keeps the lists unchangeable. */
  public RunFindings {
    checkPoints = List.copyOf(checkPoints);
    notes = List.copyOf(notes);
  }

  /**
   * Puts a run's findings together.
   *
   * @param planned how many check points the plan has
   * @param checkPoints the findings of those with readings
   * @param obstacles what keeps the run from a verdict whatever the readings say
   */
  public static RunFindings of(
      int planned, List<CheckPointFindings> checkPoints, List<Note> obstacles) {
    List<Verdict> verdicts = new ArrayList<>();
    checkPoints.forEach(checkPoint -> checkPoint.verdict().ifPresent(verdicts::add));
    boolean complete = verdicts.size() == planned && obstacles.isEmpty();
    return new RunFindings(
        checkPoints, complete ? Optional.of(Verdict.worst(verdicts)) : Optional.empty(), obstacles);
  }
}
