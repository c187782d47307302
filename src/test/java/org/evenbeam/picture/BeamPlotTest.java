package org.evenbeam.picture;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.math.BigDecimal;
import java.util.Collections;
import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;
import org.evenbeam.verification.CheckPointFindings;
import org.evenbeam.verification.CheckPointQuestion;
import org.junit.jupiter.api.Test;

class BeamPlotTest {
  private static final Size SIZE = new Size(640, 230, 13);
  private static final List<BigDecimal> SKETCH =
      Questions.readings("100.0001", "100.0003", "99.9999", "100.0002", "100.0002", "100.0001");

  @Test
  void postsStandAtTheLimitsOnEitherSideOfTheFulcrum() {
    Picture picture = Questions.beam(Questions.balance(), List.of(), SIZE);
    List<Shape.Line> posts = posts(picture);
    double zero = fulcrum(picture).x();
    assertThat(posts).hasSize(2);
    assertThat(zero - posts.get(0).x1()).isCloseTo(posts.get(1).x1() - zero, within(1e-9));
    assertThat(texts(picture)).containsExactlyInAnyOrder("reference", "−0.0005 g", "+0.0005 g");
  }

  @Test
  void unequalLimitsStandAtUnequalDistances() {
    CheckPointQuestion question =
        Questions.question(
            Questions.number("0.001"),
            Questions.number("0.002"),
            Optional.empty(),
            Questions.number("0.0001"),
            0);
    Picture picture = Questions.beam(question, List.of(), SIZE);
    double zero = fulcrum(picture).x();
    double below = zero - posts(picture).get(0).x1();
    double above = posts(picture).get(1).x1() - zero;
    assertThat(above).isCloseTo(2 * below, within(1e-9));
  }

  @Test
  void aSideWithoutALimitHasNoPost() {
    CheckPointQuestion question =
        Questions.question(
            Optional.empty(),
            Questions.number("0.0005"),
            Optional.empty(),
            Questions.number("0.0001"),
            0);
    Picture picture = Questions.beam(question, SKETCH, SIZE);
    assertThat(posts(picture)).hasSize(1);
    assertThat(posts(picture).get(0).x1()).isGreaterThan(fulcrum(picture).x());
  }

  @Test
  void everyReadingIsADotAndEqualOnesAreStacked() {
    Picture picture = Questions.beam(Questions.balance(), SKETCH, SIZE);
    List<Shape.Dot> dots = of(picture, Shape.Dot.class).toList();
    assertThat(dots).hasSize(6);
    assertThat(dots.stream().map(Shape.Dot::x).distinct()).hasSize(4);
    double scale = posts(picture).get(1).x1() - fulcrum(picture).x();
    double lowest = dots.get(0).x() - fulcrum(picture).x();
    assertThat(lowest / scale * 0.0005).isCloseTo(99.9999 - 100.00012, within(1e-9));
  }

  @Test
  void theBeamIsTheIntervalAndTheRingTheBias() {
    CheckPointFindings found = Questions.found(Questions.balance(), SKETCH).orElseThrow();
    Picture picture = Questions.beam(Questions.balance(), SKETCH, SIZE);
    double zero = fulcrum(picture).x();
    double perUnit = (posts(picture).get(1).x1() - zero) / 0.0005;
    Shape.Bar beam = of(picture, Shape.Bar.class).findFirst().orElseThrow();
    Shape.Ring ring = of(picture, Shape.Ring.class).findFirst().orElseThrow();
    double low = found.biasFinding().interval().orElseThrow().low();
    double high = found.biasFinding().interval().orElseThrow().high();
    assertThat((beam.x() - zero) / perUnit).isCloseTo(low, within(1e-12));
    assertThat((beam.x() + beam.width() - zero) / perUnit).isCloseTo(high, within(1e-12));
    assertThat((ring.x() - zero) / perUnit).isCloseTo(found.bias(), within(1e-12));
  }

  @Test
  void aBeamAcrossAPostIsDrawnToItsEnd() {
    List<BigDecimal> high = Questions.readings("100.0004", "100.0007", "100.0005", "100.0009");
    Picture picture = Questions.beam(Questions.balance(), high, SIZE);
    Shape.Bar beam = of(picture, Shape.Bar.class).findFirst().orElseThrow();
    double post = posts(picture).get(1).x1();
    assertThat(beam.x()).isLessThan(post);
    assertThat(beam.x() + beam.width()).isGreaterThan(post);
    assertThat(of(picture, Shape.Arrow.class)).isEmpty();
  }

  @Test
  void aBeamThatLeavesThePictureHasAnArrowWithItsValue() {
    List<BigDecimal> two = Questions.readings("100.0001", "100.0009");
    Picture picture = Questions.beam(Questions.balance(), two, SIZE);
    assertThat(of(picture, Shape.Arrow.class).map(Shape.Arrow::x))
        .containsExactlyInAnyOrder(0.0, SIZE.width());
    assertThat(texts(picture)).contains("+0.00289", "−0.00213");
  }

  @Test
  void aFarReadingIsToldByAnArrowAndDoesNotSqueezeThePicture() {
    List<BigDecimal> far = Questions.readings("100.0001", "100.0002", "102.3");
    Picture picture = Questions.beam(Questions.balance(), far, SIZE);
    assertThat(of(picture, Shape.Dot.class)).hasSize(2);
    assertThat(texts(picture)).contains("1 reading at +2.29988");
    double between = posts(picture).get(1).x1() - posts(picture).get(0).x1();
    assertThat(between).isGreaterThan(SIZE.width() / 4);
  }

  @Test
  void fiveHundredReadingsStayReadable() {
    List<BigDecimal> equal = Collections.nCopies(500, new BigDecimal("100.0001"));
    Picture bars = Questions.beam(Questions.balance(), equal, SIZE);
    assertThat(of(bars, Shape.Dot.class)).isEmpty();
    assertThat(of(bars, Shape.Bar.class).filter(bar -> bar.role() == Role.INK)).hasSize(1);
    List<BigDecimal> thirty = Collections.nCopies(30, new BigDecimal("100.0001"));
    Picture dots = Questions.beam(Questions.balance(), thirty, SIZE);
    assertThat(of(dots, Shape.Dot.class)).hasSize(30);
    assertThat(of(dots, Shape.Dot.class).findFirst().orElseThrow().radius())
        .isLessThan(0.4 * SIZE.text());
  }

  @Test
  void veryUnequalLimitsLeaveEveryLabelItsSize() {
    CheckPointQuestion question =
        Questions.question(
            Questions.number("0.0001"),
            Questions.number("0.02"),
            Optional.empty(),
            Questions.number("0.0001"),
            0);
    Picture picture = Questions.beam(question, SKETCH, SIZE);
    assertThat(of(picture, Shape.Label.class).map(Shape.Label::size)).containsOnly(SIZE.text());
  }

  @Test
  void wordsStandInThePicturesPlace() {
    assertThat(Questions.beam(Questions.balance(), List.of(), SIZE).text())
        .isEqualTo("Bias: the limits are −0.0005\u202fg and +0.0005\u202fg. No readings yet.");
    assertThat(Questions.beam(Questions.balance(), SKETCH, SIZE).text())
        .contains("After 6 readings the bias is +0.000013\u202fg; its 90\u202f% interval");
  }

  static Shape.Fulcrum fulcrum(Picture picture) {
    return of(picture, Shape.Fulcrum.class).findFirst().orElseThrow();
  }

  static List<Shape.Line> posts(Picture picture) {
    return of(picture, Shape.Line.class).filter(line -> line.role() == Role.POST).toList();
  }

  static List<String> texts(Picture picture) {
    return of(picture, Shape.Label.class)
        .map(label -> label.text().replace('\u202f', ' '))
        .toList();
  }

  static <T extends Shape> Stream<T> of(Picture picture, Class<T> kind) {
    return picture.shapes().stream().filter(kind::isInstance).map(kind::cast);
  }
}
