package org.evenbeam.stats.risk;

import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Deque;
import java.util.List;
import java.util.function.DoubleUnaryOperator;
import org.apache.commons.math3.analysis.integration.gauss.GaussIntegrator;
import org.apache.commons.math3.analysis.integration.gauss.GaussIntegratorFactory;
import org.evenbeam.stats.Interval;

/** Composite Gauss-Legendre quadrature on panels that are halved until they are narrow enough. */
final class Panels {
  private static final int POINTS = 16;
  private static final GaussIntegrator RULE = new GaussIntegratorFactory().legendre(POINTS);

  /** A bound for hopeless integrands: the panels are then as narrow as it allows. */
  private static final int MOST = 2048;

  /** Decides whether an integrand needs a panel halved. */
  interface Width {
    boolean tooWide(double from, double to);
  }

  /** One point of a quadrature. */
  record Node(double at, double weight) {}

  private Panels() {}

  /** Halves a range, widest panels first, until none is too wide. */
  static List<Interval> halved(Interval range, Width width) {
    Deque<Interval> pending = new ArrayDeque<>(List.of(range));
    List<Interval> narrow = new ArrayList<>();
    while (!pending.isEmpty()) {
      Interval panel = pending.poll();
      boolean room = narrow.size() + pending.size() < MOST;
      if (room && width.tooWide(panel.low(), panel.high())) {
        double middle = panel.low() + (panel.high() - panel.low()) / 2;
        pending.add(new Interval(panel.low(), middle));
        pending.add(new Interval(middle, panel.high()));
      } else {
        narrow.add(panel);
      }
    }
    return narrow;
  }

  /** The points of one panel, their weights multiplied by a density. */
  static List<Node> nodes(Interval panel, DoubleUnaryOperator density) {
    double half = (panel.high() - panel.low()) / 2;
    double middle = panel.low() + half;
    List<Node> nodes = new ArrayList<>(POINTS);
    for (int i = 0; i < POINTS; i++) {
      double at = middle + half * RULE.getPoint(i);
      nodes.add(new Node(at, half * RULE.getWeight(i) * density.applyAsDouble(at)));
    }
    return nodes;
  }
}
