package org.evenbeam.certificate;

import com.lowagie.text.pdf.PdfContentByte;
import java.awt.Color;
import org.evenbeam.picture.Picture;
import org.evenbeam.picture.Role;
import org.evenbeam.picture.Shape;

/** Paints a picture on paper, in ink, legible in grey. */
final class PaperPainter {
  private static final Color INK = new Color(0x20, 0x28, 0x2c);
  private static final Color QUIET = new Color(0x4c, 0x56, 0x5a);
  private static final Color LINE = new Color(0x8a, 0x8f, 0x90);
  private static final Color BEAM = new Color(0x2f, 0x4b, 0x7c);

  private final PaperFonts fonts;

  PaperPainter(PaperFonts fonts) {
    this.fonts = fonts;
  }

  /**
   * Paints.
   *
   * @param page the page's content
   * @param picture what to paint, in points
   * @param left where its left edge lies, in points
   * @param bottom where its lower edge lies, in points
   */
  void paint(PdfContentByte page, Picture picture, float left, float bottom) {
    page.saveState();
    page.concatCTM(1, 0, 0, 1, left, bottom);
    picture.shapes().forEach(shape -> paint(page, shape, picture.height()));
    page.restoreState();
  }

  private void paint(PdfContentByte page, Shape shape, double height) {
    page.setColorFill(colour(shape.role()));
    page.setColorStroke(colour(shape.role()));
    if (shape instanceof Shape.Line line) {
      line(page, line, height);
    } else if (shape instanceof Shape.Bar bar) {
      page.roundRectangle(
          (float) bar.x(),
          (float) (height - bar.y() - bar.height()),
          (float) bar.width(),
          (float) bar.height(),
          (float) Math.min(bar.radius(), Math.min(bar.width(), bar.height()) / 2));
      page.fill();
    } else if (shape instanceof Shape.Dot dot) {
      page.circle((float) dot.x(), (float) (height - dot.y()), (float) dot.radius());
      page.fill();
    } else if (shape instanceof Shape.Ring ring) {
      ring(page, ring, height);
    } else if (shape instanceof Shape.Fulcrum fulcrum) {
      fulcrum(page, fulcrum, height);
    } else if (shape instanceof Shape.Arrow arrow) {
      arrow(page, arrow, height);
    } else if (shape instanceof Shape.Label label) {
      label(page, label, height);
    }
  }

  private static void line(PdfContentByte page, Shape.Line line, double height) {
    page.setLineWidth((float) line.thickness());
    page.setLineCap(PdfContentByte.LINE_CAP_ROUND);
    page.moveTo((float) line.x1(), (float) (height - line.y1()));
    page.lineTo((float) line.x2(), (float) (height - line.y2()));
    page.stroke();
  }

  private static void ring(PdfContentByte page, Shape.Ring ring, double height) {
    float middle = (float) (ring.radius() - ring.thickness() / 2);
    page.setColorFill(colour(Role.SHEET));
    page.setLineWidth((float) ring.thickness());
    page.circle((float) ring.x(), (float) (height - ring.y()), middle);
    page.fillStroke();
  }

  private static void fulcrum(PdfContentByte page, Shape.Fulcrum fulcrum, double height) {
    float top = (float) (height - fulcrum.y());
    float base = (float) (top - fulcrum.height());
    page.moveTo((float) fulcrum.x(), top);
    page.lineTo((float) (fulcrum.x() - fulcrum.width() / 2), base);
    page.lineTo((float) (fulcrum.x() + fulcrum.width() / 2), base);
    page.closePathFillStroke();
  }

  private static void arrow(PdfContentByte page, Shape.Arrow arrow, double height) {
    float y = (float) (height - arrow.y());
    float back =
        (float)
            (arrow.direction() == Shape.Direction.RIGHT
                ? arrow.x() - arrow.size()
                : arrow.x() + arrow.size());
    page.moveTo((float) arrow.x(), y);
    page.lineTo(back, (float) (y + arrow.size() / 2));
    page.lineTo(back, (float) (y - arrow.size() / 2));
    page.closePath();
    page.fill();
  }

  private void label(PdfContentByte page, Shape.Label label, double height) {
    int alignment =
        switch (label.anchor()) {
          case START -> PdfContentByte.ALIGN_LEFT;
          case MIDDLE -> PdfContentByte.ALIGN_CENTER;
          case END -> PdfContentByte.ALIGN_RIGHT;
        };
    page.beginText();
    page.setFontAndSize(fonts.font(label.bold()), (float) label.size());
    page.showTextAligned(
        alignment, label.text(), (float) label.x(), (float) (height - label.y()), 0);
    page.endText();
  }

  /** Verdicts are told by their shape, so paper needs one ink; the beam keeps its dark blue. */
  private static Color colour(Role role) {
    return switch (role) {
      case INK, POST, LEVEL, TILT, SWAY -> INK;
      case QUIET -> QUIET;
      case LINE -> LINE;
      case BEAM -> BEAM;
      case SHEET -> Color.WHITE;
    };
  }
}
