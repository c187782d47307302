package org.evenbeam.verification;

/** How an interval or an estimate becomes a verdict (JCGM 106:2012, clause 8). */
public enum DecisionRule {
  /** CONFORMS only when shown within the limit; the default for bias (JCGM 106, 8.3.2). */
  GUARDED_ACCEPTANCE,
  /**
   * DOES NOT CONFORM only when shown beyond the limit; the default for precision (JCGM 106, 8.3.3;
   * ISO 5725-6 tests repeatability this way).
   */
  GUARDED_REJECTION,
  /** The estimate alone decides (JCGM 106, 8.2). */
  SIMPLE_ACCEPTANCE
}
