package org.evenbeam.planted.wording;

import org.evenbeam.planted.app.Edge;

/** Looks up from wording. */
public final class Climber {
  final Edge edge = new Edge();
}
