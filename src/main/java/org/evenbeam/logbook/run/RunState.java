package org.evenbeam.logbook.run;

/** Where a run stands, read from its last event. */
public enum RunState {
  /** Being measured. */
  DRAFT,
  /** Waiting for a manager. */
  SUBMITTED,
  /** Approved; nothing about it changes any more. */
  APPROVED,
  /** Sent back to its technician. */
  RETURNED,
  /** Given up, with a reason. */
  ABANDONED
}
