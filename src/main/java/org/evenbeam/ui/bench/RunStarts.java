package org.evenbeam.ui.bench;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import org.evenbeam.logbook.Session;
import org.evenbeam.logbook.instruments.InstrumentEvent;
import org.evenbeam.logbook.open.OpenLogbook;
import org.evenbeam.logbook.run.Run;
import org.evenbeam.logbook.run.RunKind;
import org.evenbeam.logbook.run.RunState;
import org.evenbeam.logbook.run.RunSummary;
import org.evenbeam.verification.plan.PlanRevision;

/**
 * What can be started on an instrument now.
 *
 * @param plans its plans, the newest revision of each
 * @param kinds the kinds of run that are possible
 * @param asLeftOf what an as-left run would follow
 */
public record RunStarts(
    List<PlanRevision> plans, List<RunKind> kinds, Optional<Run.AsLeftOf> asLeftOf) {
  private static final int RUNS_LOOKED_AT = 50;

  /** Keeps the lists unchangeable. */
  public RunStarts {
    plans = List.copyOf(plans);
    kinds = List.copyOf(kinds);
  }

  /** Reads it; off the screen's thread. */
  static RunStarts read(OpenLogbook logbook, Session session, String tag) {
    Optional<Run.AsLeftOf> before = lastAdjusted(logbook, session, tag);
    List<RunKind> kinds = new ArrayList<>(List.of(RunKind.AS_FOUND_LEFT_SO, RunKind.AS_FOUND));
    if (before.isPresent()) {
      kinds.add(RunKind.AS_LEFT);
    }
    return new RunStarts(logbook.plans().current(session, tag), kinds, before);
  }

  /** The last as-found run after which the instrument was adjusted, with that adjustment. */
  private static Optional<Run.AsLeftOf> lastAdjusted(
      OpenLogbook logbook, Session session, String tag) {
    List<InstrumentEvent> adjustments =
        logbook.instruments().events(session, tag).stream()
            .filter(event -> event.kind() == InstrumentEvent.Kind.ADJUSTMENT)
            .toList();
    return logbook.runs().ofInstrument(session, tag, RUNS_LOOKED_AT).stream()
        .filter(run -> run.state() != RunState.ABANDONED)
        .max(Comparator.comparing(RunSummary::startedAt))
        .filter(run -> run.kind() != RunKind.AS_LEFT)
        .flatMap(
            run ->
                adjustments.stream()
                    .filter(event -> event.at().isAfter(run.startedAt()))
                    .max(Comparator.comparing(InstrumentEvent::at))
                    .map(event -> new Run.AsLeftOf(run.number(), event.id())));
  }
}
