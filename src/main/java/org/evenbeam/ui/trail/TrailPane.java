package org.evenbeam.ui.trail;

import java.util.function.Function;
import javafx.beans.property.SimpleStringProperty;
import javafx.geometry.Pos;
import javafx.scene.control.Button;
import javafx.scene.control.TableColumn;
import javafx.scene.control.TableView;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.VBox;
import org.evenbeam.ui.common.Panes;
import org.evenbeam.ui.common.ScreenTexts;

/** The newest entries of the audit trail, to read. */
public final class TrailPane extends VBox {
  private final TableView<TrailLine> table = new TableView<>();
  private final ScreenTexts texts;

  /** Shows that trail. */
  public TrailPane(TrailViewModel model, ScreenTexts texts) {
    super(12);
    this.texts = texts;
    getStyleClass().add("screen");
    table.setId("trail");
    table.setAccessibleText(texts.text("trail.title"));
    table.setItems(model.lines());
    table.setPlaceholder(Panes.label(texts.text("trail.none"), "quiet"));
    table.setColumnResizePolicy(TableView.CONSTRAINED_RESIZE_POLICY_FLEX_LAST_COLUMN);
    add("trail.number", 70, line -> Long.toString(line.number()));
    add("trail.at", 140, TrailLine::at);
    add("trail.person", 150, TrailLine::person);
    add("trail.action", 230, TrailLine::action);
    add("trail.reason", 300, TrailLine::reason);
    VBox.setVgrow(table, Priority.ALWAYS);
    Button check = Panes.button(texts.text("trail.check"), model::check, "accent");
    check.setId("check");
    HBox bottom = new HBox(12, Panes.following(model.said(), "strong"), Panes.spring(), check);
    bottom.setAlignment(Pos.CENTER_LEFT);
    getChildren()
        .addAll(
            Panes.label(texts.text("trail.title"), "title"),
            Panes.problem(model.problem()),
            table,
            bottom);
  }

  /** Puts the cursor on the list. */
  public void start() {
    table.requestFocus();
  }

  private void add(String title, double width, Function<TrailLine, String> text) {
    TableColumn<TrailLine, String> column = new TableColumn<>(texts.text(title));
    column.setCellValueFactory(cell -> new SimpleStringProperty(text.apply(cell.getValue())));
    column.setPrefWidth(width);
    table.getColumns().add(column);
  }
}
