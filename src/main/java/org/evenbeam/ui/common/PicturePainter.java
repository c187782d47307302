package org.evenbeam.ui.common;

import java.util.List;
import java.util.Locale;
import javafx.scene.Node;
import javafx.scene.shape.Circle;
import javafx.scene.shape.Line;
import javafx.scene.shape.Polygon;
import javafx.scene.shape.Rectangle;
import javafx.scene.shape.StrokeLineCap;
import javafx.scene.text.Text;
import org.evenbeam.picture.Picture;
import org.evenbeam.picture.Role;
import org.evenbeam.picture.Shape;
import org.evenbeam.picture.TextMeasure;

/** Makes a picture's shapes into nodes, whose colours the style sheet gives by their role. */
final class PicturePainter {
  /** Widths by the program's own font. */
  static final TextMeasure MEASURE =
      (text, size, bold) -> {
        Text node = new Text(text);
        node.setFont(Fonts.of(size, bold));
        return node.getLayoutBounds().getWidth();
      };

  private PicturePainter() {}

  static List<Node> nodes(Picture picture) {
    return picture.shapes().stream().map(PicturePainter::node).toList();
  }

  private static Node node(Shape shape) {
    if (shape instanceof Shape.Label label) {
      return text(label);
    } else if (shape instanceof Shape.Line line) {
      return stroke(line);
    } else if (shape instanceof Shape.Bar bar) {
      Rectangle rectangle = new Rectangle(bar.x(), bar.y(), bar.width(), bar.height());
      rectangle.setArcWidth(2 * bar.radius());
      rectangle.setArcHeight(2 * bar.radius());
      return filled(rectangle, bar.role());
    } else if (shape instanceof Shape.Dot dot) {
      return filled(new Circle(dot.x(), dot.y(), dot.radius()), dot.role());
    } else if (shape instanceof Shape.Ring ring) {
      return ring(ring);
    } else if (shape instanceof Shape.Fulcrum fulcrum) {
      return fulcrum(fulcrum);
    }
    return arrow((Shape.Arrow) shape);
  }

  private static Node text(Shape.Label label) {
    Text text = new Text(label.text());
    text.setFont(Fonts.of(label.size(), label.bold()));
    double width = text.getLayoutBounds().getWidth();
    text.setX(
        switch (label.anchor()) {
          case START -> label.x();
          case MIDDLE -> label.x() - width / 2;
          case END -> label.x() - width;
        });
    text.setY(label.y());
    return filled(text, label.role());
  }

  private static Node stroke(Shape.Line shape) {
    Line line = new Line(shape.x1(), shape.y1(), shape.x2(), shape.y2());
    line.setStrokeWidth(shape.thickness());
    line.setStrokeLineCap(StrokeLineCap.ROUND);
    line.getStyleClass().add("stroke-" + name(shape.role()));
    return line;
  }

  private static Node ring(Shape.Ring shape) {
    Circle circle = new Circle(shape.x(), shape.y(), shape.radius() - shape.thickness() / 2);
    circle.setStrokeWidth(shape.thickness());
    circle.getStyleClass().add("stroke-" + name(shape.role()));
    return filled(circle, Role.SHEET);
  }

  private static Node fulcrum(Shape.Fulcrum shape) {
    double half = shape.width() / 2;
    double foot = shape.y() + shape.height();
    return filled(
        new Polygon(shape.x(), shape.y(), shape.x() - half, foot, shape.x() + half, foot),
        shape.role());
  }

  private static Node arrow(Shape.Arrow shape) {
    double half = shape.size() / 2;
    double tail =
        shape.direction() == Shape.Direction.LEFT
            ? shape.x() + shape.size()
            : shape.x() - shape.size();
    return filled(
        new Polygon(shape.x(), shape.y(), tail, shape.y() - half, tail, shape.y() + half),
        shape.role());
  }

  private static Node filled(Node node, Role role) {
    node.getStyleClass().add("fill-" + name(role));
    return node;
  }

  private static String name(Role role) {
    return role.name().toLowerCase(Locale.ROOT);
  }
}
