package org.evenbeam.logbook;

/** What a person is in the laboratory. */
public enum Role {
  /** Measures, and submits runs. */
  TECHNICIAN,
  /** Keeps instruments, standards, plans and people; approves or returns runs. */
  MANAGER,
  /** Reads everything, changes nothing. */
  AUDITOR
}
