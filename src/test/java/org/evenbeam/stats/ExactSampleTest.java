package org.evenbeam.stats;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.evenbeam.stats.Close.assertClose;

import java.math.BigDecimal;
import java.math.MathContext;
import java.util.Collections;
import java.util.List;
import java.util.Locale;
import java.util.Random;
import java.util.stream.IntStream;
import java.util.stream.Stream;
import org.evenbeam.stats.ReferenceTable.Row;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;

class ExactSampleTest {
  static List<Row> nistSets() {
    return ReferenceTable.rows("nist-strd/certified.csv");
  }

  static ExactSample sample(String... readings) {
    return ExactSample.of(Stream.of(readings).map(BigDecimal::new).toList());
  }

  @ParameterizedTest
  @MethodSource("nistSets")
  void nistSetsAreMetToAllCertifiedDigits(Row set) {
    String file = "nist-strd/" + set.text("dataset").toLowerCase(Locale.ROOT) + ".csv";
    ExactSample sample = ExactSample.of(ReferenceTable.decimals(file, "y"));

    assertThat(sample.n()).isEqualTo(set.count("n"));
    assertClose("certified mean", sample.mean(), set.number("mean"), 5e-15);
    assertClose("certified sd", sample.standardDeviation().orElseThrow(), set.number("sd"), 5e-15);
    assertThat(sample.mean()).isEqualTo(set.number("mean_mp"));
    assertThat(sample.standardDeviation()).hasValue(set.number("sd_mp"));
  }

  @Test
  void theOffsetCostsNoDigit() {
    ExactSample near = sample("0.0013", "-0.0002", "0.0007", "0.0021");
    ExactSample far =
        sample("1000000000.0013", "999999999.9998", "1000000000.0007", "1000000000.0021");

    assertThat(far.standardDeviation()).isEqualTo(near.standardDeviation());
    assertThat(far.sumOfSquaresAboutMean()).isEqualTo(near.sumOfSquaresAboutMean());
    assertThat(far.meanMinus(new BigDecimal("1e9"))).isEqualTo(near.mean());
    assertThat(far.deviations()).isEqualTo(near.deviations());
  }

  @Test
  void resultsAreTheNearestDoubles() {
    Random random = new Random(20260301);
    for (int trial = 0; trial < 2000; trial++) {
      ExactSample sample = ExactSample.of(randomReadings(random));
      BigDecimal mean = sample.mean(new MathContext(60));
      BigDecimal squares =
          sample.readings().stream()
              .map(x -> x.subtract(mean).pow(2))
              .reduce(BigDecimal.ZERO, BigDecimal::add);
      BigDecimal variance = squares.divide(new BigDecimal(sample.n() - 1), new MathContext(60));

      assertThat(sample.mean()).isEqualTo(mean.doubleValue());
      assertThat(sample.sumOfSquaresAboutMean()).isEqualTo(squares.doubleValue());
      assertThat(sample.standardDeviation())
          .hasValue(variance.sqrt(new MathContext(50)).doubleValue());
    }
  }

  private static List<BigDecimal> randomReadings(Random random) {
    int scale = random.nextInt(40) - 20;
    int n = 2 + random.nextInt(12);
    return IntStream.range(0, n)
        .mapToObj(i -> BigDecimal.valueOf(random.nextInt(), scale + random.nextInt(4)))
        .toList();
  }

  @Test
  void aTieOfTheMeanGoesToTheEvenDouble() {
    assertThat(sample("1", "1.0000000000000002220446049250313080847263336181640625").mean())
        .isEqualTo(1.0);
    assertThat(sample("9007199254740993").mean()).isEqualTo(9007199254740992.0);
    assertThat(sample("9007199254740993", "9007199254740993.0000000002").mean())
        .isEqualTo(9007199254740994.0);
  }

  @Test
  void oneReadingHasAMeanButNoStandardDeviation() {
    ExactSample single = sample("-20.0003");

    assertThat(single.mean()).isEqualTo(-20.0003);
    assertThat(single.standardDeviation()).isEmpty();
    assertThat(single.allEqual()).isTrue();
  }

  @Test
  void equalValuesAreEqualHoweverTheyAreTyped() {
    ExactSample equal = sample("2.50", "2.5", "2.500", "25e-1");

    assertThat(equal.allEqual()).isTrue();
    assertThat(equal.distinctValues()).isEqualTo(1);
    assertThat(equal.standardDeviation()).hasValue(0.0);
    assertThat(sample("2.50", "2.51").allEqual()).isFalse();
    assertThat(sample("2.50", "2.51", "2.5").distinctValues()).isEqualTo(2);
  }

  @Test
  void readingsInThousandsKeepTheirNegativeScale() {
    ExactSample sample = sample("1E+3", "3E+3");

    assertThat(sample.mean()).isEqualTo(2000.0);
    assertThat(sample.standardDeviation()).hasValue(Math.sqrt(2e6));
    assertThat(sample.meanMinus(new BigDecimal("1999.5"))).isEqualTo(0.5);
  }

  @Test
  void sizesFarApartStayExact() {
    ExactSample sample = sample("1e149", "1e-150", "-1e149");

    assertThat(sample.mean(MathContext.DECIMAL64)).isEqualTo("3.333333333333333E-151");
    assertThat(sample.mean()).isEqualTo(1e-150 / 3);
    assertThat(sample.standardDeviation()).hasValue(1e149);
  }

  @Test
  void aMillionReadingsAreSummedExactly() {
    List<BigDecimal> readings =
        IntStream.range(0, 1_000_000)
            .mapToObj(i -> BigDecimal.valueOf(10_000_000_000_000L + i % 2, 13))
            .toList();

    ExactSample sample = ExactSample.of(readings);

    assertThat(sample.meanMinus(BigDecimal.ONE)).isEqualTo(5e-14);
    assertThat(sample.sumOfSquaresAboutMean()).isEqualTo(2.5e-21);
  }

  @ParameterizedTest
  @ValueSource(
      strings = {"1e150", "1e300", "1e2147483647", "1e-151", "0e-2000000000", "0e999999999"})
  void sizesThatNoInstrumentReadsAreRefusedByPosition(String reading) {
    assertThatThrownBy(() -> sample("1", reading))
        .isInstanceOf(IllegalArgumentException.class)
        .hasMessageContaining("reading 2")
        .hasMessageContaining("1e-150 to 1e150");
    assertThatThrownBy(() -> sample("1").meanMinus(new BigDecimal(reading)))
        .isInstanceOf(IllegalArgumentException.class)
        .hasMessageContaining("reference");
  }

  @Test
  void noReadingAndAnAbsentReadingAreRefused() {
    assertThatThrownBy(ExactSampleTest::sample)
        .isInstanceOf(IllegalArgumentException.class)
        .hasMessageContaining("number of readings is 0");
    assertThatThrownBy(() -> ExactSample.of(Collections.singletonList(null)))
        .isInstanceOf(IllegalArgumentException.class)
        .hasMessageContaining("reading 1 is absent");
  }
}
