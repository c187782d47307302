package org.evenbeam.logbook.certificates;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.evenbeam.fixture.TestLaboratory.password;

import java.io.IOException;
import org.apache.pdfbox.Loader;
import org.apache.pdfbox.pdmodel.PDDocument;
import org.apache.pdfbox.text.PDFTextStripper;
import org.evenbeam.fixture.TestLaboratory;
import org.evenbeam.logbook.LastingJson;
import org.evenbeam.metrology.DecimalSign;
import org.evenbeam.trail.Sha256;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.Test;

class CertificatesTest {
  private final TestLaboratory laboratory = new TestLaboratory();

  @AfterEach
  void close() {
    laboratory.close();
  }

  private Certificates certificates() {
    return laboratory.logbook().certificates();
  }

  private long approved() {
    long run = laboratory.submitted();
    laboratory.logbook().signOff().approve(laboratory.manager(), run, password(), "");
    return run;
  }

  private static String text(byte[] pdf) throws IOException {
    try (PDDocument document = Loader.loadPDF(pdf)) {
      return new PDFTextStripper().getText(document).replaceAll("[\\s\\u202f]+", " ");
    }
  }

  @Test
  void anApprovedRunGetsANumberedDocumentKeptWithItsHash() {
    String number = certificates().issue(laboratory.manager(), approved());

    CertificateFacts facts = certificates().history(laboratory.auditor(), 10).get(0);
    byte[] document = certificates().document(laboratory.auditor(), number);
    assertThat(number).isEqualTo("2026-00001");
    assertThat(facts.documentSha256()).contains(Sha256.hex(document));
    assertThat(facts.approvedBy()).isEqualTo("Mia Manager");
  }

  @Test
  void theDocumentSaysWhatAnAuditorAsks() throws IOException {
    String number = certificates().issue(laboratory.manager(), approved());

    assertThat(text(certificates().document(laboratory.auditor(), number)))
        .contains("Certificate of in-house verification")
        .contains("2026-00001")
        .contains("CONFORMS")
        .contains("Test laboratory", "1 Bench Road, Testville")
        .contains("BAL-1", "analytical balance", "Maker M-220", "S-1")
        .contains("2026-03-02")
        .contains("20.5 °C, 45 % relative humidity, 1013 hPa")
        .contains("W-20", "20.00002 g", "C-1", "Mass Laboratory", "2026-05-31")
        .contains("Traceable to the SI.")
        .contains("20.0001", "20.0002", "20.0000")
        .contains("±0.0005 g", "0.0003 g")
        .contains("guarded acceptance", "guarded rejection", "α = 5 %")
        .contains("still passes 1 time in 10")
        .contains("Tess Technician", "Mia Manager")
        .contains("not an accredited calibration")
        .contains("End of certificate 2026-00001");
  }

  @Test
  void everyPageSaysWhichItIsOfHowMany() throws IOException {
    String number = certificates().issue(laboratory.manager(), approved());

    try (PDDocument document =
        Loader.loadPDF(certificates().document(laboratory.auditor(), number))) {
      for (int page = 1; page <= document.getNumberOfPages(); page++) {
        PDFTextStripper stripper = new PDFTextStripper();
        stripper.setSortByPosition(true);
        stripper.setStartPage(page);
        stripper.setEndPage(page);
        assertThat(stripper.getText(document))
            .contains("Page " + page + " of " + document.getNumberOfPages())
            .contains(number)
            .contains("CONFORMS");
      }
    }
  }

  @Test
  void whatWasStruckOrCorrectedIsPrinted() throws IOException {
    long run = laboratory.measured("20.0001", "20.0500", "20.0000", "20.0100");
    var bench = laboratory.logbook().bench();
    var readings =
        laboratory
            .logbook()
            .runs()
            .open(laboratory.technician(), run)
            .sheet()
            .checkPoints()
            .get(0)
            .standing();
    bench.correct(laboratory.technician(), run, readings.get(1).id(), "20.0002", "mistyped");
    bench.strike(laboratory.technician(), run, readings.get(3).id(), "door slammed");
    bench.enter(laboratory.technician(), run, TestLaboratory.POINT, "20.0001");
    laboratory.logbook().submissions().submit(laboratory.technician(), run, password(), false);
    laboratory.logbook().signOff().approve(laboratory.manager(), run, password(), "");

    String text =
        text(
            certificates()
                .document(laboratory.auditor(), certificates().issue(laboratory.manager(), run)));

    assertThat(text).contains("Reading 2: 20.0500 was corrected to 20.0002").contains("mistyped");
    assertThat(text).contains("Reading 4, 20.0100, was struck").contains("door slammed");
  }

  @Test
  void aRunIsCertifiedOnceAndOnlyWhenApproved() {
    long submitted = laboratory.submitted();
    assertThatThrownBy(() -> certificates().issue(laboratory.manager(), submitted))
        .hasMessageContaining("certificate-not-approved");

    laboratory.logbook().signOff().approve(laboratory.manager(), submitted, password(), "");
    certificates().issue(laboratory.manager(), submitted);
    assertThatThrownBy(() -> certificates().issue(laboratory.manager(), submitted))
        .hasMessageContaining("certificate-already-issued");
    assertThatThrownBy(() -> certificates().issue(laboratory.technician(), submitted))
        .hasMessageContaining("not-allowed");
  }

  @Test
  void aRecordThatWasNotPrintedIsPrintedLater() {
    Flaky press = new Flaky();
    try (TestLaboratory broken = new TestLaboratory(press, DecimalSign.POINT)) {
      long run = broken.submitted();
      broken.logbook().signOff().approve(broken.manager(), run, password(), "");

      assertThatThrownBy(() -> broken.logbook().certificates().issue(broken.manager(), run))
          .isInstanceOf(IllegalStateException.class);
      press.works = true;
      assertThat(broken.logbook().certificates().printNext()).contains("2026-00001");
      assertThat(broken.logbook().certificates().printNext()).isEmpty();
      assertThat(broken.logbook().certificates().document(broken.auditor(), "2026-00001"))
          .containsExactly(1, 2, 3);
    }
  }

  /** A press that jams until it is mended. */
  private static final class Flaky implements CertificatePress {
    private boolean works;

    @Override
    public String templateSha256() {
      return "0".repeat(64);
    }

    @Override
    public byte[] print(CertificateRecord certificate) {
      if (!works) {
        throw new IllegalStateException("out of paper");
      }
      return new byte[] {1, 2, 3};
    }
  }

  @Test
  void theRecordHoldsEverythingAndReadsBackTheSame() {
    String number = certificates().issue(laboratory.manager(), approved());

    CertificateRecord record = certificates().record(laboratory.auditor(), number);
    CertificateData data = LastingJson.read(record.data(), CertificateData.class);
    assertThat(LastingJson.write(data)).isEqualTo(record.data());
    assertThat(data.sheet().findings().verdict()).isPresent();
    assertThat(data.sheet().contentSha256()).isEqualTo(data.signatures().get(0).contentSha256());
  }
}
