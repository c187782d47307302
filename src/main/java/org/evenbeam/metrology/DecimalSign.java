package org.evenbeam.metrology;

/**
 * The character that separates the integer part of a number from its decimals in one laboratory.
 */
public enum DecimalSign {
  /** As in 20.0013. */
  POINT('.'),
  /** As in 20,0013. */
  COMMA(',');

  private final char character;

  DecimalSign(char character) {
    this.character = character;
  }

  /** The sign itself. */
  public char character() {
    return character;
  }

  /** The sign that this laboratory does not use, so that a number typed with it is refused. */
  public DecimalSign other() {
    return this == POINT ? COMMA : POINT;
  }
}
