package org.evenbeam.metrology;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.math.BigDecimal;
import java.util.List;
import java.util.stream.Stream;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.IntRange;
import org.evenbeam.metrology.TemperatureTable.Point;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class TemperatureTableTest {
  /** Given out of order: 7.020 at 20 °C, 7.000 at 25 °C, 6.990 at 30 °C, 6.990 at 40 °C. */
  private static final TemperatureTable BUFFER =
      table("30 6.990", "20 7.020", "40 6.990", "25 7.000");

  private static TemperatureTable table(String... pairs) {
    return new TemperatureTable(Stream.of(pairs).map(TemperatureTableTest::point).toList());
  }

  private static Point point(String pair) {
    List<BigDecimal> numbers = Stream.of(pair.split(" ", -1)).map(BigDecimal::new).toList();
    return new Point(numbers.get(0), numbers.get(1));
  }

  @ParameterizedTest
  @CsvSource({
    "20, 7.020",
    "21, 7.016",
    "22.5, 7.010",
    "25.0, 7.000",
    "26, 6.998",
    "35, 6.990",
    "40, 6.990"
  })
  void valuesLieOnTheLineBetweenTheirNeighbours(BigDecimal celsius, String value) {
    assertThat(BUFFER.valueAt(celsius)).isEqualByComparingTo(value);
  }

  @Test
  void aCertifiedValueKeepsItsZeros() {
    assertThat(BUFFER.valueAt(new BigDecimal("25.00"))).isEqualTo("7.000");
  }

  @Test
  void aThirdIsRoundedFarBelowAnyReading() {
    assertThat(table("0 0", "3 1").valueAt(BigDecimal.ONE))
        .isEqualTo("0.3333333333333333333333333333333333");
  }

  @ParameterizedTest
  @ValueSource(strings = {"19.999", "40.001", "-25", "298.15"})
  void nothingIsExtrapolated(BigDecimal celsius) {
    String message = "temperature in °C is " + celsius + ", allowed: 20 to 40";

    assertThatThrownBy(() -> BUFFER.valueAt(celsius))
        .isInstanceOf(IllegalArgumentException.class)
        .hasMessage(message);
    assertThatThrownBy(() -> BUFFER.steepnessAt(celsius))
        .isInstanceOf(IllegalArgumentException.class)
        .hasMessage(message);
  }

  @ParameterizedTest
  @CsvSource({"20, 0.004", "22, 0.004", "25, 0.004", "25.1, 0.002", "30, 0.002", "35, 0", "40, 0"})
  void steepnessIsThatOfThePieceAndTheLargerAtACorner(BigDecimal celsius, double steepness) {
    assertThat(BUFFER.steepnessAt(celsius)).isEqualTo(steepness);
  }

  @Test
  void aCornerTakesThePieceAboveWhereThatIsSteeper() {
    assertThat(table("0 0", "10 -1", "20 -3").steepnessAt(BigDecimal.TEN)).isEqualTo(0.2);
  }

  @Property
  void aStraightLineIsFoundAgainAnywhere(@ForAll @IntRange(min = 0, max = 400) int tenths) {
    BigDecimal celsius = BigDecimal.valueOf(tenths, 1);

    assertThat(table("0 5", "8 13", "40 45").valueAt(celsius))
        .isEqualByComparingTo(celsius.add(new BigDecimal(5)));
  }

  @Test
  void oneTemperatureIsNoTable() {
    assertThatThrownBy(() -> table("25 7.000"))
        .isInstanceOf(IllegalArgumentException.class)
        .hasMessage("number of temperatures is 1, allowed: 2 or more");
  }

  @Test
  void oneTemperatureHasOneValue() {
    assertThatThrownBy(() -> table("25 7.000", "20 7.020", "25.0 7.001"))
        .isInstanceOf(IllegalArgumentException.class)
        .hasMessage("temperature 25.0 °C stands twice in the table, allowed: once");
  }
}
