package org.evenbeam.stats;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.evenbeam.stats.Close.assertClose;

import java.util.ArrayList;
import java.util.List;
import org.evenbeam.stats.ReferenceTable.Row;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;

class CombinedUncertaintyTest {
  private static final double INFINITE = Double.POSITIVE_INFINITY;

  static List<Row> published() {
    return ReferenceTable.rows("metrology/welch_satterthwaite.csv");
  }

  private static List<UncertaintyComponent> components(Row row, double scale) {
    String[] u = row.text("u_components").split(" ", -1);
    String[] nu = row.text("nu_components").split(" ", -1);
    List<UncertaintyComponent> components = new ArrayList<>();
    for (int i = 0; i < u.length; i++) {
      double degrees = nu[i].equals("inf") ? INFINITE : Double.parseDouble(nu[i]);
      components.add(new UncertaintyComponent(Double.parseDouble(u[i]) * scale, degrees));
    }
    return components;
  }

  @ParameterizedTest
  @MethodSource("published")
  void componentsCombineAsPublished(Row row) {
    CombinedUncertainty combined = CombinedUncertainty.of(components(row, 1));

    assertClose("u_c", combined.standardUncertainty(), row.number("u_c"), 2e-13);
    assertClose("nu_eff", combined.degreesOfFreedom(), row.number("nu_eff"), 1e-12);
  }

  @ParameterizedTest
  @CsvSource({"1e-140", "1e140"})
  void unitsDoNotMatter(double scale) {
    for (Row row : published()) {
      CombinedUncertainty scaled = CombinedUncertainty.of(components(row, scale));

      assertClose("u_c", scaled.standardUncertainty(), row.number("u_c") * scale, 2e-13);
      assertClose("nu_eff", scaled.degreesOfFreedom(), row.number("nu_eff"), 1e-12);
    }
  }

  @Test
  void endGaugeOfTheGum() {
    UncertaintyComponent repeated = new UncertaintyComponent(13 / Math.sqrt(5), 24);
    double random = 10 / Student.of(5).quantileOfUpperTail(0.025);
    CombinedUncertainty difference =
        CombinedUncertainty.of(
            repeated, new UncertaintyComponent(random, 5), new UncertaintyComponent(20.0 / 3, 8));
    double length = 50_000_623;
    CombinedUncertainty gauge =
        CombinedUncertainty.of(
            new UncertaintyComponent(25, 18),
            new UncertaintyComponent(
                difference.standardUncertainty(), difference.degreesOfFreedom()),
            new UncertaintyComponent(length * 1e-7 / Math.sqrt(3), 50),
            new UncertaintyComponent(length * 11.5e-6 * 0.05 / Math.sqrt(3), 2));

    assertClose("u(d)", difference.standardUncertainty(), gum("u(d)"), 1e-14);
    assertClose("nu(d)", difference.degreesOfFreedom(), gum("nu(d)"), 1e-14);
    assertClose("u_c(l)", gauge.standardUncertainty(), gum("u_c(l)"), 1e-14);
    assertClose("nu_eff(l)", gauge.degreesOfFreedom(), gum("nu_eff(l)"), 1e-14);
    double expanded = Student.of(16).quantileOfUpperTail(0.005) * gauge.standardUncertainty();
    assertClose("U_99", expanded, gum("U_99"), 1e-14);
  }

  private static double gum(String quantity) {
    return ReferenceTable.rows("metrology/gum_h1_end_gauge.csv", "quantity", quantity)
        .findFirst()
        .orElseThrow()
        .number("computed");
  }

  @Test
  void whatIsZeroOrExactlyKnownHasInfiniteDegreesOfFreedom() {
    CombinedUncertainty nothing = CombinedUncertainty.of();
    CombinedUncertainty zeros = CombinedUncertainty.of(new UncertaintyComponent(0, 3));
    CombinedUncertainty known =
        CombinedUncertainty.of(UncertaintyComponent.known(3), UncertaintyComponent.known(4));

    assertThat(nothing).isEqualTo(zeros).isEqualTo(new CombinedUncertainty(0, INFINITE));
    assertThat(known).isEqualTo(new CombinedUncertainty(5, INFINITE));
  }

  @Test
  void aZeroComponentDoesNotTakeFreedomAway() {
    CombinedUncertainty combined =
        CombinedUncertainty.of(new UncertaintyComponent(0, 1), new UncertaintyComponent(2, 49));

    assertThat(combined).isEqualTo(new CombinedUncertainty(2, 49));
  }

  @ParameterizedTest
  @CsvSource({
    "-1,5,standardUncertainty",
    "NaN,5,standardUncertainty",
    "Infinity,5,standardUncertainty",
    "1,0.4,degreesOfFreedom",
    "1,NaN,degreesOfFreedom"
  })
  void badComponentsAreNamed(double u, double nu, String name) {
    assertThatThrownBy(() -> new UncertaintyComponent(u, nu))
        .isInstanceOf(IllegalArgumentException.class)
        .hasMessageStartingWith(name + " is ");
  }
}
