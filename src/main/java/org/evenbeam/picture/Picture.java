package org.evenbeam.picture;

import java.util.List;

/**
 * A picture to be painted.
 *
 * @param width in its own unit, above 0
 * @param height in the same
 * @param shapes from the hindmost to the foremost
 * @param text what it shows, in words, for those who do not see it
 */
public record Picture(double width, double height, List<Shape> shapes, String text) {
  /** Keeps the shapes unchangeable. */
  public Picture {
    shapes = List.copyOf(shapes);
  }
}
