package org.evenbeam.stats.risk;

import java.util.OptionalDouble;
import org.evenbeam.stats.CombinedUncertainty;
import org.evenbeam.stats.UncertaintyComponent;

/**
 * The guard band {@code t u_b} between a bias and its limit, as a function of the standard
 * deviation s of the readings: {@code u_b^2 = u_rep^2 + u_r^2}, u_rep the larger of s / sqrt(n)
 * with n - 1 degrees of freedom and d / sqrt(12) with infinitely many (JCGM 100:2008, F.2.2.1), t
 * at their effective degrees of freedom (JCGM 100:2008, G.4). It jumps where the first takes over
 * from the second, and may fall as s grows where the reference has few degrees of freedom.
 */
final class BiasMargin {
  /** Where the interpolation of t starts if all degrees of freedom are infinite. */
  private static final double MANY = 1e6;

  private final int n;
  private final double resolutionFloor;
  private final UncertaintyComponent reference;
  private final OptionalDouble establishedSigma;
  private final CriticalT critical;

  private BiasMargin(CheckDesign design, UncertaintyComponent reference, CriticalT critical) {
    this.n = design.n();
    this.resolutionFloor = design.resolution() / Math.sqrt(12);
    this.reference = reference;
    this.establishedSigma = design.establishedSigma();
    this.critical = critical;
  }

  static BiasMargin of(CheckDesign design, double alpha) {
    UncertaintyComponent reference =
        design.referenceInRule() ? design.reference() : UncertaintyComponent.known(0);
    double own = design.establishedSigma().isPresent() ? MANY : design.n() - 1;
    double fewest = Math.min(own, Math.min(reference.degreesOfFreedom(), MANY));
    return new BiasMargin(design, reference, CriticalT.of(alpha, fewest));
  }

  /** The guard band at a standard deviation of the readings. */
  double at(double spread) {
    double used = establishedSigma.orElse(spread) / Math.sqrt(n);
    double freedom = establishedSigma.isPresent() ? Double.POSITIVE_INFINITY : n - 1;
    UncertaintyComponent repeatability =
        used > resolutionFloor
            ? new UncertaintyComponent(used, freedom)
            : UncertaintyComponent.known(resolutionFloor);
    CombinedUncertainty combined = CombinedUncertainty.of(repeatability, reference);
    return critical.at(combined.degreesOfFreedom()) * combined.standardUncertainty();
  }

  /** The standard deviation above which the readings outweigh their resolution: a jump. */
  double jump() {
    return resolutionFloor * Math.sqrt(n);
  }

  /** The standard deviation below which the reference outweighs the readings: a change of shape. */
  double referenceScale() {
    return reference.standardUncertainty() * Math.sqrt(n);
  }
}
