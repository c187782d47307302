package org.evenbeam.wording;

import java.math.BigDecimal;
import java.util.Optional;
import org.evenbeam.picture.Labels;
import org.evenbeam.picture.PictureContent;
import org.evenbeam.stats.Interval;
import org.evenbeam.stats.StandardDeviationBounds;
import org.evenbeam.verification.CheckPointFindings;
import org.evenbeam.verification.Criteria;

/** The texts on pictures, and pictures in words, for instruments of one unit. */
public final class PictureWords implements Labels {
  private static final int DIGITS_WITHOUT_UNCERTAINTY = 3;

  private final Words words;
  private final Figures figures;
  private final String unit;

  /**
   * Writes in that language and way.
   *
   * @param unit the symbol of the readings' unit, empty for none
   */
  public PictureWords(Words words, Figures figures, String unit) {
    this.words = words;
    this.figures = figures;
    this.unit = unit;
  }

  @Override
  public String reference() {
    return text("reference");
  }

  @Override
  public String biasLimit(BigDecimal bias) {
    return figures.withUnit(signed(bias), unit);
  }

  @Override
  public String biasEnd(double bias, double standardUncertainty) {
    if (standardUncertainty > 0) {
      return figures.signedToPlaces(bias, figures.placesBeside(standardUncertainty));
    }
    String plain = figures.significant(bias, DIGITS_WITHOUT_UNCERTAINTY);
    return bias > 0 ? "+" + plain : plain;
  }

  @Override
  public String readingsOutside(int readings, BigDecimal farthest) {
    return readings == 1
        ? text("reading-outside", signed(farthest))
        : text("readings-outside", Integer.toString(readings), signed(farthest));
  }

  @Override
  public String standardDeviation(double value) {
    return figures.uncertainty(value);
  }

  @Override
  public String permitted(BigDecimal standardDeviation) {
    return text("permitted", figures.withUnit(figures.exact(standardDeviation), unit));
  }

  @Override
  public String describe(PictureContent content) {
    if (content instanceof PictureContent.Beam beam) {
      return beamLimits(beam.question().criteria()) + " " + beamFound(beam.findings());
    }
    if (content instanceof PictureContent.Spread spread) {
      return spreadLimit(spread.question().criteria()) + " " + spreadFound(spread.findings());
    }
    PictureContent.Mark mark = (PictureContent.Mark) content;
    return mark.verdict()
        .map(verdict -> words.name(Words.Bundle.FINDING, "verdict", verdict))
        .orElseGet(() -> words.text(Words.Bundle.FINDING, "verdict.none"));
  }

  private String beamLimits(Criteria criteria) {
    Optional<String> below = criteria.biasBelow().map(BigDecimal::negate).map(this::biasLimit);
    Optional<String> above = criteria.biasAbove().map(this::biasLimit);
    if (below.isPresent() && above.isPresent()) {
      return text("beam.limits", below.get(), above.get());
    }
    return below
        .or(() -> above)
        .map(limit -> text("beam.limit", limit))
        .orElseGet(() -> text("beam.no-limit"));
  }

  private String beamFound(Optional<CheckPointFindings> findings) {
    if (findings.isEmpty()) {
      return text("no-readings");
    }
    CheckPointFindings found = findings.get();
    double u = found.biasFinding().uncertainty().map(c -> c.standardUncertainty()).orElse(0.0);
    String bias = figures.withUnit(biasEnd(found.bias(), u), unit);
    Optional<Interval> interval = found.biasFinding().interval();
    if (interval.isEmpty()) {
      return text("beam.bias", Integer.toString(found.n()), bias);
    }
    return text(
        "beam.interval",
        Integer.toString(found.n()),
        bias,
        figures.percent(1 - 2 * found.question().criteria().alpha()),
        figures.withUnit(biasEnd(interval.get().low(), u), unit),
        figures.withUnit(biasEnd(interval.get().high(), u), unit));
  }

  private String spreadLimit(Criteria criteria) {
    return criteria
        .maximumStandardDeviation()
        .map(limit -> text("spread.limit", figures.withUnit(figures.exact(limit), unit)))
        .orElseGet(() -> text("spread.no-limit"));
  }

  private String spreadFound(Optional<CheckPointFindings> findings) {
    if (findings.isEmpty()) {
      return text("no-readings");
    }
    CheckPointFindings found = findings.get();
    if (found.standardDeviation().isEmpty()) {
      return text("spread.one-reading");
    }
    String s = withUnit(found.standardDeviation().getAsDouble());
    Optional<Interval> interval =
        found.precisionFinding().bounds().map(StandardDeviationBounds::interval);
    if (interval.isPresent()) {
      return text(
          "spread.interval",
          Integer.toString(found.n()),
          s,
          figures.percent(1 - found.question().criteria().alpha()),
          withUnit(interval.get().low()),
          withUnit(interval.get().high()));
    }
    return found.precisionFinding().upperBound().isPresent()
        ? text(
            "spread.upper",
            Integer.toString(found.n()),
            withUnit(found.precisionFinding().upperBound().getAsDouble()))
        : text("spread.equal", Integer.toString(found.n()));
  }

  private String withUnit(double standardDeviation) {
    return figures.withUnit(standardDeviation(standardDeviation), unit);
  }

  private String signed(BigDecimal value) {
    String exact = figures.exact(value);
    return value.signum() > 0 ? "+" + exact : exact;
  }

  private String text(String key, String... arguments) {
    return words.text(Words.Bundle.SCREEN, "picture." + key, arguments);
  }
}
