package org.evenbeam.logbook.standards;

import java.math.BigDecimal;
import org.evenbeam.metrology.UncertaintyBudget;
import org.evenbeam.stats.CombinedUncertainty;
import org.evenbeam.stats.UncertaintyComponent;
import org.evenbeam.verification.Reference;

/**
 * One value that a certificate states, with the budget of its use here.
 *
 * @param label which value of the standard, such as 100 g; unique in its certificate
 * @param value in the standard's unit
 * @param budget the contributions to its standard uncertainty; empty says that none was stated
 */
public record CertifiedValue(String label, BigDecimal value, UncertaintyBudget budget) {

  /**
   * The value that readings are held against, with its combined standard uncertainty and effective
   * degrees of freedom (JCGM 100:2008, 5.1.2 and G.4).
   */
  public Reference reference() {
    if (!budget.isStated()) {
      return Reference.takenAsExact(value);
    }
    CombinedUncertainty combined =
        CombinedUncertainty.of(
            budget.terms().stream()
                .map(
                    term ->
                        new UncertaintyComponent(
                            term.standardUncertainty(), term.degreesOfFreedom()))
                .toList());
    return new Reference(value, combined.standardUncertainty(), combined.degreesOfFreedom(), true);
  }
}
