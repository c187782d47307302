package org.evenbeam.metrology;

import java.math.BigDecimal;
import java.util.regex.Pattern;

/**
 * A decimal exactly as a person or an instrument gave it.
 *
 * @param text the characters as typed, without surrounding white space
 * @param sign the decimal sign in force when it was typed
 * @param value the number that the text says, with its trailing zeros
 */
public record TypedDecimal(String text, DecimalSign sign, BigDecimal value) {
  private static final int LONGEST = 100;
  private static final int LARGEST_EXPONENT = 150;
  private static final Pattern PLAIN =
      Pattern.compile("[+-]?(?:\\d+(?:\\.\\d*)?|\\.\\d+)(?:[eE][+-]?\\d{1,4})?");

  /**
   * Reads a number by the laboratory's decimal sign. A minus may be U+2212 or the hyphen; a power
   * of ten may follow as in 1.2e-5. Digit grouping is never accepted: 1,234 could mean two numbers.
   *
   * @throws NumberRefused with the reason, for anything else
   */
  public static TypedDecimal parse(String typed, DecimalSign sign) {
    String text = typed.strip();
    if (text.isEmpty()) {
      throw new NumberRefused(NumberRefused.Reason.EMPTY, text);
    }
    if (text.length() > LONGEST) {
      throw new NumberRefused(NumberRefused.Reason.OUT_OF_RANGE, text.substring(0, LONGEST));
    }
    if (text.indexOf(sign.other().character()) >= 0) {
      throw new NumberRefused(NumberRefused.Reason.OTHER_DECIMAL_SIGN, text);
    }
    String plain = text.replace(sign.character(), '.').replace('\u2212', '-');
    if (!PLAIN.matcher(plain).matches()) {
      throw new NumberRefused(NumberRefused.Reason.NOT_A_NUMBER, text);
    }
    return new TypedDecimal(text, sign, withinRange(new BigDecimal(plain), text));
  }

  private static BigDecimal withinRange(BigDecimal value, String text) {
    int exponent = value.precision() - value.scale() - 1;
    boolean readable = Math.abs(exponent) <= LARGEST_EXPONENT && value.scale() <= LARGEST_EXPONENT;
    if (value.signum() == 0 ? Math.abs(value.scale()) > LARGEST_EXPONENT : !readable) {
      throw new NumberRefused(NumberRefused.Reason.OUT_OF_RANGE, text);
    }
    return value;
  }
}
