package org.evenbeam.certificate;

import static org.assertj.core.api.Assertions.assertThat;

import java.awt.image.BufferedImage;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import javax.imageio.ImageIO;
import org.apache.pdfbox.Loader;
import org.apache.pdfbox.pdmodel.PDDocument;
import org.apache.pdfbox.rendering.PDFRenderer;
import org.evenbeam.fixture.TestLaboratory;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;

/** Writes pictures of a certificate's pages to target/screens, for looking at. */
@Tag("pictures")
class PrintedPictures {
  private static final Path FOLDER = Path.of("target", "screens");
  private static final float DOTS_PER_INCH = 110;

  @Test
  void everyPageOfACertificate() throws IOException {
    try (TestLaboratory laboratory = new TestLaboratory()) {
      long run = laboratory.submitted();
      laboratory
          .logbook()
          .signOff()
          .approve(laboratory.manager(), run, TestLaboratory.password(), "");
      String number = laboratory.logbook().certificates().issue(laboratory.manager(), run);
      byte[] pdf = laboratory.logbook().certificates().document(laboratory.auditor(), number);
      assertThat(write(pdf)).isPositive();
    }
  }

  private static int write(byte[] pdf) throws IOException {
    Files.createDirectories(FOLDER);
    try (PDDocument document = Loader.loadPDF(pdf)) {
      PDFRenderer renderer = new PDFRenderer(document);
      for (int page = 0; page < document.getNumberOfPages(); page++) {
        BufferedImage image = renderer.renderImageWithDPI(page, DOTS_PER_INCH);
        Path file = FOLDER.resolve("certificate-" + (page + 1) + ".png");
        ImageIO.write(image, "png", file.toFile());
      }
      return document.getNumberOfPages();
    }
  }
}
