package org.evenbeam.certificate;

import com.lowagie.text.DocumentException;
import com.lowagie.text.pdf.BaseFont;
import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import org.evenbeam.picture.TextMeasure;
import org.xhtmlrenderer.pdf.ITextFontResolver;

/**
 * The typeface of certificates: Liberation Sans (SIL Open Font License), embedded, for text and
 * pictures.
 */
final class PaperFonts implements TextMeasure {
  /** The name that templates use. */
  static final String FAMILY = "Certificate Sans";

  private static final float UNIT = 1000;

  private static final String REGULAR = "liberation/LiberationSans-Regular.ttf";
  private static final String BOLD = "liberation/LiberationSans-Bold.ttf";

  private final BaseFont regular;
  private final BaseFont bold;

  /** Loads the font files that are shipped with the program. */
  PaperFonts() {
    this.regular = load(REGULAR);
    this.bold = load(BOLD);
  }

  /** Makes the typeface known to the page setter, which shares these fonts with the pictures. */
  void offerTo(ITextFontResolver resolver) {
    resolver.addFont(regular, REGULAR, FAMILY);
    resolver.addFont(bold, BOLD, FAMILY);
  }

  BaseFont font(boolean isBold) {
    return isBold ? bold : regular;
  }

  @Override
  public double width(String text, double size, boolean isBold) {
    return font(isBold).getWidth(text) / UNIT * size;
  }

  private static BaseFont load(String resource) {
    try (InputStream stream = PaperFonts.class.getClassLoader().getResourceAsStream(resource)) {
      if (stream == null) {
        throw new IllegalStateException("the program was built without the font " + resource);
      }
      return BaseFont.createFont(
          resource, BaseFont.IDENTITY_H, BaseFont.EMBEDDED, false, stream.readAllBytes(), null);
    } catch (IOException unreadable) {
      throw new UncheckedIOException(unreadable);
    } catch (DocumentException unusable) {
      throw new IllegalStateException("the font " + resource + " cannot be used", unusable);
    }
  }
}
