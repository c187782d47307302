package org.evenbeam.ui.runsheet;

import java.time.LocalDate;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.Consumer;
import java.util.function.Supplier;
import javafx.beans.property.BooleanProperty;
import javafx.beans.property.ObjectProperty;
import javafx.beans.property.SimpleBooleanProperty;
import javafx.beans.property.SimpleObjectProperty;
import javafx.beans.property.SimpleStringProperty;
import javafx.beans.property.StringProperty;
import javafx.collections.FXCollections;
import javafx.collections.ObservableList;
import org.evenbeam.logbook.Session;
import org.evenbeam.logbook.open.OpenLogbook;
import org.evenbeam.logbook.run.Scratch;
import org.evenbeam.logbook.run.SheetCheckPoint;
import org.evenbeam.metrology.NumberRefused;
import org.evenbeam.metrology.TypedDecimal;
import org.evenbeam.ui.common.Background;
import org.evenbeam.ui.common.ScreenTexts;
import org.evenbeam.verification.CheckRisk;
import org.evenbeam.verification.RunFindings;
import org.evenbeam.wording.UnitSymbols;

/** One run: what is typed, what has been entered, and what it shows. */
public final class RunSheetViewModel {
  /** A reading taken at the screen and not yet known to be kept. */
  private record Pending(String checkPoint, String text) {}

  private final OpenLogbook logbook;
  private final Session session;
  private final Background background;
  private final ScreenTexts texts;
  private final SheetWords words;
  private final ScratchKeeper scratch;
  private final long run;

  private final ObjectProperty<SheetState> state = new SimpleObjectProperty<>();
  private final StringProperty selected = new SimpleStringProperty("");
  private final StringProperty typed = new SimpleStringProperty("");
  private final StringProperty problem = new SimpleStringProperty("");
  private final StringProperty kept = new SimpleStringProperty("");
  private final BooleanProperty readOnly = new SimpleBooleanProperty(true);
  private final ObjectProperty<PointPicture> picture = new SimpleObjectProperty<>();
  private final ObservableList<PointTab> tabs = FXCollections.observableArrayList();
  private final ObservableList<ReadingLine> lines = FXCollections.observableArrayList();
  private final ObservableList<String> findings = FXCollections.observableArrayList();
  private final ObservableList<String> notes = FXCollections.observableArrayList();
  private final ObservableList<String> risks = FXCollections.observableArrayList();
  private final List<Pending> pending = new ArrayList<>();
  private final Map<String, String> typedElsewhere = new HashMap<>();
  private final ConditionsViewModel conditions;
  private boolean selecting;

  /** The sheet of that run; empty until {@link #load()}. */
  public RunSheetViewModel(
      OpenLogbook logbook, Session session, Background background, ScreenTexts texts, long run) {
    this.logbook = logbook;
    this.session = session;
    this.background = background;
    this.texts = texts;
    this.words = new SheetWords(texts);
    this.run = run;
    this.scratch =
        new ScratchKeeper(
            background,
            (point, text) -> logbook.bench().keepScratch(session, run, point, text),
            this::fail);
    this.conditions =
        new ConditionsViewModel(
            texts,
            recorded ->
                change(
                    () -> logbook.bench().recordConditions(session, run, recorded),
                    () -> {},
                    problem::set));
    typed.addListener((typing, before, now) -> typedChanged(now));
  }

  /** Reads the sheet and takes up what was being typed when it was left. */
  public void load() {
    background.run(
        this::read,
        read -> {
          read.open().scratches().forEach(this::takeUp);
          show(read);
        },
        this::fail);
  }

  private void takeUp(Scratch left) {
    typedElsewhere.put(left.checkPoint(), left.text());
    kept.set(texts.text("sheet.taken-up", texts.time(left.at())));
  }

  /** Makes another check point the one to measure; what is typed stays with its own. */
  public void select(String checkPoint) {
    typedElsewhere.put(selected.get(), typed.get());
    selected.set(checkPoint);
    showSelected();
  }

  private void showSelected() {
    selecting = true;
    typed.set(typedElsewhere.getOrDefault(selected.get(), ""));
    selecting = false;
    refresh();
    assessRisk();
  }

  /** Takes what is typed as a reading; with nothing typed, goes to the next check point. */
  public void enter() {
    String text = typed.get().strip();
    if (readOnly.get()) {
      return;
    }
    if (text.isEmpty()) {
      goOn();
      return;
    }
    if (refuses(text)) {
      return;
    }
    problem.set("");
    Pending taken = new Pending(selected.get(), text);
    pending.add(taken);
    scratch.forget(taken.checkPoint());
    clearTyped();
    background.run(
        () -> {
          logbook.bench().enter(session, run, taken.checkPoint(), text);
          return read();
        },
        read -> {
          pending.remove(taken);
          show(read);
          saidKept();
        },
        thrown -> giveBack(taken, thrown));
  }

  private boolean refuses(String text) {
    try {
      TypedDecimal.parse(text, texts.sign());
    } catch (NumberRefused why) {
      problem.set(texts.problem("reading-refused", why.reason(), why.text()));
      return true;
    }
    SheetCheckPoint point = point();
    long onTheirWay = pending.stream().filter(p -> p.checkPoint().equals(selected.get())).count();
    if (point.toGo() <= onTheirWay) {
      problem.set(
          texts.problem(
              "run-all-readings-in", point.planned().label(), point.planned().readings()));
      return true;
    }
    return false;
  }

  /** A reading that could not be kept goes back into its field, so that nothing typed is lost. */
  private void giveBack(Pending taken, Throwable thrown) {
    pending.remove(taken);
    if (taken.checkPoint().equals(selected.get()) && typed.get().isEmpty()) {
      typed.set(taken.text());
    } else {
      typedElsewhere.putIfAbsent(taken.checkPoint(), taken.text());
    }
    fail(thrown);
    refresh();
  }

  private void goOn() {
    List<PointTab> open = tabs.stream().filter(tab -> tab.counting() < tab.planned()).toList();
    int here = labels().indexOf(selected.get());
    open.stream()
        .filter(tab -> labels().indexOf(tab.label()) > here)
        .findFirst()
        .or(() -> open.stream().findFirst())
        .ifPresent(tab -> select(tab.label()));
  }

  private List<String> labels() {
    return tabs.stream().map(PointTab::label).toList();
  }

  /** Enters a pasted column, all of it or nothing. */
  public void paste(String column) {
    if (readOnly.get()) {
      return;
    }
    String checkPoint = selected.get();
    List<String> cells = column.lines().toList();
    change(
        () -> logbook.bench().enterColumn(session, run, checkPoint, cells), () -> {}, problem::set);
  }

  /** Puts another reading in the place of one that was entered wrongly. */
  public void correct(
      ReadingLine line, String text, String reason, Runnable done, Consumer<String> refused) {
    change(() -> logbook.bench().correct(session, run, line.id(), text, reason), done, refused);
  }

  /** Strikes a reading for a cause seen at the bench. */
  public void strike(ReadingLine line, String cause, Runnable done, Consumer<String> refused) {
    Runnable strike = () -> logbook.bench().strike(session, run, line.id(), cause);
    change(strike, done, refused);
  }

  /** Submits the run; without a verdict only where that was asked for. */
  public void submit(
      String password, boolean withoutVerdict, Runnable done, Consumer<String> refused) {
    change(
        () -> logbook.submissions().submit(session, run, password.toCharArray(), withoutVerdict),
        done,
        refused);
  }

  /** Gives the run up. */
  public void abandon(String reason, Runnable done, Consumer<String> refused) {
    change(() -> logbook.runs().abandon(session, run, reason), done, refused);
  }

  private void change(Runnable work, Runnable done, Consumer<String> refused) {
    problem.set("");
    Supplier<SheetState> changeAndRead =
        () -> {
          work.run();
          return read();
        };
    background.run(
        changeAndRead,
        read -> {
          show(read);
          saidKept();
          done.run();
        },
        thrown -> refused.accept(texts.problem(thrown)));
  }

  private SheetState read() {
    return SheetState.read(logbook, session, run);
  }

  private void show(SheetState read) {
    boolean first = selected.get().isEmpty();
    List<PointTab> readTabs =
        read.sheet().checkPoints().stream().map(RunSheetViewModel::tab).toList();
    if (first) {
      selected.set(firstToDo(readTabs));
    }
    state.set(read);
    readOnly.set(!read.isOpenTo(session));
    conditions.show(read.sheet().conditions());
    tabs.setAll(readTabs);
    if (first) {
      showSelected();
    } else {
      refresh();
    }
  }

  private static String firstToDo(List<PointTab> tabs) {
    return tabs.stream()
        .filter(tab -> tab.counting() < tab.planned())
        .findFirst()
        .orElse(tabs.get(0))
        .label();
  }

  private static PointTab tab(SheetCheckPoint point) {
    return new PointTab(
        point.planned().label(),
        point.counting().size(),
        point.planned().readings(),
        point.findings().flatMap(found -> found.verdict()));
  }

  private void refresh() {
    SheetCheckPoint point = point();
    List<ReadingLine> shown = new ArrayList<>(words.lines(point));
    int position = point.readings().stream().mapToInt(r -> r.position()).max().orElse(0);
    for (Pending taken : pending) {
      if (taken.checkPoint().equals(selected.get())) {
        position++;
        shown.add(new ReadingLine(0, position, taken.text(), "", ReadingLine.State.ON_ITS_WAY, ""));
      }
    }
    lines.setAll(shown);
    findings.setAll(words.findings(point, state.get().unit()));
    notes.setAll(words.notes(point, runFindings(), state.get().unit()));
    draw();
  }

  private void draw() {
    picture.set(PointPicture.of(point(), typed.get(), texts.sign()));
  }

  private void assessRisk() {
    SheetCheckPoint point = point();
    OptionalDouble s =
        point.findings().map(f -> f.standardDeviation()).orElse(OptionalDouble.empty());
    risks.clear();
    background.compute(
        () -> CheckRisk.of(point.question(), point.planned().readings(), s),
        risk -> {
          if (point.planned().label().equals(selected.get())) {
            risks.setAll(risk.map(this::said).orElse(List.of()));
          }
        },
        this::fail);
  }

  private List<String> said(CheckRisk risk) {
    return texts.sentences().couldHaveMissed(risk, UnitSymbols.of(state.get().unit()));
  }

  private void typedChanged(String now) {
    if (selecting || readOnly.get()) {
      return;
    }
    problem.set("");
    scratch.keep(selected.get(), now);
    draw();
  }

  private void clearTyped() {
    selecting = true;
    typed.set("");
    selecting = false;
    refresh();
  }

  private void saidKept() {
    kept.set(texts.text("sheet.kept", texts.time(session.now())));
  }

  private void fail(Throwable thrown) {
    problem.set(texts.problem(thrown));
  }

  /** The check point being measured. */
  public SheetCheckPoint point() {
    return state.get().sheet().checkPoint(selected.get()).orElseThrow();
  }

  /** What the whole run shows. */
  public RunFindings runFindings() {
    return state.get().sheet().findings();
  }

  /** The day on which the instrument's next verification was due, where that is past. */
  public Optional<LocalDate> pastDue() {
    return state.get().instrument().nextDue().filter(day -> day.isBefore(session.today()));
  }

  /** Whether the run has a verdict now. */
  public boolean hasVerdict() {
    return Optional.ofNullable(state.get()).flatMap(s -> runFindings().verdict()).isPresent();
  }

  /** The run as read last; null before the first reading of it. */
  public ObjectProperty<SheetState> state() {
    return state;
  }

  /** The label of the check point being measured. */
  public StringProperty selected() {
    return selected;
  }

  /** What is being typed. */
  public StringProperty typed() {
    return typed;
  }

  /** What went wrong; empty for nothing. */
  public StringProperty problem() {
    return problem;
  }

  /** When something was kept last. */
  public StringProperty kept() {
    return kept;
  }

  /** Whether this person may not enter anything here. */
  public BooleanProperty readOnly() {
    return readOnly;
  }

  /** What the pictures show. */
  public ObjectProperty<PointPicture> picture() {
    return picture;
  }

  /** The check points. */
  public ObservableList<PointTab> tabs() {
    return tabs;
  }

  /** The readings of the check point. */
  public ObservableList<ReadingLine> lines() {
    return lines;
  }

  /** What was found, in sentences. */
  public ObservableList<String> findings() {
    return findings;
  }

  /** What must be known beside it. */
  public ObservableList<String> notes() {
    return notes;
  }

  /** What the check could miss. */
  public ObservableList<String> risks() {
    return risks;
  }

  /** The conditions of the room. */
  public ConditionsViewModel conditions() {
    return conditions;
  }
}
