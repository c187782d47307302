package org.evenbeam.verification.plan;

import java.util.List;

/**
 * One numbered revision of an instrument's verification plan; never edited, only followed by
 * another.
 *
 * @param instrumentTag the instrument it is for
 * @param title what the plan is called
 * @param revision 1 for the first
 * @param method how the check is done, in the laboratory's words
 * @param intervalDays days from one verification to the next, 1 or more
 * @param environment the conditions under which the verdict holds
 * @param checkPoints at least one, in bench order
 */
public record PlanRevision(
    String instrumentTag,
    String title,
    int revision,
    String method,
    int intervalDays,
    EnvironmentLimits environment,
    List<PlannedCheckPoint> checkPoints) {
  /** Checks the ranges and keeps the check points unchangeable. */
  public PlanRevision {
    if (revision < 1) {
      throw new IllegalArgumentException("revision is " + revision + ", allowed: 1 or more");
    }
    if (intervalDays < 1) {
      throw new IllegalArgumentException(
          "intervalDays is " + intervalDays + ", allowed: 1 or more");
    }
    if (checkPoints.isEmpty()) {
      throw new IllegalArgumentException("checkPoints is empty, allowed: at least one");
    }
    checkPoints = List.copyOf(checkPoints);
  }

  /**
   * The check point of that label.
   *
   * @throws IllegalArgumentException when the plan has none
   */
  public PlannedCheckPoint checkPoint(String label) {
    return checkPoints.stream()
        .filter(checkPoint -> checkPoint.label().equals(label))
        .findFirst()
        .orElseThrow(() -> new IllegalArgumentException("no check point " + label));
  }
}
