package org.evenbeam.ui.shell;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalLong;
import javafx.application.Platform;
import javafx.event.EventTarget;
import javafx.scene.Node;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyEvent;
import javafx.scene.layout.BorderPane;
import javafx.scene.layout.Region;
import org.evenbeam.logbook.Session;
import org.evenbeam.logbook.UseCase;
import org.evenbeam.logbook.open.OpenLogbook;
import org.evenbeam.ui.bench.BenchPane;
import org.evenbeam.ui.bench.BenchViewModel;
import org.evenbeam.ui.certificates.CertificatesPane;
import org.evenbeam.ui.certificates.CertificatesViewModel;
import org.evenbeam.ui.common.ScreenTexts;
import org.evenbeam.ui.runsheet.RunSheetPane;
import org.evenbeam.ui.runsheet.RunSheetViewModel;
import org.evenbeam.ui.signoff.SignOffPane;
import org.evenbeam.ui.signoff.SignOffViewModel;
import org.evenbeam.ui.trail.TrailPane;
import org.evenbeam.ui.trail.TrailViewModel;

/** The screens of one person's session, and the way from one to another. */
final class Screens extends BorderPane {
  private final OpenLogbook logbook;
  private final Session session;
  private final ScreenTexts texts;
  private final Surroundings surroundings;
  private final Region foot;
  private Navigation navigation;
  private OptionalLong openRun = OptionalLong.empty();

  Screens(
      OpenLogbook logbook,
      Session session,
      ScreenTexts texts,
      Surroundings surroundings,
      Region foot) {
    this.logbook = logbook;
    this.session = session;
    this.texts = texts;
    this.surroundings = surroundings;
    this.foot = foot;
    buildNavigation();
    addEventFilter(KeyEvent.KEY_PRESSED, this::passOn);
  }

  /** Ctrl+Enter is meant for the screen also while the navigation has the focus. */
  private void passOn(KeyEvent event) {
    boolean signs = event.isShortcutDown() && event.getCode() == KeyCode.ENTER;
    if (signs && isInNavigation(event.getTarget())) {
      getCenter().fireEvent(event.copyFor(getCenter(), getCenter()));
      event.consume();
    }
  }

  private boolean isInNavigation(EventTarget target) {
    Node node = target instanceof Node found ? found : null;
    while (node != null && node != navigation) {
      node = node.getParent();
    }
    return node != null;
  }

  /** Begins where this person's work is. */
  void start() {
    if (may(UseCase.START_RUN) && !may(UseCase.APPROVE_RUN)) {
      bench();
    } else if (may(UseCase.APPROVE_RUN)) {
      signOff();
    } else {
      certificates();
    }
  }

  /** Goes the way of that digit. */
  void go(int digit) {
    navigation.go(digit);
  }

  private void buildNavigation() {
    List<Navigation.Way> ways = new ArrayList<>();
    ways.add(new Navigation.Way("bench", this::bench));
    openRun.ifPresent(run -> ways.add(new Navigation.Way("run-sheet", () -> sheet(run))));
    ways.add(new Navigation.Way("sign-off", this::signOff));
    ways.add(new Navigation.Way("certificates", this::certificates));
    ways.add(new Navigation.Way("trail", this::trail));
    navigation = new Navigation(texts, ways, foot);
    setLeft(navigation);
  }

  private boolean may(UseCase useCase) {
    return useCase.allows(session.person().role());
  }

  private void bench() {
    BenchViewModel model =
        new BenchViewModel(logbook, session, surroundings.background(), texts, this::openSheet);
    BenchPane pane = new BenchPane(model, texts);
    show("bench", pane, pane::start);
    model.load();
  }

  private void openSheet(long run) {
    openRun = OptionalLong.of(run);
    buildNavigation();
    sheet(run);
  }

  private void sheet(long run) {
    RunSheetViewModel model =
        new RunSheetViewModel(logbook, session, surroundings.background(), texts, run);
    RunSheetPane pane = new RunSheetPane(model, texts, this::sheetLeft);
    model.state().addListener((state, before, now) -> startOnce(before == null, pane));
    show("run-sheet", pane, pane::start);
    model.load();
  }

  private static void startOnce(boolean first, RunSheetPane pane) {
    if (first) {
      Platform.runLater(pane::start);
    }
  }

  private void sheetLeft() {
    openRun = OptionalLong.empty();
    buildNavigation();
    bench();
  }

  private void signOff() {
    SignOffViewModel model =
        new SignOffViewModel(logbook, session, surroundings.background(), texts);
    SignOffPane pane = new SignOffPane(model, texts, this::readOnlySheet, this::openCertificate);
    show("sign-off", pane, pane::start);
    model.load();
  }

  private Node readOnlySheet(long run) {
    RunSheetViewModel model =
        new RunSheetViewModel(logbook, session, surroundings.background(), texts, run);
    RunSheetPane pane = new RunSheetPane(model, texts, () -> {});
    model.load();
    return pane;
  }

  private CertificatesViewModel certificates() {
    CertificatesViewModel model =
        new CertificatesViewModel(
            logbook, session, surroundings.background(), texts, surroundings.viewer());
    CertificatesPane pane = new CertificatesPane(model, texts);
    show("certificates", pane, pane::start);
    model.load();
    return model;
  }

  private void openCertificate(String number) {
    CertificatesViewModel model = certificates();
    model.filter().set(number);
    model.open(number);
  }

  private void trail() {
    TrailViewModel model = new TrailViewModel(logbook, session, surroundings.background(), texts);
    TrailPane pane = new TrailPane(model, texts);
    show("trail", pane, pane::start);
    model.load();
  }

  private void show(String key, Node pane, Runnable start) {
    navigation.mark(key);
    setCenter(pane);
    start.run();
  }
}
