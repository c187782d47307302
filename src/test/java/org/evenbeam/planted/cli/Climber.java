package org.evenbeam.planted.cli;

import org.evenbeam.planted.app.Edge;

/** Looks up from cli. */
public final class Climber {
  final Edge edge = new Edge();
}
