package org.evenbeam.stats.risk;

import java.util.List;
import org.evenbeam.stats.StandardNormal;

/**
 * Makes the chances at one position of the true value between two digits, and at its mirror image.
 *
 * @param relativeSigma the true standard deviation in units of the resolution
 */
record RoundedPositions(
    CheckDesign design,
    PassingRegion conforming,
    PassingRegion notRejected,
    BiasMargin margin,
    double relativeSigma) {
  /** Lets a standard deviation that equals its limit in decimals pass in spite of rounding. */
  private static final double ROUNDING = 1 + 1e-12;

  /** Few degrees of freedom are as far as the form of the distribution bears. */
  private static final double FEWEST_DEGREES = 1;

  /** From the joint distribution of sum and sum of squares. */
  List<RoundedCharacteristic.Position> exact(double position) {
    DigitCounts counts = DigitCounts.of(design.n(), relativeSigma, position);
    return List.of(exact(counts, position, 1), exact(counts, position, -1));
  }

  private RoundedCharacteristic.Position exact(DigitCounts counts, double position, int mirror) {
    PassingChance.Points pass = new PassingChance.Points(conforming);
    PassingChance.Points remain = new PassingChance.Points(notRejected);
    int n = design.n();
    double d = design.resolution();
    counts.forEach(
        (sum, squares, chance) -> {
          double spread = n == 1 ? 0 : d * spread(sum, squares);
          double error = mirror * d * ((double) sum / n - position);
          double guard = margin.at(spread);
          if (spread <= conforming.largestSpread() * ROUNDING) {
            pass.add(guard, error, chance);
          }
          if (spread <= notRejected.largestSpread() * ROUNDING) {
            remain.add(guard, error, chance);
          }
        });
    return new RoundedCharacteristic.Position(pass.toChance(), remain.toChance(), 0, 0);
  }

  /** The standard deviation of whole digits, without cancellation. */
  private double spread(long sum, long squares) {
    long n = design.n();
    return Math.sqrt((double) (n * squares - sum * sum) / (n * (n - 1)));
  }

  /** From the moments of one rounded reading. */
  List<RoundedCharacteristic.Position> byMoments(double position) {
    double[] moments = moments(position);
    double deviation = Math.sqrt(moments[1]);
    double variability = 2 / (design.n() - 1.0) + moments[2] / design.n();
    SpreadRatio ratio = new SpreadRatio(Math.max(FEWEST_DEGREES, 2 / variability));
    double sigma = deviation * design.resolution();
    PassingChance pass = chance(conforming, ratio, sigma);
    PassingChance remain =
        notRejected.equals(conforming) ? pass : chance(notRejected, ratio, sigma);
    double bias = moments[0] * design.resolution();
    double ofMean = sigma / Math.sqrt(design.n());
    return List.of(
        new RoundedCharacteristic.Position(pass, remain, bias, ofMean),
        new RoundedCharacteristic.Position(pass, remain, -bias, ofMean));
  }

  private PassingChance chance(PassingRegion region, SpreadRatio ratio, double sigma) {
    if (sigma == 0 || design.establishedSigma().isPresent()) {
      double allowed = region.largestSpread() >= 0 ? 1 : 0;
      return PassingChance.ofFixedLimits(region, margin.at(0), allowed);
    }
    if (region.guard() == 0) {
      double largest = Math.max(0, region.largestSpread() / sigma);
      return PassingChance.ofFixedLimits(region, 0, ratio.lowerTail(largest));
    }
    return PassingChance.ofMovingLimits(region, margin, ratio, design.n(), sigma);
  }

  /** Mean less the true value, variance and excess kurtosis of one rounded reading. */
  private double[] moments(double position) {
    int reach = (int) Math.ceil(10 * relativeSigma) + 2;
    double[] powers = new double[5];
    for (int k = -reach; k <= reach; k++) {
      double low = (k - 0.5 - position) / relativeSigma;
      double chance = StandardNormal.between(low, (k + 0.5 - position) / relativeSigma);
      for (int power = 0; power <= 4; power++) {
        powers[power] += chance * Math.pow(k, power);
      }
    }
    double mean = powers[1];
    double variance = powers[2] - mean * mean;
    double fourth =
        powers[4] - 4 * mean * powers[3] + 6 * mean * mean * powers[2] - 3 * Math.pow(mean, 4);
    double excess = variance > 0 ? fourth / (variance * variance) - 3 : 0;
    return new double[] {mean - position, Math.max(0, variance), excess};
  }
}
