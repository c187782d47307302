package org.evenbeam.stats.samplesize;

import java.util.function.IntPredicate;

/** The answer to how many readings are needed. */
public sealed interface ReadingsNeeded {
  /** The most readings that a search looks at unless it is told otherwise. */
  int CAP = 1_000_000;

  /**
   * This many readings are enough, and one less is not.
   *
   * @param n number of readings
   */
  record Enough(int n) implements ReadingsNeeded {}

  /**
   * No number of readings up to the cap is enough.
   *
   * @param cap the largest number looked at
   */
  record NotUpTo(int cap) implements ReadingsNeeded {}

  /** The first number from {@code fewest} that satisfies a condition which, once true, stays so. */
  static ReadingsNeeded first(int fewest, int cap, IntPredicate enough) {
    int low = fewest;
    int high = fewest;
    // Doubling first: the condition costs more, the more readings there are.
    while (!enough.test(high)) {
      if (high >= cap) {
        return new NotUpTo(cap);
      }
      low = high + 1;
      high = (int) Math.min(cap, 2L * high);
    }
    while (low < high) {
      int middle = low + (high - low) / 2;
      if (enough.test(middle)) {
        high = middle;
      } else {
        low = middle + 1;
      }
    }
    return new Enough(low);
  }

  /** A number worked out by a formula, rounded up; not a whole number below {@code fewest}. */
  static ReadingsNeeded roundedUp(double n, int fewest) {
    return n > CAP ? new NotUpTo(CAP) : new Enough(Math.max(fewest, (int) Math.ceil(n)));
  }
}
