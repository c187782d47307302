package org.evenbeam.certificate;

import com.lowagie.text.pdf.PdfDate;
import com.lowagie.text.pdf.PdfDictionary;
import com.lowagie.text.pdf.PdfName;
import com.lowagie.text.pdf.PdfString;
import java.time.Instant;
import java.time.ZoneOffset;
import java.time.ZonedDateTime;
import java.util.GregorianCalendar;
import org.xhtmlrenderer.pdf.DefaultPDFCreationListener;
import org.xhtmlrenderer.pdf.ITextRenderer;

/** Dates a document by its certificate's day of issue, not by the day on which it is printed. */
final class DocumentDates extends DefaultPDFCreationListener {
  private final Instant issuedAt;

  DocumentDates(Instant issuedAt) {
    this.issuedAt = issuedAt;
  }

  @Override
  public void preWrite(ITextRenderer renderer, int pages) {
    PdfDictionary information = renderer.getWriter().getInfo();
    PdfDate date =
        new PdfDate(GregorianCalendar.from(ZonedDateTime.ofInstant(issuedAt, ZoneOffset.UTC)));
    information.put(PdfName.CREATIONDATE, date);
    information.put(PdfName.MODDATE, date);
    information.put(PdfName.PRODUCER, new PdfString("Evenbeam"));
  }
}
