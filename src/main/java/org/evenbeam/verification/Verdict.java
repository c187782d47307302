package org.evenbeam.verification;

import java.util.Collection;
import java.util.Comparator;

/** What was decided, from the best to the worst. */
public enum Verdict {
  /** The requirement is met by the decision rule in force. */
  CONFORMS,
  /** Neither shown, under a rule that asks for proof. */
  UNDECIDED,
  /** The requirement is not met by the decision rule in force. */
  DOES_NOT_CONFORM;

  /**
   * The worst of several: the worst criterion decides the check point, the worst check point the
   * run.
   *
   * @throws java.util.NoSuchElementException when there is none
   */
  public static Verdict worst(Collection<Verdict> verdicts) {
    return verdicts.stream().max(Comparator.naturalOrder()).orElseThrow();
  }
}
