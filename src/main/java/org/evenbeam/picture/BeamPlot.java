package org.evenbeam.picture;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.evenbeam.stats.CombinedUncertainty;
import org.evenbeam.stats.Interval;
import org.evenbeam.verification.CheckPointFindings;
import org.evenbeam.verification.CheckPointQuestion;

/**
 * The bias of a check point as a beam: the fulcrum at the reference value, a post at each limit,
 * the readings as stacked dots above, the interval of the bias as the beam with the bias as a ring
 * on it. The posts stand beside the beam and not beside the dots, because the limits hold for the
 * bias and not for a single reading. What lies outside the picture is told by an arrow with its
 * value at the picture's end.
 */
public final class BeamPlot {
  private static final double LEAST_EMS = 18;
  private static final double LEAST_ROWS = 11;

  private final CheckPointQuestion question;
  private final Optional<CheckPointFindings> findings;
  private final List<BigDecimal> deviations;
  private final Size size;
  private final Labels labels;
  private final TextMeasure measure;
  private final double text;
  private final List<Shape> shapes = new ArrayList<>();

  private BeamPlot(
      CheckPointQuestion question,
      List<BigDecimal> readings,
      Optional<CheckPointFindings> findings,
      Size size,
      Labels labels,
      TextMeasure measure) {
    this.question = question;
    this.findings = findings;
    this.deviations = readings.stream().map(x -> x.subtract(question.reference().value())).toList();
    this.size = size;
    this.labels = labels;
    this.measure = measure;
    this.text = size.textWithin(LEAST_EMS, LEAST_ROWS);
  }

  /**
   * Draws a check point's bias.
   *
   * @param question what is asked
   * @param readings those that count, as typed
   * @param findings what they show; empty before the first reading
   * @param size of the picture
   * @param labels the texts
   * @param measure how wide they are
   */
  public static Picture draw(
      CheckPointQuestion question,
      List<BigDecimal> readings,
      Optional<CheckPointFindings> findings,
      Size size,
      Labels labels,
      TextMeasure measure) {
    return new BeamPlot(question, readings, findings, size, labels, measure).draw();
  }

  private Picture draw() {
    BiasScale scale = scale();
    shapes.add(
        new Shape.Line(text / 2, axis(), size.width() - text / 2, axis(), text * 0.08, Role.LINE));
    shapes.add(
        new Shape.Fulcrum(scale.zero(), axis() + text * 0.1, fulcrumWidth(), text * 1.5, Role.INK));
    referenceLabel(scale);
    posts(scale);
    shapes.addAll(
        new DotStacks(deviations, scale, question.resolution())
            .shapes(text * 1.7, beamLabelBaseline() - text * 1.2, text));
    readingsOutside(scale);
    interval().ifPresent(interval -> beam(scale, interval));
    String words = labels.describe(new PictureContent.Beam(question, findings));
    return new Picture(size.width(), size.height(), shapes, words);
  }

  /** The heights, from the ground up: a row for the reference, a row for the fulcrum, the axis. */
  private double axis() {
    return size.height() - text * 3.3;
  }

  private double beamMiddle() {
    return axis() - text * 0.85;
  }

  private double beamLabelBaseline() {
    return beamMiddle() - text * 1.3;
  }

  private double fulcrumWidth() {
    return text * 1.8;
  }

  private double gap() {
    return text * 0.5;
  }

  private BiasScale scale() {
    double half = fulcrumWidth() / 2 + gap();
    double reference = measure.width(labels.reference(), text, false) / 2;
    double low = Math.max(reference, limitLow().map(l -> half + postLabelWidth(l)).orElse(half));
    double high = Math.max(reference, limitHigh().map(l -> half + postLabelWidth(l)).orElse(half));
    return BiasScale.of(
        question,
        deviations,
        interval(),
        new Interval(text * 1.2, size.width() - text * 1.2),
        new Interval(low, size.width() - high));
  }

  /** A limit's label as wide as it is, and never more than its side of the fulcrum has room for. */
  private double postLabelWidth(BigDecimal limit) {
    double most = size.width() / 2 - fulcrumWidth() / 2 - gap();
    return Math.min(measure.width(labels.biasLimit(limit), text, true), most);
  }

  private Optional<BigDecimal> limitLow() {
    return question.criteria().biasBelow().map(BigDecimal::negate);
  }

  private Optional<BigDecimal> limitHigh() {
    return question.criteria().biasAbove();
  }

  private Optional<Interval> interval() {
    return findings.flatMap(found -> found.biasFinding().interval());
  }

  private void referenceLabel(BiasScale scale) {
    shapes.addAll(
        new LabelRow(0, size.width(), size.height() - text * 0.3, text, measure)
            .add(labels.reference(), scale.zero(), false, Role.QUIET)
            .labels());
  }

  private void posts(BiasScale scale) {
    double half = fulcrumWidth() / 2 + gap();
    limitLow().ifPresent(limit -> post(scale, limit, 0, scale.zero() - half));
    limitHigh().ifPresent(limit -> post(scale, limit, scale.zero() + half, size.width()));
  }

  private void post(BiasScale scale, BigDecimal limit, double left, double right) {
    double x = scale.x(limit.doubleValue());
    shapes.add(
        new Shape.Line(
            x, beamMiddle() - text * 0.85, x, axis() + text * 0.35, text * 0.28, Role.POST));
    shapes.addAll(
        new LabelRow(left, right, axis() + text * 1.55, text, measure)
            .add(labels.biasLimit(limit), x, true, Role.INK)
            .labels());
  }

  private void beam(BiasScale scale, Interval interval) {
    double thickness = text * 0.95;
    double low = scale.held(interval.low());
    double high = scale.held(interval.high());
    boolean seen = !scale.isAbove(interval.low()) && !scale.isBelow(interval.high());
    if (seen) {
      shapes.add(
          new Shape.Bar(
              low,
              beamMiddle() - thickness / 2,
              high - low,
              thickness,
              Math.min(thickness, high - low) / 2,
              Role.BEAM));
    }
    if (scale.isBelow(interval.low())) {
      arrow(0, beamMiddle(), Shape.Direction.LEFT, Role.BEAM);
    }
    if (scale.isAbove(interval.high())) {
      arrow(size.width(), beamMiddle(), Shape.Direction.RIGHT, Role.BEAM);
    }
    double bias = findings.orElseThrow().bias();
    if (!scale.isLeftOut(bias)) {
      shapes.add(new Shape.Ring(scale.x(bias), beamMiddle(), text * 0.75, text * 0.28, Role.BEAM));
    }
    double u =
        findings
            .flatMap(found -> found.biasFinding().uncertainty())
            .map(CombinedUncertainty::standardUncertainty)
            .orElse(0.0);
    shapes.addAll(
        new LabelRow(0, size.width(), beamLabelBaseline(), text, measure)
            .add(labels.biasEnd(interval.low(), u), low, false, Role.BEAM)
            .add(labels.biasEnd(interval.high(), u), high, false, Role.BEAM)
            .labels());
  }

  private void readingsOutside(BiasScale scale) {
    List<BigDecimal> below =
        deviations.stream().filter(d -> scale.isBelow(d.doubleValue())).sorted().toList();
    List<BigDecimal> above =
        deviations.stream().filter(d -> scale.isAbove(d.doubleValue())).sorted().toList();
    if (!below.isEmpty()) {
      outside(below.size(), below.get(0), Shape.Direction.LEFT);
    }
    if (!above.isEmpty()) {
      outside(above.size(), above.get(above.size() - 1), Shape.Direction.RIGHT);
    }
  }

  private void outside(int count, BigDecimal farthest, Shape.Direction direction) {
    boolean left = direction == Shape.Direction.LEFT;
    double edge = left ? 0 : size.width();
    arrow(edge, text * 0.75, direction, Role.INK);
    String words = labels.readingsOutside(count, farthest);
    double room = size.width() / 2 - text * 1.5;
    double fitted = LabelRow.fitting(words, false, text, room, measure);
    shapes.add(
        new Shape.Label(
            words,
            left ? text * 1.2 : size.width() - text * 1.2,
            text * 1.1,
            left ? Shape.Anchor.START : Shape.Anchor.END,
            fitted,
            false,
            Role.INK));
  }

  private void arrow(double x, double y, Shape.Direction direction, Role role) {
    shapes.add(new Shape.Arrow(x, y, text * 0.9, direction, role));
  }
}
