package org.evenbeam.ui.shell;

import java.time.Clock;
import java.util.List;
import org.evenbeam.ui.common.Background;
import org.evenbeam.ui.common.DocumentViewer;

/**
 * What the window needs from the machine and the launcher.
 *
 * @param background where work runs
 * @param clock where the time comes from
 * @param viewer shows documents
 * @param signInHints lines below the sign-in card; none outside the demonstration laboratory
 */
public record Surroundings(
    Background background, Clock clock, DocumentViewer viewer, List<String> signInHints) {
  /** Keeps the hints unchangeable. */
  public Surroundings {
    signInHints = List.copyOf(signInHints);
  }
}
