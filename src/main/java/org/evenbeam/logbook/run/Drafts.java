package org.evenbeam.logbook.run;

import org.evenbeam.logbook.Session;

/** Who may work on a run, and when. */
final class Drafts {
  private Drafts() {}

  /**
   * Requires that the run is in that state and that its own technician acts.
   *
   * @throws RunRefused otherwise
   */
  static void requireOwn(Session session, RunSheet sheet, RunState state, RunState needed) {
    if (state != needed) {
      throw RunRefused.wrongState(sheet.run().number(), state);
    }
    if (sheet.run().technicianId() != session.person().id()) {
      throw RunRefused.notYours(sheet.run().number(), sheet.technician());
    }
  }
}
