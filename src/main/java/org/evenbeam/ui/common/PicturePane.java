package org.evenbeam.ui.common;

import javafx.scene.AccessibleRole;
import javafx.scene.layout.Pane;
import javafx.scene.shape.Rectangle;
import org.evenbeam.picture.Picture;
import org.evenbeam.picture.Size;
import org.evenbeam.picture.TextMeasure;

/** Shows a picture as large as there is room, drawn anew when the room changes. */
public final class PicturePane extends Pane {
  /** Draws a picture in the size that is asked for. */
  @FunctionalInterface
  public interface Drawing {
    /** The picture in that size. */
    Picture draw(Size size, TextMeasure measure);
  }

  private static final double TEXT_SIZE = 13;

  private final Rectangle clip = new Rectangle();
  private Drawing drawing;

  /** An empty pane of at least that size. */
  public PicturePane(double leastWidth, double leastHeight) {
    setMinSize(leastWidth, leastHeight);
    setPrefSize(leastWidth, leastHeight);
    getStyleClass().add("picture");
    setAccessibleRole(AccessibleRole.IMAGE_VIEW);
    setClip(clip);
    widthProperty().addListener((width, before, now) -> paint());
    heightProperty().addListener((height, before, now) -> paint());
  }

  /** A pane that keeps its picture's own size, such as a mark's. */
  public static PicturePane fixed(Picture picture) {
    PicturePane pane = new PicturePane(picture.width(), picture.height());
    pane.setMaxSize(picture.width(), picture.height());
    pane.show((size, measure) -> picture);
    return pane;
  }

  /** Shows what that drawing draws. */
  public void show(Drawing shown) {
    drawing = shown;
    paint();
  }

  private void paint() {
    clip.setWidth(getWidth());
    clip.setHeight(getHeight());
    if (drawing == null || getWidth() < 1 || getHeight() < 1) {
      return;
    }
    Picture picture =
        drawing.draw(new Size(getWidth(), getHeight(), TEXT_SIZE), PicturePainter.MEASURE);
    setAccessibleText(picture.text());
    getChildren().setAll(PicturePainter.nodes(picture));
  }
}
