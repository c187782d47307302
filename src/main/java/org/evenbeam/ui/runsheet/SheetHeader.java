package org.evenbeam.ui.runsheet;

import javafx.geometry.Pos;
import javafx.scene.control.Label;
import javafx.scene.layout.HBox;
import javafx.scene.layout.VBox;
import org.evenbeam.ui.common.Panes;
import org.evenbeam.ui.common.ScreenTexts;
import org.evenbeam.ui.common.StatusPill;

/** Which instrument, which plan, which standard. */
final class SheetHeader extends VBox {
  private final RunSheetViewModel model;
  private final ScreenTexts texts;
  private final SheetWords words;
  private final Label tag = Panes.label("", "title");
  private final Label instrument = Panes.label("", "quiet");
  private final Label run = Panes.label("", "quiet");
  private final Label standard = Panes.label("", "quiet");
  private final Label pastDue = Panes.label("", "past-due");
  private final HBox status = new HBox(10);

  SheetHeader(RunSheetViewModel model, ScreenTexts texts) {
    super(4);
    this.model = model;
    this.texts = texts;
    this.words = new SheetWords(texts);
    tag.setMinWidth(USE_PREF_SIZE);
    for (Label line : java.util.List.of(instrument, run, standard)) {
      line.setWrapText(true);
      line.setMinHeight(USE_PREF_SIZE);
    }
    pastDue.setMinWidth(USE_PREF_SIZE);
    HBox first = new HBox(16, tag, Panes.spring(), status);
    first.setAlignment(Pos.CENTER_LEFT);
    getChildren().addAll(first, instrument, run, standard);
    model.state().addListener((state, before, now) -> show());
    model.selected().addListener((point, before, now) -> show());
  }

  private void show() {
    SheetState state = model.state().get();
    if (state == null) {
      return;
    }
    tag.setText(state.sheet().instrument().tag());
    instrument.setText(words.instrument(state.sheet().instrument()));
    run.setText(words.run(state) + " · " + texts.name("run.state", state.open().state()));
    if (!model.selected().get().isEmpty()) {
      standard.setText(words.standard(model.point()));
    }
    pastDue.setText(
        model.pastDue().map(day -> texts.text("sheet.past-due", texts.day(day))).orElse(""));
    status.setAlignment(Pos.CENTER_RIGHT);
    status.getChildren().setAll(pastDue, StatusPill.of(state.instrument().status(), texts));
  }
}
