package org.evenbeam.planted.logbook.run;

import org.evenbeam.planted.app.Edge;
import org.evenbeam.planted.logbook.plans.Loop;

/** Looks up, and half of a cycle. */
public final class Knot {
  final Edge edge = new Edge();
  Loop loop;
}
