package org.evenbeam.logbook.run;

import java.util.Optional;

/**
 * A run to be started.
 *
 * @param instrumentTag the instrument
 * @param planTitle its plan; the newest revision is taken
 * @param kind in which state the instrument is measured
 * @param asLeftOf for an as-left run, what came before it; empty otherwise
 */
public record NewRun(
    String instrumentTag, String planTitle, RunKind kind, Optional<Run.AsLeftOf> asLeftOf) {}
