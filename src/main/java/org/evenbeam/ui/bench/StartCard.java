package org.evenbeam.ui.bench;

import java.util.ArrayList;
import java.util.List;
import javafx.scene.control.Button;
import javafx.scene.control.RadioButton;
import javafx.scene.control.Toggle;
import javafx.scene.control.ToggleGroup;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyEvent;
import javafx.scene.layout.FlowPane;
import javafx.scene.layout.Region;
import javafx.scene.layout.VBox;
import org.evenbeam.logbook.UseCase;
import org.evenbeam.logbook.instruments.InstrumentEvent;
import org.evenbeam.logbook.instruments.InstrumentOverview;
import org.evenbeam.logbook.instruments.InstrumentStatus;
import org.evenbeam.logbook.run.RunKind;
import org.evenbeam.ui.common.AskPane;
import org.evenbeam.ui.common.Panes;
import org.evenbeam.ui.common.ScreenTexts;
import org.evenbeam.ui.common.StatusPill;
import org.evenbeam.verification.plan.PlanRevision;

/** The chosen instrument: which plan, which kind of run, and what else can be recorded. */
final class StartCard extends VBox {
  private static final List<InstrumentEvent.Kind> RECORDED =
      List.of(
          InstrumentEvent.Kind.ADJUSTMENT,
          InstrumentEvent.Kind.MAINTENANCE,
          InstrumentEvent.Kind.REPAIR,
          InstrumentEvent.Kind.DAMAGE,
          InstrumentEvent.Kind.MOVE,
          InstrumentEvent.Kind.FIRMWARE_CHANGE);

  private final BenchViewModel model;
  private final ScreenTexts texts;
  private final java.util.function.Supplier<AskPane> ask;
  private final ToggleGroup plan = new ToggleGroup();
  private final ToggleGroup kind = new ToggleGroup();

  StartCard(BenchViewModel model, ScreenTexts texts, java.util.function.Supplier<AskPane> ask) {
    super(12);
    this.model = model;
    this.texts = texts;
    this.ask = ask;
    getStyleClass().add("card");
    model.starts().addListener((starts, before, now) -> show(now));
    getChildren().add(hint());
    addEventFilter(
        KeyEvent.KEY_PRESSED,
        event -> {
          if (event.getCode() == KeyCode.ENTER && event.getTarget() instanceof RadioButton) {
            start();
            event.consume();
          }
        });
  }

  private Region hint() {
    javafx.scene.control.Label hint = Panes.label(texts.text("bench.choose"), "quiet");
    hint.setWrapText(true);
    return hint;
  }

  private void show(RunStarts starts) {
    InstrumentOverview chosen = model.chosen().get();
    plan.getToggles().clear();
    kind.getToggles().clear();
    javafx.scene.control.Label text = Panes.label(facts(chosen), "quiet", "small");
    text.setWrapText(true);
    getChildren()
        .setAll(
            Panes.label(chosen.instrument().tag(), "title"),
            StatusPill.of(chosen.status(), texts),
            text);
    if (starts.plans().isEmpty()) {
      getChildren().add(Panes.label(texts.text("bench.no-plan"), "quiet"));
    } else if (model.may(UseCase.START_RUN)) {
      getChildren().addAll(choices(starts));
    }
    if (model.may(UseCase.RECORD_INSTRUMENT_EVENT)) {
      getChildren().add(events(chosen));
    }
    kind.getToggles().stream().findFirst().ifPresent(first -> ((RadioButton) first).requestFocus());
  }

  private String facts(InstrumentOverview chosen) {
    String identity =
        String.join(
            " · ",
            chosen.instrument().maker() + " " + chosen.instrument().model(),
            chosen.instrument().serialNumber(),
            chosen.instrument().location());
    return chosen.statusText().isBlank() ? identity : identity + "\n" + chosen.statusText();
  }

  private List<Region> choices(RunStarts starts) {
    List<Region> parts = new ArrayList<>();
    VBox plans = new VBox(6, Panes.label(texts.text("bench.plan"), "quiet", "small"));
    starts
        .plans()
        .forEach(revision -> plans.getChildren().add(radio(plan, planName(revision), revision)));
    VBox kinds = new VBox(6, Panes.label(texts.text("bench.run-kind"), "quiet", "small"));
    starts
        .kinds()
        .forEach(one -> kinds.getChildren().add(radio(kind, texts.name("run.kind", one), one)));
    Button start = Panes.button(texts.text("bench.start"), this::start, "accent");
    start.setId("start");
    parts.add(plans);
    parts.add(kinds);
    parts.add(start);
    return parts;
  }

  private String planName(PlanRevision revision) {
    return texts.text("run.plan", revision.title(), Integer.toString(revision.revision()));
  }

  private static RadioButton radio(ToggleGroup group, String name, Object value) {
    RadioButton radio = new RadioButton(name);
    radio.setUserData(value);
    radio.setToggleGroup(group);
    radio.setSelected(group.getToggles().size() == 1);
    return radio;
  }

  private void start() {
    Toggle chosenPlan = plan.getSelectedToggle();
    Toggle chosenKind = kind.getSelectedToggle();
    if (chosenPlan != null && chosenKind != null) {
      model.start((PlanRevision) chosenPlan.getUserData(), (RunKind) chosenKind.getUserData());
    }
  }

  private VBox events(InstrumentOverview chosen) {
    FlowPane buttons = new FlowPane(6, 6);
    for (InstrumentEvent.Kind one : RECORDED) {
      buttons
          .getChildren()
          .add(Panes.button(texts.name("event", one), () -> askToRecord(one), "small"));
    }
    VBox events = new VBox(6, Panes.label(texts.text("bench.record"), "quiet", "small"), buttons);
    if (chosen.status() == InstrumentStatus.OUT_OF_SERVICE) {
      if (model.may(UseCase.RELEASE_INSTRUMENT)) {
        events
            .getChildren()
            .add(Panes.button(texts.text("release.do"), this::askToRelease, "small"));
      }
    } else {
      events.getChildren().add(Panes.button(texts.text("stop.do"), this::askToStop, "small"));
    }
    return events;
  }

  private String tag() {
    return model.chosen().get().instrument().tag();
  }

  private void askToRecord(InstrumentEvent.Kind one) {
    AskPane.Question question =
        new AskPane.Question(
            texts.text("record.title", texts.name("event", one), tag()),
            texts.text("record.explanation"),
            List.of(AskPane.Field.text(texts.text("record.what"))),
            texts.text("record.do"));
    ask.get()
        .ask(question, (answers, close) -> model.record(one, answers.get(0), close, this::refused));
  }

  private void askToStop() {
    AskPane.Question question =
        new AskPane.Question(
            texts.text("stop.title", tag()),
            texts.text("stop.explanation"),
            List.of(AskPane.Field.text(texts.text("reason"))),
            texts.text("stop.do"));
    ask.get().ask(question, (answers, close) -> model.stop(answers.get(0), close, this::refused));
  }

  private void askToRelease() {
    AskPane.Question question =
        new AskPane.Question(
            texts.text("release.title", tag()),
            texts.text("release.explanation"),
            List.of(
                AskPane.Field.text(texts.text("reason")),
                AskPane.Field.text(texts.text("release.restriction"))),
            texts.text("release.do"));
    ask.get()
        .ask(
            question,
            (answers, close) ->
                model.release(answers.get(0), answers.get(1), close, this::refused));
  }

  private void refused(String problem) {
    ask.get().problem().set(problem);
  }
}
