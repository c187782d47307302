package org.evenbeam.ui.runsheet;

import javafx.application.Platform;
import javafx.beans.binding.Bindings;
import javafx.beans.binding.StringBinding;
import javafx.collections.ListChangeListener;
import javafx.scene.control.Label;
import javafx.scene.control.ListView;
import javafx.scene.control.TextField;
import javafx.scene.input.Clipboard;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyEvent;
import javafx.scene.layout.Priority;
import javafx.scene.layout.VBox;
import org.evenbeam.ui.common.Panes;
import org.evenbeam.ui.common.ScreenTexts;
import org.evenbeam.wording.UnitSymbols;

/** The field that readings are typed into, and the list of those entered. */
final class ReadingsCard extends VBox {
  private final RunSheetViewModel model;
  private final ScreenTexts texts;
  private final TextField field = new TextField();
  private final ListView<ReadingLine> list = new ListView<>();

  ReadingsCard(RunSheetViewModel model, ScreenTexts texts) {
    super(8);
    this.model = model;
    this.texts = texts;
    getStyleClass().add("card");
    Label which = Panes.label("", "quiet");
    which.textProperty().bind(bound(() -> which(model)));
    Label hint = Panes.label("", "quiet", "small");
    hint.textProperty().bind(bound(() -> hint(model)));
    hint.setWrapText(true);
    hint.setMinHeight(USE_PREF_SIZE);
    field.visibleProperty().bind(model.readOnly().not());
    field.managedProperty().bind(field.visibleProperty());
    field.setId("reading");
    field.getStyleClass().add("reading-field");
    field.textProperty().bindBidirectional(model.typed());
    field.accessibleTextProperty().bind(which.textProperty());
    field.setOnAction(event -> model.enter());
    field.addEventFilter(KeyEvent.KEY_PRESSED, this::keyInField);
    prepareList();
    getChildren().addAll(which, field, hint, list);
  }

  private StringBinding bound(java.util.concurrent.Callable<String> text) {
    return Bindings.createStringBinding(
        text, model.state(), model.selected(), model.lines(), model.readOnly());
  }

  private void prepareList() {
    list.setId("readings");
    list.getStyleClass().add("reading-list");
    list.setAccessibleText(texts.text("sheet.readings"));
    list.setCellFactory(view -> new ReadingCell(texts));
    list.setItems(model.lines());
    list.setPlaceholder(Panes.label(texts.text("sheet.no-readings"), "quiet"));
    VBox.setVgrow(list, Priority.ALWAYS);
    model
        .lines()
        .addListener(
            (ListChangeListener<ReadingLine>) change -> Platform.runLater(this::showNewest));
  }

  /** After the new line has been laid out, or it would be shown in part. */
  private void showNewest() {
    list.scrollTo(model.lines().size() - 1);
  }

  private String which(RunSheetViewModel sheet) {
    if (sheet.state().get() == null) {
      return "";
    }
    int planned = sheet.point().planned().readings();
    int counting = sheet.point().counting().size();
    return counting >= planned
        ? texts.text("sheet.all-in", Integer.toString(planned))
        : texts.text("sheet.reading-of", Integer.toString(counting + 1), Integer.toString(planned));
  }

  private String hint(RunSheetViewModel sheet) {
    if (sheet.state().get() == null) {
      return "";
    }
    if (sheet.readOnly().get()) {
      return texts.text("sheet.read-only");
    }
    String unit = UnitSymbols.of(sheet.state().get().unit());
    if (sheet.point().toGo() > 0) {
      return texts.text("sheet.hint", unit);
    }
    boolean more = sheet.tabs().stream().anyMatch(tab -> tab.counting() < tab.planned());
    return texts.text(more ? "sheet.hint-go-on" : "sheet.hint-submit");
  }

  private void keyInField(KeyEvent event) {
    if (event.getCode() == KeyCode.ESCAPE && !field.getText().isEmpty()) {
      field.clear();
      event.consume();
    } else if (event.isShortcutDown() && event.getCode() == KeyCode.V) {
      String pasted = Clipboard.getSystemClipboard().getString();
      if (pasted != null && pasted.strip().lines().count() > 1) {
        model.paste(pasted);
        event.consume();
      }
    }
  }

  /** Puts the cursor where typing starts. */
  void start() {
    if (model.readOnly().get()) {
      list.requestFocus();
    } else {
      field.requestFocus();
    }
  }

  ListView<ReadingLine> list() {
    return list;
  }
}
