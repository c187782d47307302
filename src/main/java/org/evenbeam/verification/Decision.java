package org.evenbeam.verification;

import org.evenbeam.stats.Shown;

/** Turns what was shown into a verdict, by the decision rule in force (JCGM 106:2012, clause 8). */
final class Decision {
  private Decision() {}

  /**
   * The verdict.
   *
   * @param rule the rule in force
   * @param shown what interval or bound showed
   * @param estimateWithin whether the estimate itself lies within the limit, the limit included
   */
  static Verdict by(DecisionRule rule, Shown shown, boolean estimateWithin) {
    return switch (rule) {
      case GUARDED_ACCEPTANCE ->
          switch (shown) {
            case WITHIN -> Verdict.CONFORMS;
            case BEYOND -> Verdict.DOES_NOT_CONFORM;
            case NEITHER -> Verdict.UNDECIDED;
          };
      case GUARDED_REJECTION -> shown == Shown.BEYOND ? Verdict.DOES_NOT_CONFORM : Verdict.CONFORMS;
      case SIMPLE_ACCEPTANCE -> estimateWithin ? Verdict.CONFORMS : Verdict.DOES_NOT_CONFORM;
    };
  }
}
