package org.evenbeam.ui.bench;

import java.util.function.Function;
import javafx.beans.property.SimpleObjectProperty;
import javafx.beans.property.SimpleStringProperty;
import javafx.geometry.Pos;
import javafx.scene.control.TableCell;
import javafx.scene.control.TableColumn;
import javafx.scene.control.TableView;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyEvent;
import javafx.scene.layout.HBox;
import org.evenbeam.logbook.instruments.InstrumentOverview;
import org.evenbeam.picture.VerdictMark;
import org.evenbeam.ui.common.Panes;
import org.evenbeam.ui.common.PicturePane;
import org.evenbeam.ui.common.ScreenTexts;
import org.evenbeam.ui.common.StatusPill;

/** The instruments with status and next due date; Enter chooses one. */
final class InstrumentTable extends TableView<InstrumentOverview> {
  private final BenchViewModel model;
  private final ScreenTexts texts;

  InstrumentTable(BenchViewModel model, ScreenTexts texts) {
    this.model = model;
    this.texts = texts;
    setId("instruments");
    setAccessibleText(texts.text("bench.instruments"));
    setItems(model.instruments());
    setPlaceholder(Panes.label(texts.text("bench.none"), "quiet"));
    setColumnResizePolicy(CONSTRAINED_RESIZE_POLICY_FLEX_LAST_COLUMN);
    add("bench.tag", 80, one -> one.instrument().tag());
    getColumns().add(status());
    add("bench.kind", 150, one -> one.instrument().kind());
    add("bench.location", 130, one -> one.instrument().location());
    add("bench.next-due", 130, this::due);
    addEventHandler(
        KeyEvent.KEY_PRESSED,
        event -> {
          if (event.getCode() == KeyCode.ENTER) {
            chooseSelected();
            event.consume();
          }
        });
    setOnMouseClicked(event -> chooseSelected());
  }

  /** Chooses the selected instrument, or the first where none is selected. */
  void chooseSelected() {
    if (getSelectionModel().isEmpty()) {
      getSelectionModel().selectFirst();
    }
    InstrumentOverview selected = getSelectionModel().getSelectedItem();
    if (selected != null) {
      model.choose(selected);
    }
  }

  private String due(InstrumentOverview one) {
    return one.nextDue()
        .map(
            day ->
                model.isPastDue(one)
                    ? texts.text("bench.past-due", texts.day(day))
                    : texts.day(day))
        .orElseGet(() -> texts.text("bench.never"));
  }

  private void add(String title, double width, Function<InstrumentOverview, String> text) {
    TableColumn<InstrumentOverview, String> column = new TableColumn<>(texts.text(title));
    column.setCellValueFactory(cell -> new SimpleStringProperty(text.apply(cell.getValue())));
    column.setPrefWidth(width);
    getColumns().add(column);
  }

  private TableColumn<InstrumentOverview, InstrumentOverview> status() {
    TableColumn<InstrumentOverview, InstrumentOverview> column =
        new TableColumn<>(texts.text("bench.status"));
    column.setCellValueFactory(cell -> new SimpleObjectProperty<>(cell.getValue()));
    column.setCellFactory(table -> new StatusCell());
    column.setPrefWidth(170);
    return column;
  }

  private final class StatusCell extends TableCell<InstrumentOverview, InstrumentOverview> {
    @Override
    protected void updateItem(InstrumentOverview one, boolean empty) {
      super.updateItem(one, empty);
      setText(null);
      if (empty) {
        setGraphic(null);
        return;
      }
      String word = texts.name("status", one.status());
      HBox status =
          new HBox(
              8,
              PicturePane.fixed(
                  VerdictMark.draw(StatusPill.shape(one.status()), 11, texts.labels(""))),
              Panes.label(word, StatusPill.style(StatusPill.shape(one.status()))));
      status.setAlignment(Pos.CENTER_LEFT);
      setGraphic(status);
      setAccessibleText(word);
    }
  }
}
