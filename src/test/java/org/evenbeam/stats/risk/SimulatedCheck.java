package org.evenbeam.stats.risk;

import java.util.Random;
import org.evenbeam.stats.CombinedUncertainty;
import org.evenbeam.stats.EqualReadingsBound;
import org.evenbeam.stats.LimitTest;
import org.evenbeam.stats.Shown;
import org.evenbeam.stats.StandardDeviationBounds;
import org.evenbeam.stats.StandardNormal;
import org.evenbeam.stats.UncertaintyComponent;

/** Checks on simulated normal readings, each judged by the tests and the rules' words. */
final class SimulatedCheck {
  private final CheckDesign design;
  private final double trials;
  private EqualReadingsBound equal;
  private int conforming;
  private int rejected;

  SimulatedCheck(CheckDesign design, double bias, double sigma, int trials, long seed) {
    this.design = design;
    this.trials = trials;
    Random random = new Random(seed);
    for (int i = 0; i < trials; i++) {
      double error = design.reference().standardUncertainty() * random.nextGaussian();
      double position = design.resolution() * (random.nextDouble() - 0.5);
      double[] readings =
          random
              .doubles(design.n())
              .map(u -> position + sigma * StandardNormal.quantileOfUpperTail(1 - u))
              .map(this::rounded)
              .toArray();
      judge(readings, bias + error - position);
    }
  }

  private double rounded(double reading) {
    double d = design.resolution();
    return d == 0 ? reading : d * Math.rint(reading / d);
  }

  double conforms() {
    return conforming / trials;
  }

  double doesNotConform() {
    return rejected / trials;
  }

  private void judge(double[] readings, double offset) {
    int n = readings.length;
    double mean = 0;
    for (double reading : readings) {
      mean += reading / n;
    }
    double squares = 0;
    for (double reading : readings) {
      squares += (reading - mean) * (reading - mean);
    }
    double s = Math.sqrt(squares / (n - 1));
    int bias = biasVerdict(mean + offset, s);
    int precision = precisionVerdict(s);
    conforming += bias == 1 && precision == 1 ? 1 : 0;
    rejected += bias == -1 || precision == -1 ? 1 : 0;
  }

  private int biasVerdict(double observed, double s) {
    BiasCriterion criterion = design.bias().orElseThrow();
    CombinedUncertainty uncertainty =
        CombinedUncertainty.of(repeatability(s / Math.sqrt(design.n())), design.reference());
    LimitTest test = LimitTest.of(observed, uncertainty, criterion.limits(), criterion.alpha());
    boolean within = criterion.limits().permitted().contains(observed);
    return verdict(criterion.rule(), test.shown(), within);
  }

  private UncertaintyComponent repeatability(double ofMean) {
    double floor = design.resolution() / Math.sqrt(12);
    return ofMean > floor
        ? new UncertaintyComponent(ofMean, design.n() - 1)
        : UncertaintyComponent.known(floor);
  }

  private int precisionVerdict(double s) {
    PrecisionCriterion criterion = design.precision().orElseThrow();
    return verdict(criterion.rule(), precisionShown(s, criterion), s <= criterion.limit());
  }

  private Shown precisionShown(double s, PrecisionCriterion criterion) {
    if (design.resolution() == 0) {
      return StandardDeviationBounds.of(s, design.n(), criterion.alpha())
          .shownAgainst(criterion.limit());
    }
    if (equal == null) {
      equal = EqualReadingsBound.of(design.n(), design.resolution(), criterion.alpha());
    }
    return s == 0
        ? equal.shownAgainst(criterion.limit())
        : StandardDeviationBounds.of(s, design.n(), criterion.alpha())
            .raisedTo(equal.upperBound())
            .shownAgainst(criterion.limit());
  }

  /** 1 conforms, -1 does not, 0 undecided. */
  private static int verdict(DecisionRule rule, Shown shown, boolean estimateWithin) {
    return switch (rule) {
      case GUARDED_ACCEPTANCE -> shown == Shown.WITHIN ? 1 : shown == Shown.BEYOND ? -1 : 0;
      case GUARDED_REJECTION -> shown == Shown.BEYOND ? -1 : 1;
      case SIMPLE_ACCEPTANCE -> estimateWithin ? 1 : -1;
    };
  }
}
