package org.evenbeam.stats.risk;

import java.util.ArrayList;
import java.util.List;
import org.apache.commons.math3.analysis.solvers.BrentSolver;
import org.evenbeam.stats.Interval;

/**
 * The chance that an instrument of one true standard deviation falls into a {@link PassingRegion},
 * for any true bias. Mean and standard deviation of a normal sample being independent, it is one
 * integral over s: {@code P(beta) = integral of [Phi((high(s) - beta) / tau) - Phi((low(s) - beta)
 * / tau)] f(s) ds}. The limits at the points of s do not depend on the bias, so they are made once.
 */
final class PassingChance {
  /** Over this much of its argument Phi is a polynomial to the points of one panel. */
  private static final double PANEL_OF_PHI = 4;

  /** Panels keep this far from a jump, so that rounding leaves none across it. */
  private static final double BESIDE = 1e-15;

  private final double[] low;
  private final double[] high;
  private final double[] weight;

  private PassingChance(Points points) {
    this.low = points.weighted.stream().mapToDouble(Weighted::low).toArray();
    this.high = points.weighted.stream().mapToDouble(Weighted::high).toArray();
    this.weight = points.weighted.stream().mapToDouble(Weighted::weight).toArray();
  }

  /** The limits of the bias at one outcome of s, with the probability that it stands for. */
  private record Weighted(double low, double high, double weight) {}

  /** Collects outcomes. */
  static final class Points {
    private final PassingRegion region;
    private final List<Weighted> weighted = new ArrayList<>();

    Points(PassingRegion region) {
      this.region = region;
    }

    /**
     * Adds an outcome, unless the guard band closes its limits.
     *
     * @param margin the guard band
     * @param error what the outcome adds to the true bias
     * @param weight its probability
     */
    void add(double margin, double error, double weight) {
      double shift = region.guard() * margin;
      double low = region.limits().low() - shift;
      double high = region.limits().high() + shift;
      if (low <= high && weight > 0) {
        weighted.add(new Weighted(low - error, high - error, weight));
      }
    }

    PassingChance toChance() {
      return new PassingChance(this);
    }
  }

  /** Where the limits do not move with s: no integral is needed. */
  static PassingChance ofFixedLimits(PassingRegion region, double margin, double chanceOfSpread) {
    Points points = new Points(region);
    points.add(margin, 0, chanceOfSpread);
    return points.toChance();
  }

  /** Where they move with s, for the true standard deviation {@code sigma}. */
  static PassingChance ofMovingLimits(
      PassingRegion region, BiasMargin margin, SpreadRatio ratio, int n, double sigma) {
    Points points = new Points(region);
    for (Interval panel : new Layout(region, margin, ratio, n, sigma).panels()) {
      for (Panels.Node node : Panels.nodes(panel, s -> ratio.density(s / sigma) / sigma)) {
        points.add(margin.at(node.at()), 0, node.weight());
      }
    }
    return points.toChance();
  }

  /** The chance for a true bias, which the given error moves. */
  double at(double bias, ErrorOfMean error) {
    double sum = 0;
    for (int i = 0; i < weight.length; i++) {
      sum += weight[i] * (error.lowerTail(high[i] - bias) - error.lowerTail(low[i] - bias));
    }
    return sum;
  }

  /** Where the panels lie: cut at jumps and where the limits close, narrow where they move fast. */
  private record Layout(
      PassingRegion region, BiasMargin margin, SpreadRatio ratio, int n, double sigma) {

    List<Interval> panels() {
      double from = ratio.support().low() * sigma;
      double to = Math.min(ratio.support().high() * sigma, region.largestSpread());
      double jump = Math.min(Math.max(from, margin.jump()), Math.max(from, to));
      List<Interval> panels = new ArrayList<>();
      addHalved(panels, from, jump * (1 - BESIDE));
      addHalved(panels, jump * (1 + BESIDE), to);
      return panels;
    }

    private void addHalved(List<Interval> panels, double from, double to) {
      if (from < to) {
        for (Interval panel : Panels.halved(new Interval(from, to), this::tooWide)) {
          addCutWhereLimitsClose(panels, panel);
        }
      }
    }

    private boolean tooWide(double from, double to) {
      double scale = margin.referenceScale();
      boolean densityBends = to - from > ratio.smoothWidth() * sigma;
      boolean uncertaintyDoubles = Math.hypot(to, scale) > 2 * Math.hypot(from, scale) && scale > 0;
      return densityBends || uncertaintyDoubles || limitsMoveFar(from, to);
    }

    private boolean limitsMoveFar(double from, double to) {
      double move = Math.abs(margin.at(to) - margin.at(from));
      return move > PANEL_OF_PHI * sigma / Math.sqrt(n);
    }

    private void addCutWhereLimitsClose(List<Interval> panels, Interval panel) {
      if (opening(panel.low()) * opening(panel.high()) < 0) {
        double close =
            new BrentSolver(1e-14, 0).solve(200, this::opening, panel.low(), panel.high());
        panels.add(new Interval(panel.low(), close));
        panels.add(new Interval(close, panel.high()));
      } else {
        panels.add(panel);
      }
    }

    /** The width left between the limits at s, negative where nothing is. */
    private double opening(double s) {
      double width = region.limits().high() - region.limits().low();
      return width + 2 * region.guard() * margin.at(s);
    }
  }
}
