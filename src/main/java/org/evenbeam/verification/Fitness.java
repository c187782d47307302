package org.evenbeam.verification;

import java.math.BigDecimal;
import java.util.Collection;
import java.util.Optional;
import org.evenbeam.stats.ExactSample;
import org.evenbeam.stats.fitness.Grubbs;
import org.evenbeam.stats.fitness.OrderSlope;
import org.evenbeam.stats.fitness.ShapiroWilk;
import org.evenbeam.stats.fitness.VonNeumannRatio;

/**
 * Whether the readings of a check point are fit for the tests made on them. What it finds is a
 * question to the technician: it removes nothing and changes no verdict.
 *
 * @param tooCoarse whether s is below two steps of the resolution, so that normality and outliers
 *     are not asked: rounded readings would flag daily
 * @param shapiroWilk normality; empty where not asked, below 3 or above 5000 readings, or all equal
 * @param grubbs the reading farthest from the mean; empty likewise, from 3 readings on
 * @param vonNeumann whether neighbours are alike; empty below 3 readings or all equal
 * @param orderSlope whether the readings climb or fall; empty likewise
 * @param distinctValues how many different values there are
 */
public record Fitness(
    boolean tooCoarse,
    Optional<ShapiroWilk> shapiroWilk,
    Optional<Grubbs> grubbs,
    Optional<VonNeumannRatio> vonNeumann,
    Optional<OrderSlope> orderSlope,
    int distinctValues) {
  /** The p below which readings are flagged: common practice. */
  public static final double FLAG = 0.01;

  private static final int FEWEST_STEPS = 2;

  static Fitness of(ExactSample sample, Optional<BigDecimal> resolution) {
    double s = sample.standardDeviation().orElse(0);
    boolean tooCoarse = resolution.filter(d -> s < FEWEST_STEPS * d.doubleValue()).isPresent();
    return new Fitness(
        tooCoarse,
        tooCoarse ? Optional.empty() : ShapiroWilk.of(sample),
        tooCoarse ? Optional.empty() : Grubbs.furthest(sample),
        VonNeumannRatio.of(sample),
        OrderSlope.of(sample),
        sample.distinctValues());
  }

  /** Adds a note for each question that the readings raise. */
  void noteFlags(Collection<Note> notes) {
    shapiroWilk
        .filter(test -> test.p() < FLAG)
        .ifPresent(test -> notes.add(new Note.NotNormal(test.p())));
    grubbs
        .filter(test -> test.pBound() < FLAG)
        .ifPresent(test -> notes.add(new Note.FarReading(test.index() + 1, test.statistic())));
    vonNeumann
        .filter(test -> test.pLower() < FLAG)
        .ifPresent(test -> notes.add(new Note.NeighboursAlike(test.pLower())));
    orderSlope
        .filter(test -> test.p() < FLAG)
        .ifPresent(
            test ->
                notes.add(
                    test.slope() > 0 ? new Note.Climbing(test.p()) : new Note.Falling(test.p())));
  }
}
