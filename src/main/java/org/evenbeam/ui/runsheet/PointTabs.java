package org.evenbeam.ui.runsheet;

import javafx.collections.ListChangeListener;
import javafx.scene.control.ContentDisplay;
import javafx.scene.control.ToggleButton;
import javafx.scene.control.ToggleGroup;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Region;
import org.evenbeam.picture.VerdictMark;
import org.evenbeam.ui.common.PicturePane;
import org.evenbeam.ui.common.ScreenTexts;

/** The check points of a run, each with its verdict's mark once there is one. */
final class PointTabs extends HBox {
  private final RunSheetViewModel model;
  private final ScreenTexts texts;

  PointTabs(RunSheetViewModel model, ScreenTexts texts) {
    super(8);
    this.model = model;
    this.texts = texts;
    model.tabs().addListener((ListChangeListener<PointTab>) change -> build());
    model.selected().addListener((selected, before, now) -> build());
  }

  private void build() {
    boolean focusHere = getChildren().stream().anyMatch(node -> node.isFocused());
    ToggleGroup group = new ToggleGroup();
    getChildren().setAll(model.tabs().stream().map(tab -> button(tab, group)).toList());
    if (focusHere) {
      getChildren().stream()
          .filter(node -> ((ToggleButton) node).isSelected())
          .forEach(node -> node.requestFocus());
    }
  }

  private ToggleButton button(PointTab tab, ToggleGroup group) {
    ToggleButton button = new ToggleButton(tab.label());
    button.getStyleClass().add("point");
    button.setToggleGroup(group);
    button.setSelected(tab.label().equals(model.selected().get()));
    button.setMinWidth(Region.USE_PREF_SIZE);
    String progress =
        texts.text(
            "sheet.progress", Integer.toString(tab.counting()), Integer.toString(tab.planned()));
    if (tab.verdict().isPresent()) {
      button.setGraphic(PicturePane.fixed(VerdictMark.draw(tab.verdict(), 12, texts.labels(""))));
      button.setContentDisplay(ContentDisplay.RIGHT);
      button.setGraphicTextGap(12);
    } else {
      button.setText(tab.label() + "   " + progress);
    }
    button.setAccessibleText(
        texts.text("sheet.tab", tab.label(), progress, texts.sentences().verdict(tab.verdict())));
    button.setOnAction(
        event -> {
          button.setSelected(true);
          model.select(tab.label());
        });
    return button;
  }
}
