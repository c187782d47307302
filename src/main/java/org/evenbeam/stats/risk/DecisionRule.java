package org.evenbeam.stats.risk;

/** How what is shown about a limit becomes a verdict. Source: JCGM 106:2012, 8.2 and 8.3. */
public enum DecisionRule {
  /** Conforms only where shown within; does not conform where shown beyond; else undecided. */
  GUARDED_ACCEPTANCE,
  /** Does not conform where shown beyond; else conforms. */
  GUARDED_REJECTION,
  /** Conforms where the estimate is within the limit; else does not conform. */
  SIMPLE_ACCEPTANCE
}
