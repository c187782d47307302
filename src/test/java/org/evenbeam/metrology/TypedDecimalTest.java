package org.evenbeam.metrology;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class TypedDecimalTest {
  @ParameterizedTest
  @CsvSource({
    "20.0010, 20.0010",
    "'  20.5 ', 20.5",
    "−3.5, -3.5",
    "-3.5, -3.5",
    "+0.5, 0.5",
    ".5, 0.5",
    "5., 5",
    "1.2e-5, 0.000012",
    "1E3, 1E+3",
    "1e150, 1E+150"
  })
  void aPlainDecimalIsTakenWithItsZeros(String typed, String value) {
    assertThat(TypedDecimal.parse(typed, DecimalSign.POINT).value()).isEqualTo(value);
  }

  @ParameterizedTest
  @CsvSource({
    "'', EMPTY",
    "'1,234', OTHER_DECIMAL_SIGN",
    "twenty, NOT_A_NUMBER",
    "NaN, NOT_A_NUMBER",
    "Infinity, NOT_A_NUMBER",
    "1 234, NOT_A_NUMBER",
    "0x1F, NOT_A_NUMBER",
    "1.2.3, NOT_A_NUMBER",
    "--1, NOT_A_NUMBER",
    "e5, NOT_A_NUMBER",
    "٣, NOT_A_NUMBER",
    "1e400, OUT_OF_RANGE",
    "1e-400, OUT_OF_RANGE",
    "1e99999, NOT_A_NUMBER"
  })
  void anythingElseIsRefusedWithItsReason(String typed, NumberRefused.Reason reason) {
    assertThatThrownBy(() -> TypedDecimal.parse(typed, DecimalSign.POINT))
        .isInstanceOfSatisfying(
            NumberRefused.class, refused -> assertThat(refused.reason()).isEqualTo(reason));
  }

  @ParameterizedTest
  @CsvSource({"'1,5', 1.5", "'−0,25', -0.25"})
  void aCommaLaboratoryTypesCommas(String typed, String value) {
    assertThat(TypedDecimal.parse(typed, DecimalSign.COMMA).value()).isEqualTo(value);
  }

  @Property
  void anyTextIsTakenOrRefusedAndNothingElse(@ForAll String typed) {
    try {
      assertThat(TypedDecimal.parse(typed, DecimalSign.POINT).text()).isEqualTo(typed.strip());
    } catch (NumberRefused refused) {
      assertThat(refused.reason()).isNotNull();
    }
  }
}
