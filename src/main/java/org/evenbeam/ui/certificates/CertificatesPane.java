package org.evenbeam.ui.certificates;

import java.io.File;
import java.util.function.Function;
import javafx.beans.property.SimpleObjectProperty;
import javafx.beans.property.SimpleStringProperty;
import javafx.geometry.Pos;
import javafx.scene.control.Button;
import javafx.scene.control.TableCell;
import javafx.scene.control.TableColumn;
import javafx.scene.control.TableView;
import javafx.scene.control.TextField;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyEvent;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.VBox;
import javafx.stage.FileChooser;
import org.evenbeam.logbook.certificates.CertificateFacts;
import org.evenbeam.picture.VerdictMark;
import org.evenbeam.ui.common.Panes;
import org.evenbeam.ui.common.PicturePane;
import org.evenbeam.ui.common.ScreenTexts;
import org.evenbeam.ui.common.StatusPill;

/** The history of certificates. */
public final class CertificatesPane extends VBox {
  private final CertificatesViewModel model;
  private final ScreenTexts texts;
  private final TextField filter = new TextField();
  private final TableView<CertificateFacts> table = new TableView<>();

  /** Shows those certificates. */
  public CertificatesPane(CertificatesViewModel model, ScreenTexts texts) {
    super(12);
    this.model = model;
    this.texts = texts;
    getStyleClass().add("screen");
    filter.setId("filter");
    filter.textProperty().bindBidirectional(model.filter());
    filter.setOnAction(event -> openSelected());
    prepareTable();
    getChildren()
        .addAll(
            Panes.label(texts.text("certificates.title"), "title"),
            Panes.problem(model.problem()),
            Panes.named(texts.text("certificates.filter"), filter),
            table,
            bottom());
  }

  /** Puts the cursor where typing starts. */
  public void start() {
    filter.requestFocus();
  }

  private void prepareTable() {
    table.setId("certificates");
    table.setAccessibleText(texts.text("certificates.title"));
    table.setItems(model.certificates());
    table.setPlaceholder(Panes.label(texts.text("certificates.none"), "quiet"));
    table.setColumnResizePolicy(TableView.CONSTRAINED_RESIZE_POLICY_FLEX_LAST_COLUMN);
    add("certificates.number", CertificateFacts::number);
    add("certificates.tag", CertificateFacts::instrumentTag);
    add("certificates.performed", one -> texts.day(one.performed()));
    table.getColumns().add(verdict());
    add("certificates.issued", one -> texts.dayAndTime(one.issuedAt()));
    add("certificates.approved-by", CertificateFacts::approvedBy);
    VBox.setVgrow(table, Priority.ALWAYS);
    table.addEventHandler(
        KeyEvent.KEY_PRESSED,
        event -> {
          if (event.getCode() == KeyCode.ENTER) {
            openSelected();
            event.consume();
          }
        });
  }

  private void add(String title, Function<CertificateFacts, String> text) {
    TableColumn<CertificateFacts, String> column = new TableColumn<>(texts.text(title));
    column.setCellValueFactory(cell -> new SimpleStringProperty(text.apply(cell.getValue())));
    table.getColumns().add(column);
  }

  private TableColumn<CertificateFacts, CertificateFacts> verdict() {
    TableColumn<CertificateFacts, CertificateFacts> column =
        new TableColumn<>(texts.text("certificates.verdict"));
    column.setCellValueFactory(cell -> new SimpleObjectProperty<>(cell.getValue()));
    column.setCellFactory(view -> new VerdictCell());
    column.setPrefWidth(170);
    return column;
  }

  private HBox bottom() {
    Button open = Panes.button(texts.text("certificates.open"), this::openSelected, "accent");
    open.setId("open");
    Button save = Panes.button(texts.text("certificates.save-as"), this::saveSelected);
    HBox bottom = new HBox(8, Panes.following(model.said(), "quiet"), Panes.spring(), save, open);
    bottom.setAlignment(Pos.CENTER_RIGHT);
    return bottom;
  }

  private CertificateFacts selected() {
    if (table.getSelectionModel().isEmpty()) {
      table.getSelectionModel().selectFirst();
    }
    return table.getSelectionModel().getSelectedItem();
  }

  private void openSelected() {
    CertificateFacts chosen = selected();
    if (chosen != null) {
      model.open(chosen.number());
    }
  }

  private void saveSelected() {
    CertificateFacts chosen = selected();
    if (chosen == null) {
      return;
    }
    FileChooser chooser = new FileChooser();
    chooser.setInitialFileName(chosen.number() + ".pdf");
    File file = chooser.showSaveDialog(getScene().getWindow());
    if (file != null) {
      model.saveAs(chosen.number(), file.toPath());
    }
  }

  private final class VerdictCell extends TableCell<CertificateFacts, CertificateFacts> {
    @Override
    protected void updateItem(CertificateFacts one, boolean empty) {
      super.updateItem(one, empty);
      setText(null);
      if (empty) {
        setGraphic(null);
        return;
      }
      String word = texts.sentences().verdict(one.verdict());
      HBox verdict =
          new HBox(
              8,
              PicturePane.fixed(VerdictMark.draw(one.verdict(), 11, texts.labels(""))),
              Panes.label(word, StatusPill.style(one.verdict())));
      verdict.setAlignment(Pos.CENTER_LEFT);
      setGraphic(verdict);
      setAccessibleText(word);
    }
  }
}
