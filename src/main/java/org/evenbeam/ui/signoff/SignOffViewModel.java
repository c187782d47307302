package org.evenbeam.ui.signoff;

import java.util.List;
import java.util.Optional;
import java.util.function.Consumer;
import java.util.function.Supplier;
import javafx.beans.property.ObjectProperty;
import javafx.beans.property.SimpleObjectProperty;
import javafx.beans.property.SimpleStringProperty;
import javafx.beans.property.StringProperty;
import javafx.collections.FXCollections;
import javafx.collections.ObservableList;
import org.evenbeam.logbook.LogbookException;
import org.evenbeam.logbook.Session;
import org.evenbeam.logbook.UseCase;
import org.evenbeam.logbook.open.OpenLogbook;
import org.evenbeam.logbook.run.RunSummary;
import org.evenbeam.ui.common.Background;
import org.evenbeam.ui.common.ScreenTexts;
import org.evenbeam.verification.Verdict;

/** The runs that wait for a manager, and the manager's answer to one. */
public final class SignOffViewModel {
  private record Answered(List<RunSummary> queue, Optional<String> certificate, String problem) {}

  private final OpenLogbook logbook;
  private final Session session;
  private final Background background;
  private final ScreenTexts texts;
  private final ObservableList<RunSummary> queue = FXCollections.observableArrayList();
  private final ObjectProperty<RunSummary> chosen = new SimpleObjectProperty<>();
  private final StringProperty problem = new SimpleStringProperty("");
  private final StringProperty said = new SimpleStringProperty("");
  private final StringProperty certificate = new SimpleStringProperty("");

  /** The queue as that person sees it. */
  public SignOffViewModel(
      OpenLogbook logbook, Session session, Background background, ScreenTexts texts) {
    this.logbook = logbook;
    this.session = session;
    this.background = background;
    this.texts = texts;
  }

  /** Reads the queue anew. */
  public void load() {
    background.run(() -> logbook.signOff().queue(session), this::show, this::fail);
  }

  private void show(List<RunSummary> read) {
    queue.setAll(read);
    chosen.set(read.isEmpty() ? null : read.get(0));
  }

  /** Whether the chosen run can only be approved with a reason. */
  public boolean needsReason() {
    return !chosen.get().verdict().equals(Optional.of(Verdict.CONFORMS));
  }

  /** Whether this person may answer the chosen run. */
  public boolean mayAnswer() {
    return chosen.get() != null && UseCase.APPROVE_RUN.allows(session.person().role());
  }

  /** Approves the chosen run and issues its certificate. */
  public void approve(String password, String reason, Runnable done, Consumer<String> refused) {
    long run = chosen.get().number();
    Supplier<Answered> work =
        () -> {
          logbook.signOff().approve(session, run, password.toCharArray(), reason);
          return issued(run);
        };
    answer(work, done, refused, texts.text("sign-off.approved", Long.toString(run)));
  }

  /** The approval stands even where the certificate cannot be made; that is said beside it. */
  private Answered issued(long run) {
    Optional<String> number = Optional.empty();
    String failed = "";
    try {
      number = Optional.of(logbook.certificates().issue(session, run));
    } catch (LogbookException notIssued) {
      failed = texts.problem(notIssued);
    }
    return new Answered(logbook.signOff().queue(session), number, failed);
  }

  /** Returns the chosen run to its technician. */
  public void giveBack(String password, String reason, Runnable done, Consumer<String> refused) {
    long run = chosen.get().number();
    Supplier<Answered> work =
        () -> {
          logbook.signOff().giveBack(session, run, password.toCharArray(), reason);
          return new Answered(logbook.signOff().queue(session), Optional.empty(), "");
        };
    answer(work, done, refused, texts.text("sign-off.returned", Long.toString(run)));
  }

  private void answer(
      Supplier<Answered> work, Runnable done, Consumer<String> refused, String words) {
    background.run(
        work,
        answered -> {
          problem.set(answered.problem());
          certificate.set(answered.certificate().orElse(""));
          said.set(
              answered
                  .certificate()
                  .map(number -> words + " " + texts.text("sign-off.issued", number))
                  .orElse(words));
          show(answered.queue());
          done.run();
        },
        thrown -> refused.accept(texts.problem(thrown)));
  }

  private void fail(Throwable thrown) {
    problem.set(texts.problem(thrown));
  }

  /** The runs that wait, oldest first. */
  public ObservableList<RunSummary> queue() {
    return queue;
  }

  /** The run looked at; null for none. */
  public ObjectProperty<RunSummary> chosen() {
    return chosen;
  }

  /** What went wrong; empty for nothing. */
  public StringProperty problem() {
    return problem;
  }

  /** What was done last, in words. */
  public StringProperty said() {
    return said;
  }

  /** The number of the certificate issued last; empty for none. */
  public StringProperty certificate() {
    return certificate;
  }
}
