package org.evenbeam.ui.runsheet;

import javafx.geometry.Pos;
import javafx.scene.control.Label;
import javafx.scene.control.ListCell;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Region;
import javafx.scene.layout.VBox;
import javafx.scene.shape.Polyline;
import javafx.scene.shape.StrokeLineCap;
import org.evenbeam.ui.common.Panes;
import org.evenbeam.ui.common.ScreenTexts;

/** One line of the list of readings; a tick says that it is on the disk. */
final class ReadingCell extends ListCell<ReadingLine> {
  private final ScreenTexts texts;

  ReadingCell(ScreenTexts texts) {
    this.texts = texts;
    setPrefWidth(0);
  }

  @Override
  protected void updateItem(ReadingLine line, boolean empty) {
    super.updateItem(line, empty);
    setText(null);
    setGraphic(empty ? null : graphic(line));
    setAccessibleText(empty ? null : words(line));
  }

  private String words(ReadingLine line) {
    return texts.text(
        "sheet.line",
        Integer.toString(line.position()),
        line.text(),
        texts.name("sheet.line-state", line.state()),
        line.remark());
  }

  private static VBox graphic(ReadingLine line) {
    Label position = Panes.label(Integer.toString(line.position()), "quiet", "small");
    position.setMinWidth(22);
    Label reading = Panes.label(line.text(), "reading");
    if (line.isGone()) {
      reading.getStyleClass().add("gone");
    }
    reading.setMinWidth(Region.USE_PREF_SIZE);
    Label time = Panes.label(line.time(), "quiet", "small");
    time.setMinWidth(62);
    HBox row = new HBox(8, position, Panes.spring(), reading, time, mark(line));
    row.setAlignment(Pos.CENTER_LEFT);
    VBox lines = new VBox(row);
    if (!line.remark().isEmpty()) {
      Label remark = Panes.label(line.remark(), "tilt", "small");
      remark.setWrapText(true);
      lines.getChildren().add(remark);
    }
    return lines;
  }

  private static Region mark(ReadingLine line) {
    HBox mark = new HBox();
    mark.setMinWidth(16);
    mark.setAlignment(Pos.CENTER);
    if (line.state() == ReadingLine.State.COUNTS) {
      Polyline tick = new Polyline(0, 5, 4, 9, 11, 0);
      tick.setStrokeWidth(2);
      tick.setStrokeLineCap(StrokeLineCap.ROUND);
      tick.getStyleClass().add("stroke-level");
      mark.getStyleClass().add("picture");
      mark.getChildren().add(tick);
    }
    return mark;
  }
}
