package org.evenbeam.planted.trail;

import org.evenbeam.planted.app.Edge;

/** Looks up from trail. */
public final class Climber {
  final Edge edge = new Edge();
}
