package org.evenbeam.logbook.run;

import java.util.List;

/**
 * A run sheet as a screen opens it.
 *
 * @param sheet the run with its readings
 * @param state where it stands
 * @param events its steps, oldest first
 * @param scratches what was being typed and not yet entered
 */
public record OpenSheet(
    RunSheet sheet, RunState state, List<RunEvent> events, List<Scratch> scratches) {
  /** Keeps the lists unchangeable. */
  public OpenSheet {
    events = List.copyOf(events);
    scratches = List.copyOf(scratches);
  }
}
