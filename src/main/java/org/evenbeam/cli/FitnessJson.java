package org.evenbeam.cli;

import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.Optional;
import org.evenbeam.stats.fitness.Grubbs;
import org.evenbeam.stats.fitness.OrderSlope;
import org.evenbeam.stats.fitness.ShapiroWilk;
import org.evenbeam.stats.fitness.VonNeumannRatio;
import org.evenbeam.verification.Fitness;

/**
 * Whether readings are fit, as JSON: the p of the von Neumann ratio is that of a ratio at most as
 * large.
 */
final class FitnessJson {
  private FitnessJson() {}

  static void put(ObjectNode node, Fitness fitness) {
    ObjectNode shapiro = node.putObject("shapiro_wilk");
    JsonNumbers.put(shapiro, "statistic", fitness.shapiroWilk().map(ShapiroWilk::statistic));
    JsonNumbers.put(shapiro, "p", fitness.shapiroWilk().map(ShapiroWilk::p));
    ObjectNode grubbs = node.putObject("grubbs");
    JsonNumbers.put(grubbs, "statistic", fitness.grubbs().map(Grubbs::statistic));
    JsonNumbers.put(grubbs, "p_two_sided", fitness.grubbs().map(Grubbs::pBound));
    Optional<Integer> position = fitness.grubbs().map(test -> test.index() + 1);
    grubbs.put("position", position.orElse(null));
    ObjectNode neumann = node.putObject("von_neumann");
    JsonNumbers.put(neumann, "ratio", fitness.vonNeumann().map(VonNeumannRatio::statistic));
    JsonNumbers.put(neumann, "p", fitness.vonNeumann().map(VonNeumannRatio::pLower));
    JsonNumbers.put(neumann, "p_two_sided", fitness.vonNeumann().map(VonNeumannRatio::pTwoSided));
    ObjectNode slope = node.putObject("order_slope");
    JsonNumbers.put(slope, "slope", fitness.orderSlope().map(OrderSlope::slope));
    JsonNumbers.put(slope, "p", fitness.orderSlope().map(OrderSlope::p));
  }
}
