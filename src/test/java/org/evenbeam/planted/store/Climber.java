package org.evenbeam.planted.store;

import org.evenbeam.planted.app.Edge;

/** Looks up from store. */
public final class Climber {
  final Edge edge = new Edge();
}
