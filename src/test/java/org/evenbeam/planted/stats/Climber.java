package org.evenbeam.planted.stats;

import org.evenbeam.planted.app.Edge;

/** Looks up from stats. */
public final class Climber {
  final Edge edge = new Edge();
}
