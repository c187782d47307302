package org.evenbeam.wording;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;
import org.evenbeam.metrology.DecimalSign;
import org.evenbeam.stats.Interval;
import org.evenbeam.verification.CheckPointFindings;

/**
 * How figures are written: the laboratory's decimal sign, a true minus sign, no grouping. An
 * uncertainty keeps two significant digits and a value goes to the same decimal place (JCGM
 * 100:2008, 7.2.6).
 */
public final class Figures {
  /** The minus sign of typography, U+2212. */
  public static final char MINUS = '\u2212';

  /**
   * The space between a figure and its unit, U+202F: narrow, and never broken (SI Brochure, 5.4.3).
   */
  public static final char UNIT_SPACE = '\u202f';

  private static final int UNCERTAINTY_DIGITS = 2;
  private static final int SIGNIFICANT_P_DIGITS = 2;
  private static final BigDecimal SMALLEST_P = new BigDecimal("0.0001");
  private static final int LARGEST_PLAIN_EXPONENT = 7;

  private final DecimalSign sign;

  /** Writes with that decimal sign. */
  public Figures(DecimalSign sign) {
    this.sign = sign;
  }

  /** A decimal with every digit that it has. */
  public String exact(BigDecimal value) {
    return dressed(value.toPlainString());
  }

  /** A figure to that many decimal places. */
  public String toPlaces(double value, int places) {
    BigDecimal rounded = BigDecimal.valueOf(value).setScale(places, RoundingMode.HALF_EVEN);
    return dressed(plain(rounded));
  }

  /** The same with its sign always shown, and none for zero. */
  public String signedToPlaces(double value, int places) {
    BigDecimal rounded = BigDecimal.valueOf(value).setScale(places, RoundingMode.HALF_EVEN);
    return (rounded.signum() > 0 ? "+" : "") + dressed(plain(rounded));
  }

  /** A positive figure to two significant digits, as an uncertainty or a standard deviation. */
  public String uncertainty(double value) {
    return significant(value, UNCERTAINTY_DIGITS);
  }

  /** A figure to that many significant digits. */
  public String significant(double value, int digits) {
    if (value == 0) {
      return "0";
    }
    BigDecimal rounded =
        BigDecimal.valueOf(value).round(new MathContext(digits, RoundingMode.HALF_EVEN));
    int missing = digits - rounded.precision();
    return dressed(plain(missing > 0 ? rounded.setScale(rounded.scale() + missing) : rounded));
  }

  /** The decimal places at which a value is written beside an uncertainty of that size. */
  public int placesBeside(double uncertainty) {
    if (!(uncertainty > 0) || Double.isInfinite(uncertainty)) {
      return 0;
    }
    BigDecimal two =
        BigDecimal.valueOf(uncertainty)
            .round(new MathContext(UNCERTAINTY_DIGITS, RoundingMode.HALF_EVEN));
    return Math.max(0, UNCERTAINTY_DIGITS - (two.precision() - two.scale()));
  }

  /**
   * The decimal places at which a bias and its interval are written: beside its uncertainty, else
   * as read.
   */
  public int biasPlaces(CheckPointFindings found) {
    return found
        .biasFinding()
        .uncertainty()
        .filter(u -> u.standardUncertainty() > 0)
        .map(u -> placesBeside(u.standardUncertainty()))
        .orElseGet(() -> found.question().resolution().map(d -> Math.max(0, d.scale())).orElse(0));
  }

  /** The two ends of an interval about zero, with their signs. */
  public String signedInterval(Interval interval, int places, String unit) {
    return signedToPlaces(interval.low(), places)
        + " … "
        + withUnit(signedToPlaces(interval.high(), places), unit);
  }

  /** A probability: two significant digits, never 0 where it is only small. */
  public String probability(double p) {
    return p < SMALLEST_P.doubleValue()
        ? "<" + UNIT_SPACE + exact(SMALLEST_P)
        : significant(p, SIGNIFICANT_P_DIGITS);
  }

  /** A share of one in percent, such as 5 for 0.05. */
  public String percent(double share) {
    BigDecimal percent = BigDecimal.valueOf(share).movePointRight(2).stripTrailingZeros();
    return dressed(plain(percent)) + UNIT_SPACE + "%";
  }

  /**
   * Degrees of freedom: whole ones as such, effective ones to one decimal place, ∞ for infinitely
   * many.
   */
  public String degreesOfFreedom(double degrees) {
    if (Double.isInfinite(degrees)) {
      return "∞";
    }
    return degrees == Math.rint(degrees) ? toPlaces(degrees, 0) : toPlaces(degrees, 1);
  }

  /** A figure and its unit, with the space that keeps them together. */
  public String withUnit(String figure, String unit) {
    return unit.isEmpty() ? figure : figure + UNIT_SPACE + unit;
  }

  private static String plain(BigDecimal value) {
    int exponent = value.precision() - value.scale() - 1;
    return Math.abs(exponent) > LARGEST_PLAIN_EXPONENT
        ? value.toString().replace("E", "e")
        : value.toPlainString();
  }

  private String dressed(String plain) {
    return plain.replace('-', MINUS).replace('.', sign.character());
  }
}
