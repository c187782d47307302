package org.evenbeam.ui.signoff;

import java.util.List;
import java.util.function.Consumer;
import java.util.function.LongFunction;
import javafx.geometry.Pos;
import javafx.scene.Node;
import javafx.scene.control.Button;
import javafx.scene.control.Label;
import javafx.scene.control.ListCell;
import javafx.scene.control.ListView;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyEvent;
import javafx.scene.layout.BorderPane;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.StackPane;
import javafx.scene.layout.VBox;
import org.evenbeam.logbook.run.RunSummary;
import org.evenbeam.picture.VerdictMark;
import org.evenbeam.ui.common.AskPane;
import org.evenbeam.ui.common.Panes;
import org.evenbeam.ui.common.PicturePane;
import org.evenbeam.ui.common.ScreenTexts;

/** The queue on the left, the chosen run's sheet beside it, and the answer below. */
public final class SignOffPane extends StackPane {
  private final SignOffViewModel model;
  private final ScreenTexts texts;
  private final LongFunction<Node> sheet;
  private final ListView<RunSummary> list = new ListView<>();
  private final BorderPane right = new BorderPane();
  private final Button approve;
  private final Button giveBack;
  private final Button open;
  private final AskPane ask;

  /**
   * Shows the queue.
   *
   * @param sheet makes the read-only sheet of a run
   * @param openCertificate opens the certificate of that number
   */
  public SignOffPane(
      SignOffViewModel model,
      ScreenTexts texts,
      LongFunction<Node> sheet,
      Consumer<String> openCertificate) {
    this.model = model;
    this.texts = texts;
    this.sheet = sheet;
    approve = Panes.button(texts.text("approve.do"), this::askToApprove, "accent");
    approve.setId("approve");
    giveBack = Panes.button(texts.text("return.do"), this::askToReturn);
    giveBack.setId("return");
    open =
        Panes.button(
            texts.text("sign-off.open"), () -> openCertificate.accept(model.certificate().get()));
    open.setId("open-certificate");
    open.visibleProperty().bind(model.certificate().isNotEmpty());
    open.managedProperty().bind(open.visibleProperty());
    ask = new AskPane(content(), texts.text("cancel"));
    getChildren().add(ask);
    addEventFilter(KeyEvent.KEY_PRESSED, this::keyAnywhere);
    model.chosen().addListener((chosen, before, now) -> show(now));
    show(model.chosen().get());
  }

  private void keyAnywhere(KeyEvent event) {
    boolean approves = event.isShortcutDown() && event.getCode() == KeyCode.ENTER;
    if (approves && approve.isVisible() && !ask.isAsking()) {
      askToApprove();
      event.consume();
    }
  }

  /** Puts the cursor on the queue. */
  public void start() {
    list.requestFocus();
  }

  private BorderPane content() {
    list.setId("queue");
    list.getStyleClass().add("queue");
    list.setAccessibleText(texts.text("sign-off.queue"));
    list.setItems(model.queue());
    list.setCellFactory(view -> new RunCell());
    Label none = Panes.label(texts.text("sign-off.empty"), "quiet");
    none.setWrapText(true);
    list.setPlaceholder(none);
    list.getSelectionModel()
        .selectedItemProperty()
        .addListener(
            (item, before, now) -> {
              if (now != null) {
                model.chosen().set(now);
              }
            });
    VBox.setVgrow(list, Priority.ALWAYS);
    VBox left = new VBox(12, Panes.label(texts.text("sign-off.title"), "title"), list);
    left.getStyleClass().add("screen");
    left.setPrefWidth(225);
    left.setMinWidth(190);
    Label hint = Panes.label(texts.text("approve.hint"), "quiet", "small");
    hint.visibleProperty().bind(approve.visibleProperty());
    HBox answers =
        new HBox(
            10,
            Panes.following(model.said(), "strong"),
            open,
            Panes.spring(),
            hint,
            giveBack,
            approve);
    answers.setAlignment(Pos.CENTER_LEFT);
    VBox bottom = new VBox(8, Panes.problem(model.problem()), answers);
    bottom.getStyleClass().add("answers");
    right.setBottom(bottom);
    return new BorderPane(right, null, null, null, left);
  }

  private void show(RunSummary run) {
    boolean may = model.mayAnswer();
    approve.setVisible(may);
    giveBack.setVisible(may);
    if (run == null) {
      right.setCenter(null);
      return;
    }
    list.getSelectionModel().select(run);
    right.setCenter(sheet.apply(run.number()));
  }

  private void askToApprove() {
    boolean reason = model.needsReason();
    AskPane.Question question =
        new AskPane.Question(
            texts.text("approve.title", number()),
            texts.text(
                reason ? "approve.explanation-reason" : "approve.explanation",
                texts.sentences().verdict(model.chosen().get().verdict())),
            reason
                ? List.of(
                    AskPane.Field.text(texts.text("approve.decision")),
                    AskPane.Field.password(texts.text("password")))
                : List.of(AskPane.Field.password(texts.text("password"))),
            texts.text("approve.sign"));
    ask.ask(
        question,
        (answers, close) ->
            model.approve(
                answers.get(answers.size() - 1),
                reason ? answers.get(0) : "",
                answered(close),
                this::refused));
  }

  private void askToReturn() {
    AskPane.Question question =
        new AskPane.Question(
            texts.text("return.title", number()),
            texts.text("return.explanation"),
            List.of(
                AskPane.Field.text(texts.text("reason")),
                AskPane.Field.password(texts.text("password"))),
            texts.text("return.sign"));
    ask.ask(
        question,
        (answers, close) ->
            model.giveBack(answers.get(1), answers.get(0), answered(close), this::refused));
  }

  /** After an approval the certificate is one Enter away. */
  private Runnable answered(Runnable close) {
    return () -> {
      close.run();
      if (open.isVisible()) {
        open.requestFocus();
      } else {
        list.requestFocus();
      }
    };
  }

  private void refused(String problem) {
    ask.problem().set(problem);
  }

  private String number() {
    return Long.toString(model.chosen().get().number());
  }

  private final class RunCell extends ListCell<RunSummary> {
    RunCell() {
      setPrefWidth(0);
    }

    @Override
    protected void updateItem(RunSummary run, boolean empty) {
      super.updateItem(run, empty);
      setText(null);
      if (empty) {
        setGraphic(null);
        return;
      }
      HBox first =
          new HBox(
              8,
              Panes.label(run.instrumentTag(), "strong"),
              Panes.spring(),
              PicturePane.fixed(VerdictMark.draw(run.verdict(), 12, texts.labels(""))));
      first.setAlignment(Pos.CENTER_LEFT);
      String number = texts.text("run.number", Long.toString(run.number()));
      setGraphic(
          new VBox(
              2,
              first,
              Panes.label(number + " · " + run.technician(), "quiet", "small"),
              Panes.label(texts.dayAndTime(run.startedAt()), "quiet", "small")));
      setAccessibleText(
          texts.text(
              "sign-off.line",
              number,
              run.instrumentTag(),
              run.technician(),
              texts.sentences().verdict(run.verdict())));
    }
  }
}
