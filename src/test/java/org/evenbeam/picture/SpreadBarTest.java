package org.evenbeam.picture;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.math.BigDecimal;
import java.util.List;
import org.evenbeam.stats.Interval;
import org.evenbeam.verification.CheckPointFindings;
import org.junit.jupiter.api.Test;

class SpreadBarTest {
  private static final Size SIZE = new Size(640, 90, 13);
  private static final List<BigDecimal> READINGS =
      Questions.readings("100.0001", "100.0003", "99.9999", "100.0002", "100.0002", "100.0001");

  @Test
  void beforeTheFirstReadingThePostStandsAlone() {
    Picture picture = Questions.spread(Questions.balance(), List.of(), SIZE);
    assertThat(BeamPlotTest.posts(picture)).hasSize(1);
    assertThat(BeamPlotTest.texts(picture)).containsExactly("0.0003 g permitted");
    assertThat(BeamPlotTest.of(picture, Shape.Bar.class)).isEmpty();
  }

  @Test
  void theBarIsTheTwoSidedIntervalAndTheRingTheEstimate() {
    CheckPointFindings found = Questions.found(Questions.balance(), READINGS).orElseThrow();
    Interval interval = found.precisionFinding().bounds().orElseThrow().interval();
    Picture picture = Questions.spread(Questions.balance(), READINGS, SIZE);
    double zero = SIZE.text();
    double perUnit = (BeamPlotTest.posts(picture).get(0).x1() - zero) / 0.0003;
    Shape.Bar bar = BeamPlotTest.of(picture, Shape.Bar.class).findFirst().orElseThrow();
    Shape.Ring ring = BeamPlotTest.of(picture, Shape.Ring.class).findFirst().orElseThrow();
    assertThat((bar.x() - zero) / perUnit).isCloseTo(interval.low(), within(1e-12));
    assertThat((bar.x() + bar.width() - zero) / perUnit).isCloseTo(interval.high(), within(1e-12));
    assertThat((ring.x() - zero) / perUnit)
        .isCloseTo(found.standardDeviation().orElseThrow(), within(1e-12));
  }

  @Test
  void equalReadingsReachFromZeroToWhatTheResolutionHides() {
    List<BigDecimal> equal = Questions.readings("100.0001", "100.0001", "100.0001", "100.0001");
    CheckPointFindings found = Questions.found(Questions.balance(), equal).orElseThrow();
    double upper = found.precisionFinding().upperBound().orElseThrow();
    Picture picture = Questions.spread(Questions.balance(), equal, SIZE);
    Shape.Bar bar = BeamPlotTest.of(picture, Shape.Bar.class).findFirst().orElseThrow();
    double perUnit = (BeamPlotTest.posts(picture).get(0).x1() - SIZE.text()) / 0.0003;
    assertThat(bar.x()).isEqualTo(SIZE.text());
    assertThat(bar.width() / perUnit).isCloseTo(upper, within(1e-12));
    assertThat(picture.text()).contains("4 equal readings");
  }

  @Test
  void oneReadingHasNoBar() {
    Picture picture = Questions.spread(Questions.balance(), Questions.readings("100.0001"), SIZE);
    assertThat(BeamPlotTest.of(picture, Shape.Bar.class)).isEmpty();
    assertThat(BeamPlotTest.of(picture, Shape.Ring.class)).isEmpty();
    assertThat(picture.text()).endsWith("One reading has none.");
  }

  @Test
  void aSpreadFarAboveThePermittedIsToldByAnArrow() {
    Picture picture =
        Questions.spread(Questions.balance(), Questions.readings("100", "103", "101"), SIZE);
    assertThat(BeamPlotTest.of(picture, Shape.Arrow.class)).hasSize(1);
    assertThat(BeamPlotTest.of(picture, Shape.Ring.class)).isEmpty();
    assertThat(BeamPlotTest.texts(picture)).contains("1.5");
  }
}
