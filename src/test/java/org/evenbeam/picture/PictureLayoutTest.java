package org.evenbeam.picture;

import static org.assertj.core.api.Assertions.assertThat;

import java.math.BigDecimal;
import java.util.List;
import java.util.Optional;
import net.jqwik.api.Arbitraries;
import net.jqwik.api.Arbitrary;
import net.jqwik.api.Combinators;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.Provide;
import org.evenbeam.verification.CheckPointQuestion;

class PictureLayoutTest {
  @Property(tries = 2000)
  void beamPlotKeepsItsLabelsInsideAndApart(
      @ForAll("questions") CheckPointQuestion question,
      @ForAll("readings") List<BigDecimal> readings,
      @ForAll("sizes") Size size) {
    Picture picture = Questions.beam(question, readings, size);
    assertThat(Box.faults(picture)).isEmpty();
  }

  @Property(tries = 2000)
  void spreadBarKeepsItsLabelsInsideAndApart(
      @ForAll("questions") CheckPointQuestion question,
      @ForAll("readings") List<BigDecimal> readings,
      @ForAll("sizes") Size size) {
    Picture picture = Questions.spread(question, readings, size);
    assertThat(Box.faults(picture)).isEmpty();
  }

  @Provide
  Arbitrary<CheckPointQuestion> questions() {
    Arbitrary<Optional<BigDecimal>> limit =
        Arbitraries.of("0.0001", "0.0005", "0.00250", "0.013", "0.5", "12")
            .map(BigDecimal::new)
            .optional(0.8);
    Arbitrary<Optional<BigDecimal>> resolution =
        Arbitraries.of("0.00001", "0.0001", "0.005", "0.1").map(BigDecimal::new).optional(0.8);
    Arbitrary<Double> uncertainty = Arbitraries.of(0.0, 2e-5, 0.001, 3.0);
    return Combinators.combine(limit, limit, limit, resolution, uncertainty)
        .as(Questions::question);
  }

  @Provide
  Arbitrary<List<BigDecimal>> readings() {
    Arbitrary<BigDecimal> near = decimals(4, 0.003);
    Arbitrary<BigDecimal> far = decimals(1, 90);
    Arbitrary<BigDecimal> either =
        Arbitraries.frequencyOf(net.jqwik.api.Tuple.of(9, near), net.jqwik.api.Tuple.of(1, far));
    return Arbitraries.frequencyOf(
        net.jqwik.api.Tuple.of(4, either.list().ofMaxSize(12)),
        net.jqwik.api.Tuple.of(2, near.list().ofMinSize(30).ofMaxSize(500)),
        net.jqwik.api.Tuple.of(1, far.list().ofMaxSize(12)));
  }

  private static Arbitrary<BigDecimal> decimals(int scale, double about) {
    return Arbitraries.bigDecimals()
        .between(BigDecimal.valueOf(100 - about), BigDecimal.valueOf(100 + about))
        .ofScale(scale);
  }

  @Provide
  Arbitrary<Size> sizes() {
    return Combinators.combine(
            Arbitraries.doubles().between(120, 1400),
            Arbitraries.doubles().between(60, 500),
            Arbitraries.doubles().between(6, 20))
        .as(Size::new);
  }
}
