package org.evenbeam.ui.runsheet;

import java.util.List;
import java.util.Optional;
import javafx.geometry.Pos;
import javafx.scene.control.Button;
import javafx.scene.control.ListView;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyEvent;
import javafx.scene.layout.BorderPane;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.StackPane;
import javafx.scene.layout.VBox;
import org.evenbeam.ui.common.AskPane;
import org.evenbeam.ui.common.Panes;
import org.evenbeam.ui.common.ScreenTexts;

/** The run sheet. */
public final class RunSheetPane extends StackPane {
  private final RunSheetViewModel model;
  private final ScreenTexts texts;
  private final Runnable left;
  private final ReadingsCard readings;
  private final AskPane ask;

  /**
   * Shows a run.
   *
   * @param left runs when the person has submitted the run or given it up
   */
  public RunSheetPane(RunSheetViewModel model, ScreenTexts texts, Runnable left) {
    this.model = model;
    this.texts = texts;
    this.left = left;
    this.readings = new ReadingsCard(model, texts);
    this.ask = new AskPane(content(), texts.text("cancel"));
    getChildren().add(ask);
    readings.list().addEventHandler(KeyEvent.KEY_PRESSED, this::keyInList);
    addEventFilter(KeyEvent.KEY_PRESSED, this::keyAnywhere);
  }

  /** Puts the cursor where typing starts. */
  public void start() {
    readings.start();
  }

  private BorderPane content() {
    HBox second = new HBox(12, new PointTabs(model, texts), Panes.spring());
    second.getChildren().add(new ConditionsBar(model, texts));
    second.setAlignment(Pos.CENTER_LEFT);
    VBox top =
        new VBox(
            10,
            new SheetHeader(model, texts),
            second,
            Panes.problem(model.problem()),
            Panes.problem(model.conditions().problem()));
    readings.setPrefWidth(330);
    readings.setMinWidth(286);
    OutcomeCards outcome = new OutcomeCards(model, texts);
    outcome.setPrefWidth(420);
    HBox.setHgrow(outcome, Priority.ALWAYS);
    HBox middle = new HBox(14, readings, outcome);
    BorderPane content = new BorderPane(middle, top, null, bottom(), null);
    BorderPane.setMargin(middle, new javafx.geometry.Insets(12, 0, 12, 0));
    content.getStyleClass().add("screen");
    return content;
  }

  private HBox bottom() {
    Button submit = Panes.button(texts.text("submit.do"), this::askToSubmit, "accent");
    submit.setId("submit");
    Button abandon = Panes.button(texts.text("abandon.do"), this::askToAbandon, "flat");
    HBox buttons = new HBox(8, abandon, submit);
    buttons.visibleProperty().bind(model.readOnly().not());
    buttons.managedProperty().bind(buttons.visibleProperty());
    HBox bottom =
        new HBox(8, Panes.following(model.kept(), "quiet", "small"), Panes.spring(), buttons);
    bottom.setAlignment(Pos.CENTER_LEFT);
    return bottom;
  }

  private void keyAnywhere(KeyEvent event) {
    if (ask.isAsking() || model.state().get() == null) {
      return;
    }
    boolean writable = !model.readOnly().get();
    if (event.isShortcutDown() && event.getCode() == KeyCode.ENTER && writable) {
      askToSubmit();
      event.consume();
    } else if (event.getCode() == KeyCode.PAGE_DOWN) {
      step(1);
      event.consume();
    } else if (event.getCode() == KeyCode.PAGE_UP) {
      step(-1);
      event.consume();
    }
  }

  private void step(int by) {
    List<String> labels = model.tabs().stream().map(PointTab::label).toList();
    int next = labels.indexOf(model.selected().get()) + by;
    if (next >= 0 && next < labels.size()) {
      model.select(labels.get(next));
    }
  }

  private void keyInList(KeyEvent event) {
    ListView<ReadingLine> list = readings.list();
    Optional<ReadingLine> line =
        Optional.ofNullable(list.getSelectionModel().getSelectedItem())
            .filter(chosen -> chosen.counts() && !model.readOnly().get());
    if (event.getCode() == KeyCode.F2) {
      line.ifPresent(this::askToCorrect);
      event.consume();
    } else if (event.getCode() == KeyCode.DELETE) {
      line.ifPresent(this::askToStrike);
      event.consume();
    }
  }

  private void askToCorrect(ReadingLine line) {
    AskPane.Question question =
        new AskPane.Question(
            texts.text("correct.title", Integer.toString(line.position()), line.text()),
            texts.text("correct.explanation"),
            List.of(
                new AskPane.Field(texts.text("correct.reading"), line.text(), false),
                AskPane.Field.text(texts.text("reason"))),
            texts.text("correct.do"));
    ask.ask(
        question,
        (answers, close) ->
            model.correct(line, answers.get(0), answers.get(1), close, this::refused));
  }

  private void askToStrike(ReadingLine line) {
    AskPane.Question question =
        new AskPane.Question(
            texts.text("strike.title", Integer.toString(line.position()), line.text()),
            texts.text("strike.explanation"),
            List.of(AskPane.Field.text(texts.text("strike.cause"))),
            texts.text("strike.do"));
    ask.ask(question, (answers, close) -> model.strike(line, answers.get(0), close, this::refused));
  }

  private void askToSubmit() {
    boolean verdict = model.hasVerdict();
    String said =
        texts.text(
            verdict ? "submit.explanation" : "submit.explanation-without-verdict",
            texts.sentences().verdict(model.runFindings().verdict()));
    String typed = model.typed().get().strip();
    String notEntered = typed.isEmpty() ? "" : "\n" + texts.text("submit.not-entered", typed);
    AskPane.Question question =
        new AskPane.Question(
            texts.text("submit.title", Long.toString(number())),
            said + notEntered,
            List.of(AskPane.Field.password(texts.text("password"))),
            texts.text(verdict ? "submit.sign" : "submit.sign-without-verdict"));
    ask.ask(
        question,
        (answers, close) -> model.submit(answers.get(0), !verdict, closed(close), this::refused));
  }

  private void askToAbandon() {
    AskPane.Question question =
        new AskPane.Question(
            texts.text("abandon.title", Long.toString(number())),
            texts.text("abandon.explanation"),
            List.of(AskPane.Field.text(texts.text("reason"))),
            texts.text("abandon.do"));
    ask.ask(
        question, (answers, close) -> model.abandon(answers.get(0), closed(close), this::refused));
  }

  private Runnable closed(Runnable close) {
    return () -> {
      close.run();
      left.run();
    };
  }

  private void refused(String problem) {
    ask.problem().set(problem);
  }

  private long number() {
    return model.state().get().sheet().run().number();
  }
}
