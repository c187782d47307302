package org.evenbeam.picture;

/**
 * How large a picture shall be.
 *
 * @param width in any unit, above 0
 * @param height in the same, above 0
 * @param text the size of its labels, in the same; made smaller where the picture leaves no room
 */
public record Size(double width, double height, double text) {
  /** Checks the ranges. */
  public Size {
    positive("width", width);
    positive("height", height);
    positive("text", text);
  }

  private static void positive(String name, double value) {
    if (!(value > 0) || Double.isInfinite(value)) {
      throw new IllegalArgumentException(name + " is " + value + ", allowed: above 0, finite");
    }
  }

  /** The text size that leaves room for so many texts side by side and so many rows. */
  double textWithin(double ems, double rows) {
    return Math.min(text, Math.min(width / ems, height / rows));
  }
}
