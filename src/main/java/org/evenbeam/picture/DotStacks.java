package org.evenbeam.picture;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.SortedMap;
import java.util.TreeMap;

/**
 * Readings as stacked dots in columns as coarse as the resolution makes them. Dots shrink where a
 * stack would be too high, and become bars where they would be too small to tell apart.
 */
final class DotStacks {
  private static final double LARGEST = 0.8;
  private static final double SMALLEST = 0.22;
  private static final double SHRINK = 0.88;
  private static final double BAR = 0.5;
  private static final double PITCH = 1.15;

  private final List<BigDecimal> deviations;
  private final BiasScale scale;
  private final Optional<BigDecimal> resolution;

  /** Stacks what lies on the scale. */
  DotStacks(List<BigDecimal> deviations, BiasScale scale, Optional<BigDecimal> resolution) {
    this.deviations = deviations.stream().filter(d -> !scale.isLeftOut(d.doubleValue())).toList();
    this.scale = scale;
    this.resolution = resolution;
  }

  /** The stacks between {@code top} and {@code floor}, for that size of text. */
  List<Shape> shapes(double top, double floor, double text) {
    double room = floor - top;
    for (double diameter = LARGEST * text; diameter >= SMALLEST * text; diameter *= SHRINK) {
      SortedMap<Long, Integer> columns = columns(diameter * PITCH);
      if (highest(columns) * diameter * PITCH <= room) {
        return dots(columns, diameter, floor);
      }
    }
    return bars(columns(BAR * text * PITCH), BAR * text, floor, room);
  }

  private List<Shape> dots(SortedMap<Long, Integer> columns, double diameter, double floor) {
    List<Shape> dots = new ArrayList<>();
    columns.forEach(
        (column, count) -> {
          double x = x(column, diameter * PITCH);
          for (int i = 0; i < count; i++) {
            double y = floor - (i + 0.5) * diameter * PITCH;
            dots.add(new Shape.Dot(x, y, diameter / 2, Role.INK));
          }
        });
    return dots;
  }

  private List<Shape> bars(
      SortedMap<Long, Integer> columns, double width, double floor, double room) {
    int highest = highest(columns);
    List<Shape> bars = new ArrayList<>();
    columns.forEach(
        (column, count) -> {
          double height = room * count / highest;
          double x = x(column, width * PITCH) - width / 2;
          bars.add(new Shape.Bar(x, floor - height, width, height, 0, Role.INK));
        });
    return bars;
  }

  private static int highest(SortedMap<Long, Integer> columns) {
    return columns.values().stream().mapToInt(Integer::intValue).max().orElse(0);
  }

  /** How many readings fall into each column, counted from that of the first reading. */
  private SortedMap<Long, Integer> columns(double pitch) {
    SortedMap<Long, Integer> columns = new TreeMap<>();
    double width = columnWidth(pitch);
    for (BigDecimal deviation : deviations) {
      double steps = deviation.subtract(deviations.get(0)).doubleValue() / width;
      columns.merge(Math.round(steps), 1, Integer::sum);
    }
    return columns;
  }

  private double x(long column, double pitch) {
    return scale.held(deviations.get(0).doubleValue() + column * columnWidth(pitch));
  }

  /** A whole number of resolution steps, and no narrower than a dot. */
  private double columnWidth(double pitch) {
    double least = pitch / scale.perUnit();
    return resolution
        .map(BigDecimal::doubleValue)
        .map(d -> d * Math.max(1, Math.ceil(least / d - 1e-9)))
        .orElse(least);
  }
}
