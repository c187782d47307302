package org.evenbeam.picture;

/** How wide texts are, by the font that will be used. */
@FunctionalInterface
public interface TextMeasure {
  /** The width of the text at that size, in the unit of the size. */
  double width(String text, double size, boolean bold);
}
