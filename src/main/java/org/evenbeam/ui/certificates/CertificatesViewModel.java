package org.evenbeam.ui.certificates;

import java.io.UncheckedIOException;
import java.nio.file.Path;
import java.util.List;
import java.util.Locale;
import javafx.beans.property.SimpleStringProperty;
import javafx.beans.property.StringProperty;
import javafx.collections.FXCollections;
import javafx.collections.ObservableList;
import org.evenbeam.logbook.Session;
import org.evenbeam.logbook.certificates.CertificateFacts;
import org.evenbeam.logbook.open.OpenLogbook;
import org.evenbeam.ui.common.Background;
import org.evenbeam.ui.common.DocumentViewer;
import org.evenbeam.ui.common.ScreenTexts;

/** The certificates, newest first, narrowed as one types. */
public final class CertificatesViewModel {
  private static final int MOST = 1000;

  private record Shown(Path file, boolean viewed) {}

  private final OpenLogbook logbook;
  private final Session session;
  private final Background background;
  private final ScreenTexts texts;
  private final DocumentViewer viewer;
  private final ObservableList<CertificateFacts> all = FXCollections.observableArrayList();
  private final ObservableList<CertificateFacts> shown = FXCollections.observableArrayList();
  private final StringProperty filter = new SimpleStringProperty("");
  private final StringProperty problem = new SimpleStringProperty("");
  private final StringProperty said = new SimpleStringProperty("");

  /** The certificates as that person sees them. */
  public CertificatesViewModel(
      OpenLogbook logbook,
      Session session,
      Background background,
      ScreenTexts texts,
      DocumentViewer viewer) {
    this.logbook = logbook;
    this.session = session;
    this.background = background;
    this.texts = texts;
    this.viewer = viewer;
    filter.addListener((typed, before, now) -> narrow());
  }

  /** Reads the history anew. */
  public void load() {
    background.run(() -> logbook.certificates().history(session, MOST), this::show, this::fail);
  }

  private void show(List<CertificateFacts> history) {
    all.setAll(history);
    narrow();
  }

  private void narrow() {
    String wanted = filter.get().strip().toLowerCase(Locale.ROOT);
    shown.setAll(all.stream().filter(one -> words(one).contains(wanted)).toList());
  }

  private String words(CertificateFacts one) {
    return String.join(
            " ",
            one.number(),
            one.instrumentTag(),
            one.performed().toString(),
            one.approvedBy(),
            texts.sentences().verdict(one.verdict()))
        .toLowerCase(Locale.ROOT);
  }

  /** Shows a certificate in the machine's viewer, or says where its file is. */
  public void open(String number) {
    clear();
    background.run(
        () -> {
          Path file =
              DocumentFiles.temporary(number, logbook.certificates().document(session, number));
          return new Shown(file, viewer.show(file));
        },
        result -> {
          if (!result.viewed()) {
            problem.set(
                texts.problem("certificate-viewer-missing", number, result.file().toString()));
          }
        },
        this::fail);
  }

  /** Writes a certificate where the person wants it. */
  public void saveAs(String number, Path file) {
    clear();
    background.run(
        () -> DocumentFiles.write(file, logbook.certificates().document(session, number)),
        written -> said.set(texts.text("certificates.saved", number, written.toString())),
        thrown -> notWritten(number, file, thrown));
  }

  private void notWritten(String number, Path file, Throwable thrown) {
    if (thrown instanceof UncheckedIOException unwritable) {
      problem.set(
          texts.problem(
              "certificate-not-written",
              number,
              file.toString(),
              unwritable.getCause().toString()));
    } else {
      fail(thrown);
    }
  }

  private void clear() {
    problem.set("");
    said.set("");
  }

  private void fail(Throwable thrown) {
    problem.set(texts.problem(thrown));
  }

  /** The certificates that go with the filter. */
  public ObservableList<CertificateFacts> certificates() {
    return shown;
  }

  /** What they are narrowed to. */
  public StringProperty filter() {
    return filter;
  }

  /** What went wrong; empty for nothing. */
  public StringProperty problem() {
    return problem;
  }

  /** What was done, in words. */
  public StringProperty said() {
    return said;
  }
}
