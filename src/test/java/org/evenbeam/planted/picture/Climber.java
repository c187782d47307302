package org.evenbeam.planted.picture;

import org.evenbeam.planted.app.Edge;

/** Looks up from picture. */
public final class Climber {
  final Edge edge = new Edge();
}
