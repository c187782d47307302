package org.evenbeam.app;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Clock;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import org.evenbeam.cli.Demonstration;
import org.evenbeam.logbook.Session;
import org.evenbeam.logbook.certificates.CertificateFacts;
import org.evenbeam.logbook.certificates.CertificatePress;
import org.evenbeam.logbook.certificates.Certificates;
import org.evenbeam.logbook.laboratory.Laboratory;
import org.evenbeam.logbook.open.OpenLogbook;

/** The demonstration laboratory, with a window or without. */
final class DemonstrationLaboratory implements Demonstration {
  /**
   * Who keeps the demonstration laboratory; its password stands in demo-data, for everyone to read.
   */
  private static final String KEEPER = "maren";

  private static final String KEEPERS_PASSWORD = "lowwater";
  private static final int MOST = 10_000;

  private final DemonstrationFolder folder;
  private final CertificatePress press;
  private final boolean fresh;

  DemonstrationLaboratory(Path folder, boolean fresh, CertificatePress press) {
    this.folder = new DemonstrationFolder(folder, press);
    this.press = press;
    this.fresh = fresh;
  }

  @Override
  public boolean hasDisplay() {
    return Display.isThere();
  }

  @Override
  public int openWindow() {
    folder.prepare(fresh);
    return new Window(folder.path(), press, SignInHints.ofDemonstration()).open();
  }

  @Override
  public List<Written> writeCertificates() {
    folder.prepare(fresh);
    try (OpenLaboratory laboratory = OpenLaboratory.in(folder.path(), press, () -> false)) {
      OpenLogbook logbook = laboratory.logbook();
      Session session = signIn(logbook);
      return write(logbook.certificates(), session);
    }
  }

  private List<Written> write(Certificates certificates, Session session) {
    Path target = folder.path().resolve("certificates");
    List<Written> written = new ArrayList<>();
    try {
      Files.createDirectories(target);
      List<CertificateFacts> history = new ArrayList<>(certificates.history(session, MOST));
      Collections.reverse(history);
      for (CertificateFacts facts : history) {
        Path file = target.resolve(facts.number() + ".pdf");
        Files.write(file, certificates.document(session, facts.number()));
        written.add(new Written(facts.number(), facts.instrumentTag(), facts.verdict(), file));
      }
      return written;
    } catch (IOException unwritable) {
      throw new UncheckedIOException(unwritable);
    }
  }

  private static Session signIn(OpenLogbook logbook) {
    Laboratory laboratory = logbook.laboratory().find().orElseThrow();
    return logbook
        .people()
        .signIn(KEEPER, KEEPERS_PASSWORD.toCharArray(), laboratory.zone(), Clock.systemUTC());
  }
}
