package org.evenbeam.logbook.run;

import java.time.Instant;
import java.util.Optional;
import org.evenbeam.verification.Verdict;

/**
 * A run in a list.
 *
 * @param number the run's number
 * @param instrumentTag the instrument
 * @param planTitle its plan
 * @param planRevision the plan's revision
 * @param kind in which state the instrument was measured
 * @param technicianId who measures
 * @param technician that person's name
 * @param startedAt when it was started
 * @param state where it stands
 * @param verdict the verdict at its last submission; empty before, or where none could be given
 */
public record RunSummary(
    long number,
    String instrumentTag,
    String planTitle,
    int planRevision,
    RunKind kind,
    long technicianId,
    String technician,
    Instant startedAt,
    RunState state,
    Optional<Verdict> verdict) {}
