package org.evenbeam.picture;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;

/**
 * Labels side by side on one baseline, each as near to its place as the others and the row's ends
 * allow; one too wide for its share is written smaller.
 */
final class LabelRow {
  /** A label and the x that its middle would like. */
  private record Wish(String text, double x, boolean bold, Role role) {}

  private final double left;
  private final double right;
  private final double baseline;
  private final double size;
  private final TextMeasure measure;
  private final List<Wish> wishes = new ArrayList<>();

  LabelRow(double left, double right, double baseline, double size, TextMeasure measure) {
    this.left = left;
    this.right = right;
    this.baseline = baseline;
    this.size = size;
    this.measure = measure;
  }

  LabelRow add(String text, double x, boolean bold, Role role) {
    wishes.add(new Wish(text, x, bold, role));
    return this;
  }

  List<Shape> labels() {
    List<Wish> sorted = wishes.stream().sorted(Comparator.comparingDouble(Wish::x)).toList();
    double share = (right - left - gap() * (sorted.size() - 1)) / Math.max(1, sorted.size());
    List<Shape.Label> labels = new ArrayList<>();
    double[] widths = new double[sorted.size()];
    double[] starts = new double[sorted.size()];
    for (int i = 0; i < sorted.size(); i++) {
      Wish wish = sorted.get(i);
      double fitted = fitting(wish.text(), wish.bold(), size, share, measure);
      widths[i] = measure.width(wish.text(), fitted, wish.bold());
      starts[i] = wish.x() - widths[i] / 2;
      labels.add(
          new Shape.Label(
              wish.text(), 0, baseline, Shape.Anchor.START, fitted, wish.bold(), wish.role()));
    }
    settle(starts, widths);
    List<Shape> placed = new ArrayList<>();
    for (int i = 0; i < starts.length; i++) {
      placed.add(at(labels.get(i), starts[i]));
    }
    return placed;
  }

  /** The size at which a text is no wider than allowed. */
  static double fitting(
      String text, boolean bold, double size, double allowed, TextMeasure measure) {
    double width = measure.width(text, size, bold);
    return width <= allowed ? size : size * allowed / width;
  }

  private void settle(double[] starts, double[] widths) {
    for (int i = 1; i < starts.length; i++) {
      double overlap = starts[i - 1] + widths[i - 1] + gap() - starts[i];
      if (overlap > 0) {
        starts[i - 1] -= overlap / 2;
        starts[i] += overlap / 2;
      }
    }
    double free = left;
    for (int i = 0; i < starts.length; i++) {
      starts[i] = Math.max(starts[i], free);
      free = starts[i] + widths[i] + gap();
    }
    free = right;
    for (int i = starts.length - 1; i >= 0; i--) {
      starts[i] = Math.min(starts[i], free - widths[i]);
      free = starts[i] - gap();
    }
  }

  private double gap() {
    return size * 0.6;
  }

  private static Shape.Label at(Shape.Label label, double x) {
    return new Shape.Label(
        label.text(), x, label.y(), label.anchor(), label.size(), label.bold(), label.role());
  }
}
