package org.evenbeam.metrology;

import java.util.List;

/**
 * The uncertainty budget of a reference value, kept and printed term by term.
 *
 * @param terms the contributions, each in the unit of the value; an empty list says that nothing
 *     was stated
 */
public record UncertaintyBudget(List<UncertaintyTerm> terms) {
  /** Keeps the terms unchangeable. */
  public UncertaintyBudget {
    terms = List.copyOf(terms);
  }

  /** Whether any uncertainty was stated at all. */
  public boolean isStated() {
    return !terms.isEmpty();
  }
}
