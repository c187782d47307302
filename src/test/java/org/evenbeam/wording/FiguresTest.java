package org.evenbeam.wording;

import static org.assertj.core.api.Assertions.assertThat;

import org.evenbeam.metrology.DecimalSign;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class FiguresTest {
  private final Figures figures = new Figures(DecimalSign.POINT);

  @ParameterizedTest
  @CsvSource({
    "0.000074321, 0.000074",
    "0.1, 0.10",
    "0.0995, 0.10",
    "3, 3.0",
    "12.4, 12",
    "1234, 1200",
    "0, 0",
    "1.5e-9, 1.5e−9"
  })
  void anUncertaintyHasTwoSignificantDigits(double value, String written) {
    assertThat(figures.uncertainty(value)).isEqualTo(written);
  }

  @ParameterizedTest
  @CsvSource({"0.000074, 6", "0.10, 2", "3.0, 1", "12, 0", "120, 0", "0, 0"})
  void aValueGoesToThePlaceOfItsUncertainty(double uncertainty, int places) {
    assertThat(figures.placesBeside(uncertainty)).isEqualTo(places);
  }

  @ParameterizedTest
  @CsvSource({"0.00026, 5, +0.00026", "-0.00026, 5, −0.00026", "0.000001, 4, 0.0000"})
  void aSignedFigureShowsItsSign(double value, int places, String written) {
    assertThat(figures.signedToPlaces(value, places)).isEqualTo(written);
  }

  @ParameterizedTest
  @CsvSource({
    "0.05, '5\u202f%'",
    "0.9, '90\u202f%'",
    "0.999, '99.9\u202f%'",
    "1e-12, '1e−10\u202f%'"
  })
  void aShareIsWrittenInPercent(double share, String written) {
    assertThat(figures.percent(share)).isEqualTo(written);
  }

  @Test
  void aSmallProbabilityIsNeverZero() {
    assertThat(figures.probability(1e-30)).isEqualTo("<\u202f0.0001");
    assertThat(figures.probability(0.0432)).isEqualTo("0.043");
  }

  @Test
  void aCommaLaboratoryWritesCommas() {
    assertThat(new Figures(DecimalSign.COMMA).toPlaces(1234.5, 2)).isEqualTo("1234,50");
  }

  @Test
  void infiniteDegreesOfFreedomHaveTheirSign() {
    assertThat(figures.degreesOfFreedom(Double.POSITIVE_INFINITY)).isEqualTo("∞");
    assertThat(figures.degreesOfFreedom(9)).isEqualTo("9");
    assertThat(figures.degreesOfFreedom(16.69)).isEqualTo("16.7");
  }
}
