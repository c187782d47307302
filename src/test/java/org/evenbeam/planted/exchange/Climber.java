package org.evenbeam.planted.exchange;

import org.evenbeam.planted.app.Edge;

/** Looks up from exchange. */
public final class Climber {
  final Edge edge = new Edge();
}
