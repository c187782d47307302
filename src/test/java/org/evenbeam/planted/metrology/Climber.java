package org.evenbeam.planted.metrology;

import org.evenbeam.planted.app.Edge;

/** Looks up from metrology. */
public final class Climber {
  final Edge edge = new Edge();
}
