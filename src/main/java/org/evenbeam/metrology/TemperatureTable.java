package org.evenbeam.metrology;

import java.math.BigDecimal;
import java.math.MathContext;
import java.util.Comparator;
import java.util.List;

/**
 * A certified value against temperature, such as the pH of a buffer. Between two certified
 * temperatures the value is interpolated linearly; outside them nothing is known, and asking is an
 * error. Everything is decimal: at a certified temperature the value is the certified one.
 *
 * @param points in the order of their temperatures, however they were given
 */
public record TemperatureTable(List<Point> points) {
  /**
   * One certified pair.
   *
   * @param celsius temperature in °C
   * @param value the certified value there
   */
  public record Point(BigDecimal celsius, BigDecimal value) {}

  /**
   * Puts the points in order.
   *
   * @throws IllegalArgumentException if there are fewer than two, or two of one temperature
   */
  public TemperatureTable {
    points = points.stream().sorted(Comparator.comparing(Point::celsius)).toList();
    if (points.size() < 2) {
      throw new IllegalArgumentException(
          "number of temperatures is " + points.size() + ", allowed: 2 or more");
    }
    for (int i = 1; i < points.size(); i++) {
      requireApart(points.get(i - 1).celsius(), points.get(i).celsius());
    }
  }

  private static void requireApart(BigDecimal cooler, BigDecimal warmer) {
    if (cooler.compareTo(warmer) == 0) {
      throw new IllegalArgumentException(
          "temperature " + warmer + " °C stands twice in the table, allowed: once");
    }
  }

  /**
   * The value at a temperature.
   *
   * @param celsius within the table
   * @throws IllegalArgumentException if the temperature is outside the table
   */
  public BigDecimal valueAt(BigDecimal celsius) {
    int above = firstNotBelow(celsius);
    Point right = points.get(above);
    if (right.celsius().compareTo(celsius) == 0) {
      return right.value();
    }
    Point left = points.get(above - 1);
    BigDecimal rise = right.value().subtract(left.value());
    BigDecimal run = right.celsius().subtract(left.celsius());
    BigDecimal part = celsius.subtract(left.celsius()).multiply(rise);
    return left.value().add(part.divide(run, MathContext.DECIMAL128));
  }

  /**
   * How fast the value changes with temperature, |dr/dT| per °C, the sensitivity of the budget's
   * temperature term (JCGM 100:2008, 5.1.3). At a certified temperature between two pieces it is
   * the larger of the two, so that the term is not understated.
   *
   * @param celsius within the table
   * @throws IllegalArgumentException if the temperature is outside the table
   */
  public double steepnessAt(BigDecimal celsius) {
    int above = firstNotBelow(celsius);
    double left = above > 0 ? steepness(above) : 0;
    boolean cornered = points.get(above).celsius().compareTo(celsius) == 0;
    boolean hasRight = cornered && above + 1 < points.size();
    return hasRight ? Math.max(left, steepness(above + 1)) : left;
  }

  /** Of the piece that ends at a point. */
  private double steepness(int end) {
    Point left = points.get(end - 1);
    Point right = points.get(end);
    BigDecimal rise = right.value().subtract(left.value()).abs();
    BigDecimal run = right.celsius().subtract(left.celsius());
    return rise.divide(run, MathContext.DECIMAL128).doubleValue();
  }

  private int firstNotBelow(BigDecimal celsius) {
    BigDecimal coolest = points.get(0).celsius();
    BigDecimal warmest = points.get(points.size() - 1).celsius();
    if (celsius.compareTo(coolest) < 0 || celsius.compareTo(warmest) > 0) {
      throw new IllegalArgumentException(
          "temperature in °C is " + celsius + ", allowed: " + coolest + " to " + warmest);
    }
    int index = 0;
    while (points.get(index).celsius().compareTo(celsius) < 0) {
      index++;
    }
    return index;
  }
}
