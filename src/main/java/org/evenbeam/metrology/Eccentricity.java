package org.evenbeam.metrology;

import java.math.BigDecimal;
import java.util.Comparator;
import java.util.List;

/**
 * One load weighed at several positions of a balance's pan (OIML R 76-1, test of eccentric
 * loading).
 *
 * @param indications at least two, each at a position of its own
 */
public record Eccentricity(List<Indication> indications) {
  /**
   * What the balance showed.
   *
   * @param position where the load stood, in the laboratory's words
   * @param value the indication there
   */
  public record Indication(String position, BigDecimal value) {}

  /**
   * Keeps the indications in their order.
   *
   * @throws IllegalArgumentException if there are fewer than two, or a position comes twice
   */
  public Eccentricity {
    indications = List.copyOf(indications);
    if (indications.size() < 2) {
      throw new IllegalArgumentException(
          "number of positions is " + indications.size() + ", allowed: 2 or more");
    }
    long distinct = indications.stream().map(Indication::position).distinct().count();
    if (distinct < indications.size()) {
      throw new IllegalArgumentException(
          "number of different positions is "
              + distinct
              + " for "
              + indications.size()
              + " indications, allowed: as many as indications");
    }
  }

  /** The largest difference between two positions, 0 or more, in the indications' unit. */
  public BigDecimal largestDifference() {
    return highest().value().subtract(lowest().value());
  }

  /** Where the balance showed most; the first such position. */
  public Indication highest() {
    return indications.stream().min(byValue().reversed()).orElseThrow();
  }

  /** Where the balance showed least; the first such position. */
  public Indication lowest() {
    return indications.stream().min(byValue()).orElseThrow();
  }

  private static Comparator<Indication> byValue() {
    return Comparator.comparing(Indication::value);
  }
}
