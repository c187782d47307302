package org.evenbeam.ui.bench;

import javafx.collections.ListChangeListener;
import javafx.scene.control.ListCell;
import javafx.scene.control.ListView;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyEvent;
import javafx.scene.layout.VBox;
import org.evenbeam.logbook.run.RunState;
import org.evenbeam.logbook.run.RunSummary;
import org.evenbeam.ui.common.Panes;
import org.evenbeam.ui.common.ScreenTexts;

/** This person's drafts and the runs returned to them; Enter goes on with one. */
final class MyRuns extends VBox {
  private static final double ROW = 36;
  private static final int MOST_ROWS = 4;

  private final BenchViewModel model;
  private final ScreenTexts texts;
  private final ListView<RunSummary> list = new ListView<>();

  MyRuns(BenchViewModel model, ScreenTexts texts) {
    super(6);
    this.model = model;
    this.texts = texts;
    list.setId("mine");
    list.setAccessibleText(texts.text("bench.mine"));
    list.setItems(model.mine());
    list.setFixedCellSize(ROW);
    list.setCellFactory(view -> new RunCell());
    list.addEventHandler(
        KeyEvent.KEY_PRESSED,
        event -> {
          if (event.getCode() == KeyCode.ENTER) {
            goOn();
            event.consume();
          }
        });
    list.setOnMouseClicked(
        event -> {
          if (event.getClickCount() == 2) {
            goOn();
          }
        });
    getChildren().addAll(Panes.label(texts.text("bench.mine"), "heading"), list);
    model.mine().addListener((ListChangeListener<RunSummary>) change -> fit());
    fit();
  }

  private void fit() {
    boolean any = !model.mine().isEmpty();
    setVisible(any);
    setManaged(any);
    double height = Math.min(MOST_ROWS, model.mine().size()) * ROW + 4;
    list.setMinHeight(height);
    list.setPrefHeight(height);
    if (any && list.getSelectionModel().isEmpty()) {
      list.getSelectionModel().selectFirst();
    }
  }

  private void goOn() {
    RunSummary selected = list.getSelectionModel().getSelectedItem();
    if (selected != null) {
      model.goOn(selected);
    }
  }

  private final class RunCell extends ListCell<RunSummary> {
    RunCell() {
      setPrefWidth(0);
    }

    @Override
    protected void updateItem(RunSummary run, boolean empty) {
      super.updateItem(run, empty);
      setText(empty ? null : words(run));
    }

    private String words(RunSummary run) {
      String key = run.state() == RunState.RETURNED ? "bench.returned" : "bench.draft";
      return texts.text(
          key,
          Long.toString(run.number()),
          run.instrumentTag(),
          run.planTitle(),
          texts.name("run.kind", run.kind()),
          texts.dayAndTime(run.startedAt()));
    }
  }
}
