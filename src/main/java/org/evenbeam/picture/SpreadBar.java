package org.evenbeam.picture;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.evenbeam.stats.Interval;
import org.evenbeam.stats.StandardDeviationBounds;
import org.evenbeam.verification.CheckPointFindings;
import org.evenbeam.verification.CheckPointQuestion;

/**
 * The standard deviation of a check point: the two-sided interval of the true value as a bar from a
 * scale that begins at zero, s as a ring on it, a post at the permitted value. Equal readings have
 * no two-sided interval; the bar then goes from zero to the one-sided upper bound.
 */
public final class SpreadBar {
  private static final double LEAST_EMS = 18;
  private static final double LEAST_ROWS = 5;
  private static final double ROOM = 1.3;
  private static final double MOST = 3;

  private final Optional<BigDecimal> permitted;
  private final Optional<Interval> interval;
  private final Optional<Double> estimate;
  private final Size size;
  private final Labels labels;
  private final TextMeasure measure;
  private final double text;
  private final List<Shape> shapes = new ArrayList<>();

  private SpreadBar(
      CheckPointQuestion question,
      Optional<CheckPointFindings> findings,
      Size size,
      Labels labels,
      TextMeasure measure) {
    this.permitted = question.criteria().maximumStandardDeviation();
    this.interval = findings.flatMap(SpreadBar::interval);
    this.estimate =
        findings
            .filter(found -> found.standardDeviation().isPresent())
            .map(found -> found.standardDeviation().getAsDouble());
    this.size = size;
    this.labels = labels;
    this.measure = measure;
    this.text = size.textWithin(LEAST_EMS, LEAST_ROWS);
  }

  /**
   * Draws a check point's standard deviation.
   *
   * @param question what is asked
   * @param findings what the readings show; empty before the first reading
   * @param size of the picture
   * @param labels the texts
   * @param measure how wide they are
   */
  public static Picture draw(
      CheckPointQuestion question,
      Optional<CheckPointFindings> findings,
      Size size,
      Labels labels,
      TextMeasure measure) {
    SpreadBar bar = new SpreadBar(question, findings, size, labels, measure);
    bar.draw();
    String words = labels.describe(new PictureContent.Spread(question, findings));
    return new Picture(size.width(), size.height(), bar.shapes, words);
  }

  private static Optional<Interval> interval(CheckPointFindings found) {
    return found
        .precisionFinding()
        .bounds()
        .map(StandardDeviationBounds::interval)
        .or(
            () ->
                found.precisionFinding().upperBound().stream()
                    .mapToObj(upper -> new Interval(0, upper))
                    .findFirst());
  }

  private void draw() {
    double perUnit = (right() - left()) / end();
    shapes.add(
        new Shape.Line(left(), middle(), size.width() - left(), middle(), text * 0.08, Role.LINE));
    LabelRow below = row(middle() + text * 1.75);
    interval.ifPresent(i -> bar(i, perUnit));
    permitted.ifPresent(limit -> post(limit, perUnit, below));
    estimate.ifPresent(s -> ring(s, perUnit, below));
    shapes.addAll(below.labels());
  }

  private double left() {
    return text;
  }

  private double right() {
    return size.width() - text * 1.2;
  }

  private double middle() {
    return size.height() / 2;
  }

  private LabelRow row(double baseline) {
    return new LabelRow(0, size.width(), baseline, text, measure);
  }

  /** The value at the right end, above 0. */
  private double end() {
    double limit = permitted.map(BigDecimal::doubleValue).orElse(0.0);
    double found = Math.max(interval.map(Interval::high).orElse(0.0), estimate.orElse(0.0));
    double most = limit > 0 ? MOST * limit : Double.MAX_VALUE;
    double end = Math.max(ROOM * limit, Math.min(1.05 * found, most));
    return end > 0 ? end : 1;
  }

  private void bar(Interval found, double perUnit) {
    double thickness = text * 0.95;
    double low = held(found.low(), perUnit);
    double high = held(found.high(), perUnit);
    if (found.low() <= end()) {
      shapes.add(
          new Shape.Bar(
              low,
              middle() - thickness / 2,
              high - low,
              thickness,
              Math.min(thickness, high - low) / 2,
              Role.BEAM));
    }
    if (found.high() > end()) {
      shapes.add(
          new Shape.Arrow(size.width(), middle(), text * 0.9, Shape.Direction.RIGHT, Role.BEAM));
    }
    shapes.addAll(
        row(middle() - text * 1.3)
            .add(labels.standardDeviation(found.low()), low, false, Role.BEAM)
            .add(labels.standardDeviation(found.high()), high, false, Role.BEAM)
            .labels());
  }

  private void post(BigDecimal limit, double perUnit, LabelRow below) {
    double x = left() + limit.doubleValue() * perUnit;
    shapes.add(
        new Shape.Line(
            x, middle() - text * 0.85, x, middle() + text * 0.85, text * 0.28, Role.POST));
    below.add(labels.permitted(limit), x, true, Role.INK);
  }

  private void ring(double s, double perUnit, LabelRow below) {
    if (s <= end()) {
      shapes.add(
          new Shape.Ring(left() + s * perUnit, middle(), text * 0.75, text * 0.28, Role.BEAM));
    }
    below.add(labels.standardDeviation(s), held(s, perUnit), false, Role.BEAM);
  }

  private double held(double value, double perUnit) {
    return Math.min(left() + value * perUnit, right());
  }
}
