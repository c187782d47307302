package org.evenbeam.stats.fitness;

import java.util.List;
import java.util.Optional;
import org.apache.commons.statistics.distribution.BetaDistribution;

/**
 * Cochran's test whether one run's standard deviation stands out. With the same number of readings
 * in each, {@code C = s_max^2 / sum of s_i^2}: Cochran, Annals of Eugenics 11 (1941) 47,
 * doi:10.1111/j.1469-1809.1941.tb02271.x; ISO 5725-2:1994, 7.3.3. With different numbers each run's
 * share of the sum of squares takes its place and the run with the smallest p is the one that
 * stands out: 't Lam, Analytica Chimica Acta 659 (2010) 68, doi:10.1016/j.aca.2009.11.032 (from
 * memory).
 *
 * @param index the run that stands out most, counted from 0
 * @param statistic its share of the sum of squares, which is C for equal numbers
 * @param pBound Bonferroni's upper bound of p, at most 1
 */
public record Cochran(int index, double statistic, double pBound) {
  /** Tests runs; empty where there are fewer than two, or none varies. */
  public static Optional<Cochran> of(List<Spread> runs) {
    double largest = runs.stream().mapToDouble(Spread::standardDeviation).max().orElse(0);
    if (runs.size() < 2 || largest == 0) {
      return Optional.empty();
    }
    double total = runs.stream().mapToDouble(run -> PooledDeviation.squares(run, largest)).sum();
    double freedom = runs.stream().mapToDouble(Spread::degreesOfFreedom).sum();
    Cochran out = null;
    for (int i = 0; i < runs.size(); i++) {
      double share = PooledDeviation.squares(runs.get(i), largest) / total;
      double own = runs.get(i).degreesOfFreedom();
      double tail = BetaDistribution.of(own / 2, (freedom - own) / 2).survivalProbability(share);
      if (out == null || tail * runs.size() < out.pBound()) {
        out = new Cochran(i, share, tail * runs.size());
      }
    }
    return Optional.of(new Cochran(out.index(), out.statistic(), Math.min(1, out.pBound())));
  }
}
