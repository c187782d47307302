package org.evenbeam.logbook.run;

/** What happens to a run, each kept as a row of its own. */
public enum RunStep {
  /** It was started. */
  STARTED(RunState.DRAFT),
  /** Its technician submitted it. */
  SUBMITTED(RunState.SUBMITTED),
  /** A manager approved it. */
  APPROVED(RunState.APPROVED),
  /** A manager returned it. */
  RETURNED(RunState.RETURNED),
  /** Its technician took it up again after it was returned. */
  TAKEN_UP(RunState.DRAFT),
  /** It was given up. */
  ABANDONED(RunState.ABANDONED);

  private final RunState state;

  RunStep(RunState state) {
    this.state = state;
  }

  /** The state of the run after this step. */
  public RunState state() {
    return state;
  }
}
