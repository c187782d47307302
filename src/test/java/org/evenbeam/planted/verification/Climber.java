package org.evenbeam.planted.verification;

import org.evenbeam.planted.app.Edge;

/** Looks up from verification. */
public final class Climber {
  final Edge edge = new Edge();
}
