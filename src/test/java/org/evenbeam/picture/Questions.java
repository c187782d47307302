package org.evenbeam.picture;

import java.math.BigDecimal;
import java.util.List;
import java.util.Optional;
import java.util.OptionalInt;
import org.evenbeam.metrology.DecimalSign;
import org.evenbeam.verification.CheckPointEvaluation;
import org.evenbeam.verification.CheckPointFindings;
import org.evenbeam.verification.CheckPointQuestion;
import org.evenbeam.verification.Criteria;
import org.evenbeam.verification.DecisionRule;
import org.evenbeam.verification.Reference;
import org.evenbeam.wording.Figures;
import org.evenbeam.wording.PictureWords;
import org.evenbeam.wording.Words;

/** Check points for pictures. */
final class Questions {
  static final TextMeasure FIXED =
      (text, size, bold) -> text.length() * size * (bold ? 0.62 : 0.58);
  static final Labels LABELS =
      new PictureWords(new Words(java.util.Locale.ENGLISH), new Figures(DecimalSign.POINT), "g");

  private Questions() {}

  static CheckPointQuestion question(
      Optional<BigDecimal> below,
      Optional<BigDecimal> above,
      Optional<BigDecimal> permitted,
      Optional<BigDecimal> resolution,
      double referenceUncertainty) {
    return new CheckPointQuestion(
        "100 g",
        new Reference(
            new BigDecimal("100.00012"), referenceUncertainty, Double.POSITIVE_INFINITY, true),
        resolution,
        new Criteria(
            below,
            above,
            permitted,
            0.05,
            DecisionRule.GUARDED_ACCEPTANCE,
            DecisionRule.GUARDED_REJECTION,
            true),
        OptionalInt.of(10));
  }

  /** As in the sketch of the run sheet: 0.5 mg either way, 0.3 mg permitted, read to 0.1 mg. */
  static CheckPointQuestion balance() {
    return question(number("0.0005"), number("0.0005"), number("0.0003"), number("0.0001"), 2e-5);
  }

  static Optional<BigDecimal> number(String text) {
    return Optional.of(new BigDecimal(text));
  }

  static List<BigDecimal> readings(String... texts) {
    return java.util.Arrays.stream(texts).map(BigDecimal::new).toList();
  }

  static Optional<CheckPointFindings> found(
      CheckPointQuestion question, List<BigDecimal> readings) {
    return readings.isEmpty()
        ? Optional.empty()
        : Optional.of(CheckPointEvaluation.of(question, readings));
  }

  static Picture beam(CheckPointQuestion question, List<BigDecimal> readings, Size size) {
    return BeamPlot.draw(question, readings, found(question, readings), size, LABELS, FIXED);
  }

  static Picture spread(CheckPointQuestion question, List<BigDecimal> readings, Size size) {
    return SpreadBar.draw(question, found(question, readings), size, LABELS, FIXED);
  }
}
