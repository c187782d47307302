package org.evenbeam.logbook.run;

/** In which state the instrument was measured. */
public enum RunKind {
  /** Before any adjustment; an adjustment may follow. */
  AS_FOUND,
  /** After an adjustment, named with the as-found run before it. */
  AS_LEFT,
  /** As found, and nothing was adjusted: one run serves both. */
  AS_FOUND_LEFT_SO
}
