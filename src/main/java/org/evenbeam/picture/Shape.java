package org.evenbeam.picture;

/** One part of a picture. Lengths are in the picture's own unit, x to the right and y down. */
public sealed interface Shape {
  /** What it is for. */
  Role role();

  /** Where a label's x lies in its text. */
  enum Anchor {
    /** At its left end. */
    START,
    /** In its middle. */
    MIDDLE,
    /** At its right end. */
    END
  }

  /** Where an arrow points. */
  enum Direction {
    /** To smaller values. */
    LEFT,
    /** To larger values. */
    RIGHT
  }

  /** A straight line with round ends. */
  record Line(double x1, double y1, double x2, double y2, double thickness, Role role)
      implements Shape {}

  /** A filled bar; the corners have that radius. */
  record Bar(double x, double y, double width, double height, double radius, Role role)
      implements Shape {}

  /** A filled dot about its centre. */
  record Dot(double x, double y, double radius, Role role) implements Shape {}

  /** A ring about its centre, filled with {@link Role#SHEET}; the radius is that of its outside. */
  record Ring(double x, double y, double radius, double thickness, Role role) implements Shape {}

  /** A filled triangle, its apex on top at x, y. */
  record Fulcrum(double x, double y, double width, double height, Role role) implements Shape {}

  /** A filled arrow head, its tip at x, y. */
  record Arrow(double x, double y, double size, Direction direction, Role role) implements Shape {}

  /** A text on one line; y is its baseline. */
  record Label(String text, double x, double y, Anchor anchor, double size, boolean bold, Role role)
      implements Shape {}
}
