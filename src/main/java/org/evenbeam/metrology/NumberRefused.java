package org.evenbeam.metrology;

/** A text that is not accepted as a number; nothing is guessed from it. */
public final class NumberRefused extends IllegalArgumentException {
  private static final long serialVersionUID = 1L;

  /** Why the text was refused. */
  public enum Reason {
    /** Nothing but white space. */
    EMPTY,
    /** Holds the decimal sign that this laboratory does not use. */
    OTHER_DECIMAL_SIGN,
    /** Not a plain decimal number. */
    NOT_A_NUMBER,
    /** Its magnitude is outside 1e-150 to 1e150, or it has more than 100 characters. */
    OUT_OF_RANGE
  }

  private final Reason reason;
  private final String text;

  NumberRefused(Reason reason, String text) {
    super("not accepted as a number (" + reason + "): \"" + text + "\"");
    this.reason = reason;
    this.text = text;
  }

  /** Why. */
  public Reason reason() {
    return reason;
  }

  /** The text as it was typed, at most 100 characters of it. */
  public String text() {
    return text;
  }
}
