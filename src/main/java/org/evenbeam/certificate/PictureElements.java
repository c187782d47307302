package org.evenbeam.certificate;

import com.lowagie.text.Rectangle;
import java.awt.Point;
import java.util.Map;
import org.evenbeam.picture.Picture;
import org.w3c.dom.Element;
import org.xhtmlrenderer.extend.ReplacedElement;
import org.xhtmlrenderer.extend.ReplacedElementFactory;
import org.xhtmlrenderer.extend.UserAgentCallback;
import org.xhtmlrenderer.layout.LayoutContext;
import org.xhtmlrenderer.pdf.ITextOutputDevice;
import org.xhtmlrenderer.pdf.ITextReplacedElement;
import org.xhtmlrenderer.render.BlockBox;
import org.xhtmlrenderer.render.RenderingContext;
import org.xhtmlrenderer.simple.extend.FormSubmissionListener;

/** Puts pictures in the place of the template's elements that name one in {@code data-picture}. */
final class PictureElements implements ReplacedElementFactory {
  private static final String ATTRIBUTE = "data-picture";

  private final Map<String, Picture> pictures;
  private final PaperPainter painter;
  private final float dotsPerPoint;

  /**
   * Offers pictures by name.
   *
   * @param pictures each in points
   * @param painter paints them
   * @param dotsPerPoint how many of the layout's dots make a point
   */
  PictureElements(Map<String, Picture> pictures, PaperPainter painter, float dotsPerPoint) {
    this.pictures = pictures;
    this.painter = painter;
    this.dotsPerPoint = dotsPerPoint;
  }

  @Override
  public ReplacedElement createReplacedElement(
      LayoutContext context, BlockBox box, UserAgentCallback agent, int width, int height) {
    Element element = box.getElement();
    Picture picture = element == null ? null : pictures.get(element.getAttribute(ATTRIBUTE));
    return picture == null ? null : new Placed(picture);
  }

  @Override
  public void reset() {
    // nothing is kept between documents
  }

  @Override
  public void remove(Element element) {
    // nothing is kept about elements
  }

  @Override
  public void setFormSubmissionListener(FormSubmissionListener listener) {
    // certificates have no forms
  }

  private final class Placed implements ITextReplacedElement {
    private final Picture picture;
    private Point location = new Point();

    Placed(Picture picture) {
      this.picture = picture;
    }

    @Override
    public void paint(RenderingContext context, ITextOutputDevice device, BlockBox box) {
      Rectangle area = device.createLocalTargetArea(context, box);
      painter.paint(device.getCurrentPage(), picture, area.getLeft(), area.getBottom());
    }

    @Override
    public int getIntrinsicWidth() {
      return Math.round((float) picture.width() * dotsPerPoint);
    }

    @Override
    public int getIntrinsicHeight() {
      return Math.round((float) picture.height() * dotsPerPoint);
    }

    @Override
    public Point getLocation() {
      return location;
    }

    @Override
    public void setLocation(int x, int y) {
      location = new Point(x, y);
    }

    @Override
    public void detach(LayoutContext context) {
      // holds nothing to release
    }

    @Override
    public boolean isRequiresInteractivePaint() {
      return false;
    }

    @Override
    public boolean hasBaseline() {
      return false;
    }

    @Override
    public int getBaseline() {
      return 0;
    }
  }
}
