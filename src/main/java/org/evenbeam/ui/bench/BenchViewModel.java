package org.evenbeam.ui.bench;

import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.function.Consumer;
import java.util.function.Supplier;
import java.util.stream.Stream;
import javafx.beans.property.ObjectProperty;
import javafx.beans.property.SimpleObjectProperty;
import javafx.beans.property.SimpleStringProperty;
import javafx.beans.property.StringProperty;
import javafx.collections.FXCollections;
import javafx.collections.ObservableList;
import org.evenbeam.logbook.Session;
import org.evenbeam.logbook.UseCase;
import org.evenbeam.logbook.instruments.Instrument;
import org.evenbeam.logbook.instruments.InstrumentEvent;
import org.evenbeam.logbook.instruments.InstrumentOverview;
import org.evenbeam.logbook.open.OpenLogbook;
import org.evenbeam.logbook.run.NewRun;
import org.evenbeam.logbook.run.RunKind;
import org.evenbeam.logbook.run.RunState;
import org.evenbeam.logbook.run.RunSummary;
import org.evenbeam.ui.common.Background;
import org.evenbeam.ui.common.ScreenTexts;
import org.evenbeam.verification.plan.PlanRevision;

/** What this person can go on with, the instruments, and what can be started on one. */
public final class BenchViewModel {
  private record Read(List<RunSummary> mine, List<InstrumentOverview> instruments) {}

  private final OpenLogbook logbook;
  private final Session session;
  private final Background background;
  private final ScreenTexts texts;
  private final Consumer<Long> openRun;
  private final ObservableList<RunSummary> mine = FXCollections.observableArrayList();
  private final ObservableList<InstrumentOverview> all = FXCollections.observableArrayList();
  private final ObservableList<InstrumentOverview> shown = FXCollections.observableArrayList();
  private final StringProperty filter = new SimpleStringProperty("");
  private final StringProperty problem = new SimpleStringProperty("");
  private final ObjectProperty<InstrumentOverview> chosen = new SimpleObjectProperty<>();
  private final ObjectProperty<RunStarts> starts = new SimpleObjectProperty<>();

  /**
   * The bench of that person.
   *
   * @param openRun takes the number of the run to go on with
   */
  public BenchViewModel(
      OpenLogbook logbook,
      Session session,
      Background background,
      ScreenTexts texts,
      Consumer<Long> openRun) {
    this.logbook = logbook;
    this.session = session;
    this.background = background;
    this.texts = texts;
    this.openRun = openRun;
    filter.addListener((typed, before, now) -> narrow());
  }

  /** Reads everything anew. */
  public void load() {
    background.run(this::read, this::show, this::fail);
  }

  private Read read() {
    List<RunSummary> runs =
        Stream.of(RunState.RETURNED, RunState.DRAFT)
            .flatMap(state -> logbook.runs().inState(session, state).stream())
            .filter(run -> run.technicianId() == session.person().id())
            .toList();
    return new Read(runs, logbook.instruments().all(session));
  }

  private void show(Read read) {
    mine.setAll(read.mine());
    all.setAll(read.instruments());
    narrow();
    Optional.ofNullable(chosen.get())
        .flatMap(before -> find(before.instrument().tag()))
        .ifPresent(this::choose);
  }

  private Optional<InstrumentOverview> find(String tag) {
    return all.stream().filter(one -> one.instrument().tag().equals(tag)).findFirst();
  }

  private void narrow() {
    String wanted = filter.get().strip().toLowerCase(Locale.ROOT);
    shown.setAll(all.stream().filter(one -> words(one).contains(wanted)).toList());
  }

  private static String words(InstrumentOverview one) {
    Instrument i = one.instrument();
    return String.join(" ", i.tag(), i.kind(), i.location(), i.maker(), i.model())
        .toLowerCase(Locale.ROOT);
  }

  /** Shows what can be started on that instrument. */
  public void choose(InstrumentOverview instrument) {
    problem.set("");
    background.run(
        () -> RunStarts.read(logbook, session, instrument.instrument().tag()),
        read -> {
          chosen.set(instrument);
          starts.set(read);
        },
        this::fail);
  }

  /** Starts a run and opens it. */
  public void start(PlanRevision plan, RunKind kind) {
    NewRun wanted =
        new NewRun(
            chosen.get().instrument().tag(),
            plan.title(),
            kind,
            kind == RunKind.AS_LEFT ? starts.get().asLeftOf() : Optional.empty());
    problem.set("");
    background.run(() -> logbook.runs().start(session, wanted), openRun, this::fail);
  }

  /** Opens a draft, or takes a returned run up again and opens it. */
  public void goOn(RunSummary run) {
    Supplier<Long> takenUp =
        () -> {
          if (run.state() == RunState.RETURNED) {
            logbook.runs().takeUp(session, run.number());
          }
          return run.number();
        };
    problem.set("");
    background.run(takenUp, openRun, this::fail);
  }

  /** Records what happened to the chosen instrument. */
  public void record(
      InstrumentEvent.Kind kind, String text, Runnable done, Consumer<String> refused) {
    change(tag -> logbook.instruments().record(session, tag, kind, text), done, refused);
  }

  /** Takes the chosen instrument out of service. */
  public void stop(String why, Runnable done, Consumer<String> refused) {
    change(tag -> logbook.instruments().stop(session, tag, why), done, refused);
  }

  /** Puts the chosen instrument back into service. */
  public void release(String why, String restriction, Runnable done, Consumer<String> refused) {
    Optional<String> restricted = Optional.of(restriction.strip()).filter(text -> !text.isEmpty());
    change(tag -> logbook.instruments().release(session, tag, why, restricted), done, refused);
  }

  private void change(Consumer<String> work, Runnable done, Consumer<String> refused) {
    String tag = chosen.get().instrument().tag();
    background.run(
        () -> {
          work.accept(tag);
          return read();
        },
        read -> {
          show(read);
          done.run();
        },
        thrown -> refused.accept(texts.problem(thrown)));
  }

  private void fail(Throwable thrown) {
    problem.set(texts.problem(thrown));
  }

  /** Whether this person's role includes that use case. */
  public boolean may(UseCase useCase) {
    return useCase.allows(session.person().role());
  }

  /** Whether the instrument's next verification is past due today. */
  public boolean isPastDue(InstrumentOverview instrument) {
    return instrument.nextDue().filter(due -> due.isBefore(session.today())).isPresent();
  }

  /** This person's returned runs and drafts. */
  public ObservableList<RunSummary> mine() {
    return mine;
  }

  /** The instruments that go with the filter. */
  public ObservableList<InstrumentOverview> instruments() {
    return shown;
  }

  /** What the instruments are narrowed to. */
  public StringProperty filter() {
    return filter;
  }

  /** What went wrong; empty for nothing. */
  public StringProperty problem() {
    return problem;
  }

  /** The instrument chosen; null for none yet. */
  public ObjectProperty<InstrumentOverview> chosen() {
    return chosen;
  }

  /** What can be started on it; null before an instrument is chosen. */
  public ObjectProperty<RunStarts> starts() {
    return starts;
  }
}
