package org.evenbeam.ui.runsheet;

import org.evenbeam.logbook.Role;
import org.evenbeam.logbook.Session;
import org.evenbeam.logbook.instruments.InstrumentOverview;
import org.evenbeam.logbook.open.OpenLogbook;
import org.evenbeam.logbook.run.OpenSheet;
import org.evenbeam.logbook.run.RunSheet;
import org.evenbeam.logbook.run.RunState;

/**
 * A run as the screen has it.
 *
 * @param open the sheet as read last
 * @param instrument its instrument with its status
 */
public record SheetState(OpenSheet open, InstrumentOverview instrument) {
  /** Reads it; off the screen's thread. */
  static SheetState read(OpenLogbook logbook, Session session, long run) {
    OpenSheet open = logbook.runs().open(session, run);
    String tag = open.sheet().run().instrumentTag();
    InstrumentOverview overview =
        logbook.instruments().all(session).stream()
            .filter(instrument -> instrument.instrument().tag().equals(tag))
            .findFirst()
            .orElseThrow();
    return new SheetState(open, overview);
  }

  RunSheet sheet() {
    return open.sheet();
  }

  /** The unit of its readings, a UCUM code. */
  String unit() {
    return sheet().instrument().unit();
  }

  /** Whether this person may enter anything into it. */
  boolean isOpenTo(Session session) {
    return open.state() == RunState.DRAFT
        && sheet().run().technicianId() == session.person().id()
        && session.person().role() != Role.AUDITOR;
  }
}
