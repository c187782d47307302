package org.evenbeam.verification.plan;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/**
 * A limit as a plan states it: an absolute amount, a share of the reference value, a share of the
 * measuring range, or several of these together.
 *
 * @param absolute in the unit of the readings
 * @param percentOfReference in percent of the reference value's magnitude
 * @param percentOfRange in percent of the measuring range's span
 * @param combination how several terms become one limit
 */
public record LimitTerms(
    Optional<BigDecimal> absolute,
    Optional<BigDecimal> percentOfReference,
    Optional<BigDecimal> percentOfRange,
    Combination combination) {

  /** How several terms become one limit. */
  public enum Combination {
    /** The terms are added. */
    SUM,
    /** The greatest term counts. */
    GREATER
  }

  /** Checks that at least one term stands and that each is greater than zero. */
  public LimitTerms {
    List<BigDecimal> terms = new ArrayList<>();
    absolute.ifPresent(terms::add);
    percentOfReference.ifPresent(terms::add);
    percentOfRange.ifPresent(terms::add);
    if (terms.isEmpty()) {
      throw new IllegalArgumentException("a limit has no term, needed: at least one");
    }
    for (BigDecimal term : terms) {
      if (term.signum() <= 0) {
        throw new IllegalArgumentException("a limit's term is " + term + ", allowed: above 0");
      }
    }
  }

  /** An absolute limit, in the unit of the readings. */
  public static LimitTerms of(BigDecimal absolute) {
    return new LimitTerms(
        Optional.of(absolute), Optional.empty(), Optional.empty(), Combination.SUM);
  }

  /**
   * The limit in the unit of the readings, exactly.
   *
   * @param reference the reference value
   * @param rangeSpan the measuring range's upper end less its lower end, greater than 0
   * @throws IllegalArgumentException when the limit is a share of a reference value of zero
   */
  public BigDecimal resolve(BigDecimal reference, BigDecimal rangeSpan) {
    if (percentOfReference.isPresent() && reference.signum() == 0) {
      throw new IllegalArgumentException(
          "percentOfReference at a reference value of 0, allowed: an absolute limit");
    }
    List<BigDecimal> amounts = new ArrayList<>();
    absolute.ifPresent(amounts::add);
    percentOfReference.map(p -> share(p, reference.abs())).ifPresent(amounts::add);
    percentOfRange.map(p -> share(p, rangeSpan)).ifPresent(amounts::add);
    return combination == Combination.SUM
        ? amounts.stream().reduce(BigDecimal.ZERO, BigDecimal::add)
        : amounts.stream().reduce(BigDecimal::max).orElseThrow();
  }

  private static BigDecimal share(BigDecimal percent, BigDecimal whole) {
    BigDecimal share = percent.multiply(whole).movePointLeft(2).stripTrailingZeros();
    return share.scale() < 0 ? share.setScale(0) : share;
  }
}
