package org.evenbeam.picture;

import java.util.List;

/** The room that a shape takes. */
record Box(double left, double top, double right, double bottom) {
  private static final double ASCENT = 0.75;
  private static final double DESCENT = 0.22;
  private static final double TOLERANCE = 1e-6;

  static Box of(Shape shape) {
    if (shape instanceof Shape.Label label) {
      double width = Questions.FIXED.width(label.text(), label.size(), label.bold());
      double left =
          switch (label.anchor()) {
            case START -> label.x();
            case MIDDLE -> label.x() - width / 2;
            case END -> label.x() - width;
          };
      return new Box(
          left,
          label.y() - ASCENT * label.size(),
          left + width,
          label.y() + DESCENT * label.size());
    }
    if (shape instanceof Shape.Line line) {
      double half = line.thickness() / 2;
      return new Box(
          Math.min(line.x1(), line.x2()) - half,
          Math.min(line.y1(), line.y2()) - half,
          Math.max(line.x1(), line.x2()) + half,
          Math.max(line.y1(), line.y2()) + half);
    }
    if (shape instanceof Shape.Bar bar) {
      return new Box(bar.x(), bar.y(), bar.x() + bar.width(), bar.y() + bar.height());
    }
    if (shape instanceof Shape.Dot dot) {
      return about(dot.x(), dot.y(), dot.radius());
    }
    if (shape instanceof Shape.Ring ring) {
      return about(ring.x(), ring.y(), ring.radius());
    }
    if (shape instanceof Shape.Fulcrum fulcrum) {
      double half = fulcrum.width() / 2;
      return new Box(
          fulcrum.x() - half, fulcrum.y(), fulcrum.x() + half, fulcrum.y() + fulcrum.height());
    }
    Shape.Arrow arrow = (Shape.Arrow) shape;
    boolean left = arrow.direction() == Shape.Direction.LEFT;
    double tail = left ? arrow.x() + arrow.size() : arrow.x() - arrow.size();
    return new Box(
        Math.min(arrow.x(), tail),
        arrow.y() - arrow.size() / 2,
        Math.max(arrow.x(), tail),
        arrow.y() + arrow.size() / 2);
  }

  private static Box about(double x, double y, double radius) {
    return new Box(x - radius, y - radius, x + radius, y + radius);
  }

  boolean overlaps(Box other) {
    return left < other.right - TOLERANCE
        && other.left < right - TOLERANCE
        && top < other.bottom - TOLERANCE
        && other.top < bottom - TOLERANCE;
  }

  boolean liesIn(Picture picture) {
    return left >= -TOLERANCE
        && top >= -TOLERANCE
        && right <= picture.width() + TOLERANCE
        && bottom <= picture.height() + TOLERANCE;
  }

  /** What is wrong with a picture's lay-out: cut off, or a label over another shape. */
  static List<String> faults(Picture picture) {
    List<Shape> shapes = picture.shapes();
    List<String> faults = new java.util.ArrayList<>();
    for (int i = 0; i < shapes.size(); i++) {
      if (!of(shapes.get(i)).liesIn(picture)) {
        faults.add("cut off: " + shapes.get(i));
      }
      for (int j = 0; j < shapes.size(); j++) {
        boolean labelled = shapes.get(i) instanceof Shape.Label;
        if (labelled && i != j && of(shapes.get(i)).overlaps(of(shapes.get(j)))) {
          faults.add(shapes.get(i) + " over " + shapes.get(j));
        }
      }
    }
    return faults;
  }
}
