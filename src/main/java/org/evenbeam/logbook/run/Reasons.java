package org.evenbeam.logbook.run;

/** Reasons in words. */
public final class Reasons {
  private Reasons() {}

  /**
   * The reason without surrounding white space.
   *
   * @throws RunRefused when nothing is left
   */
  public static String required(String reason) {
    String text = reason.strip();
    if (text.isEmpty()) {
      throw RunRefused.reasonMissing();
    }
    return text;
  }
}
