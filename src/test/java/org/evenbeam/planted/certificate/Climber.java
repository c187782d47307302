package org.evenbeam.planted.certificate;

import org.evenbeam.planted.app.Edge;

/** Looks up from certificate. */
public final class Climber {
  final Edge edge = new Edge();
}
