package org.evenbeam.ui.bench;

import java.util.Comparator;
import java.util.Optional;
import java.util.function.Function;
import javafx.beans.property.SimpleObjectProperty;
import javafx.geometry.Pos;
import javafx.scene.Node;
import javafx.scene.control.Label;
import javafx.scene.control.TableCell;
import javafx.scene.control.TableColumn;
import javafx.scene.control.TableView;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyEvent;
import javafx.scene.layout.HBox;
import javafx.scene.layout.VBox;
import org.evenbeam.logbook.instruments.InstrumentOverview;
import org.evenbeam.picture.VerdictMark;
import org.evenbeam.ui.common.Panes;
import org.evenbeam.ui.common.PicturePane;
import org.evenbeam.ui.common.ScreenTexts;
import org.evenbeam.ui.common.StatusPill;
import org.evenbeam.verification.Verdict;

/** The instruments with status and next due date; Enter chooses one. */
final class InstrumentTable extends TableView<InstrumentOverview> {
  private static final double ROW = 50;

  private final BenchViewModel model;
  private final ScreenTexts texts;

  InstrumentTable(BenchViewModel model, ScreenTexts texts) {
    this.model = model;
    this.texts = texts;
    setId("instruments");
    setFixedCellSize(ROW);
    setAccessibleText(texts.text("bench.instruments"));
    setItems(model.instruments());
    setPlaceholder(Panes.label(texts.text("bench.none"), "quiet"));
    setColumnResizePolicy(CONSTRAINED_RESIZE_POLICY_FLEX_LAST_COLUMN);
    getColumns().add(column("bench.instrument", 230, this::instrument));
    getColumns().add(column("bench.status", 190, this::status));
    getColumns().add(column("bench.next-due", 110, this::due));
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

  private Cell instrument(InstrumentOverview one) {
    String kindAndPlace =
        texts.text("bench.kind-and-place", one.instrument().kind(), one.instrument().location());
    return words(one.instrument().tag(), kindAndPlace);
  }

  private Cell status(InstrumentOverview one) {
    Optional<Verdict> shape = StatusPill.shape(one.status());
    String word = texts.name("status", one.status());
    Label label = Panes.label(word, StatusPill.style(shape));
    label.setWrapText(true);
    HBox status =
        new HBox(8, PicturePane.fixed(VerdictMark.draw(shape, 11, texts.labels(""))), label);
    status.setAlignment(Pos.CENTER_LEFT);
    return new Cell(status, word);
  }

  private Cell due(InstrumentOverview one) {
    String day = one.nextDue().map(texts::day).orElseGet(() -> texts.text("bench.never"));
    return words(day, model.isPastDue(one) ? texts.text("bench.past-due") : "");
  }

  /** One line, and a smaller one below where there is something to say. */
  private static Cell words(String first, String second) {
    VBox lines = new VBox(2, Panes.label(first));
    if (!second.isEmpty()) {
      lines.getChildren().add(Panes.label(second, "quiet", "small"));
    }
    lines.setAlignment(Pos.CENTER_LEFT);
    return new Cell(lines, second.isEmpty() ? first : first + ", " + second);
  }

  /** What a cell shows, and what a screen reader says. */
  private record Cell(Node graphic, String words) {}

  private TableColumn<InstrumentOverview, InstrumentOverview> column(
      String title, double width, Function<InstrumentOverview, Cell> content) {
    TableColumn<InstrumentOverview, InstrumentOverview> column =
        new TableColumn<>(texts.text(title));
    column.setCellValueFactory(cell -> new SimpleObjectProperty<>(cell.getValue()));
    column.setCellFactory(table -> new GraphicCell(content));
    column.setComparator(Comparator.comparing(one -> content.apply(one).words()));
    column.setPrefWidth(width);
    return column;
  }

  private static final class GraphicCell extends TableCell<InstrumentOverview, InstrumentOverview> {
    private final Function<InstrumentOverview, Cell> content;

    GraphicCell(Function<InstrumentOverview, Cell> content) {
      this.content = content;
    }

    @Override
    protected void updateItem(InstrumentOverview one, boolean empty) {
      super.updateItem(one, empty);
      setText(null);
      Optional<Cell> cell =
          empty || one == null ? Optional.empty() : Optional.of(content.apply(one));
      setGraphic(cell.map(Cell::graphic).orElse(null));
      setAccessibleText(cell.map(Cell::words).orElse(null));
    }
  }
}
