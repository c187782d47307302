package org.evenbeam.certificate;

import com.lowagie.text.pdf.PdfWriter;
import java.io.ByteArrayOutputStream;
import java.util.Locale;
import org.evenbeam.logbook.LastingJson;
import org.evenbeam.logbook.certificates.CertificateData;
import org.evenbeam.logbook.certificates.CertificatePress;
import org.evenbeam.logbook.certificates.CertificateRecord;
import org.evenbeam.wording.Figures;
import org.evenbeam.wording.Words;
import org.xhtmlrenderer.pdf.ITextRenderer;

/** Prints certificates from the template. */
public final class TemplatePress implements CertificatePress {
  private final Template template = new Template();
  private final PaperFonts fonts = new PaperFonts();

  @Override
  public String templateSha256() {
    return template.sha256();
  }

  @Override
  public byte[] print(CertificateRecord certificate) {
    CertificateData data = LastingJson.read(certificate.data(), CertificateData.class);
    Words words = new Words(Locale.forLanguageTag(data.laboratory().language()));
    Figures figures = new Figures(data.laboratory().decimalSign());
    CertificatePictures pictures = new CertificatePictures(data.sheet(), words, figures, fonts);
    CertificateModel model = new CertificateModel(certificate, data, words, figures);
    return set(template.fill(model.values()), pictures, certificate);
  }

  private byte[] set(String xhtml, CertificatePictures pictures, CertificateRecord certificate) {
    ITextRenderer renderer = new ITextRenderer();
    fonts.offerTo(renderer.getFontResolver());
    renderer
        .getSharedContext()
        .setReplacedElementFactory(
            new PictureElements(
                pictures.byName(), new PaperPainter(fonts), renderer.getDotsPerPoint()));
    renderer.setPDFVersion(PdfWriter.VERSION_1_7);
    renderer.setDocumentFromString(xhtml);
    renderer.setListener(new DocumentDates(certificate.issuedAt()));
    renderer.layout();
    ByteArrayOutputStream bytes = new ByteArrayOutputStream();
    renderer.createPDF(bytes);
    return bytes.toByteArray();
  }
}
