package org.evenbeam.logbook.standards;

import java.math.BigDecimal;
import org.evenbeam.metrology.UncertaintyBudget;

/**
 * One value that a certificate states, with the budget of its use here.
 *
 * @param label which value of the standard, such as 100 g; unique in its certificate
 * @param value in the standard's unit
 * @param budget the contributions to its standard uncertainty; empty says that none was stated
 */
public record CertifiedValue(String label, BigDecimal value, UncertaintyBudget budget) {}
