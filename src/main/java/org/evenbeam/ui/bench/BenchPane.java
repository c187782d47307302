package org.evenbeam.ui.bench;

import javafx.geometry.Insets;
import javafx.scene.control.ScrollPane;
import javafx.scene.control.TextField;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyEvent;
import javafx.scene.layout.BorderPane;
import javafx.scene.layout.Priority;
import javafx.scene.layout.StackPane;
import javafx.scene.layout.VBox;
import org.evenbeam.ui.common.AskPane;
import org.evenbeam.ui.common.Panes;
import org.evenbeam.ui.common.ScreenTexts;

/** What to do: runs to go on with, and instruments to measure. */
public final class BenchPane extends StackPane {
  private final BenchViewModel model;
  private final ScreenTexts texts;
  private final TextField filter = new TextField();
  private final InstrumentTable table;
  private final AskPane ask;

  /** Shows that bench. */
  public BenchPane(BenchViewModel model, ScreenTexts texts) {
    this.model = model;
    this.texts = texts;
    this.table = new InstrumentTable(model, texts);
    this.ask = new AskPane(content(), texts.text("cancel"));
    getChildren().add(ask);
  }

  /** Puts the cursor where typing starts. */
  public void start() {
    filter.requestFocus();
  }

  private BorderPane content() {
    filter.setId("filter");
    filter.textProperty().bindBidirectional(model.filter());
    filter.setOnAction(event -> table.chooseSelected());
    filter.addEventFilter(KeyEvent.KEY_PRESSED, this::keyInFilter);
    VBox.setVgrow(table, Priority.ALWAYS);
    VBox left =
        new VBox(
            12,
            Panes.label(texts.text("bench.title"), "title"),
            Panes.problem(model.problem()),
            new MyRuns(model, texts),
            Panes.label(texts.text("bench.instruments"), "heading"),
            Panes.named(texts.text("bench.filter"), filter),
            table);
    ScrollPane right = new ScrollPane(new StartCard(model, texts, this::ask));
    right.setFitToWidth(true);
    right.setFitToHeight(true);
    right.setPrefWidth(300);
    right.setMinWidth(270);
    BorderPane content = new BorderPane(left, null, right, null, null);
    BorderPane.setMargin(right, new Insets(0, 0, 0, 14));
    content.getStyleClass().add("screen");
    return content;
  }

  private AskPane ask() {
    return ask;
  }

  private void keyInFilter(KeyEvent event) {
    if (event.getCode() == KeyCode.DOWN) {
      table.requestFocus();
      table.getSelectionModel().selectFirst();
      event.consume();
    }
  }
}
