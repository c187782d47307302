package org.evenbeam.ui.runsheet;

import javafx.geometry.Pos;
import javafx.scene.control.Label;
import javafx.scene.control.TextField;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Region;
import org.evenbeam.ui.common.Panes;
import org.evenbeam.ui.common.ScreenTexts;
import org.evenbeam.verification.Condition;

/** The conditions of the room; recorded on Enter and when the cursor leaves. */
final class ConditionsBar extends HBox {
  ConditionsBar(RunSheetViewModel model, ScreenTexts texts) {
    super(8);
    getStyleClass().add("conditions");
    setAlignment(Pos.CENTER_RIGHT);
    for (Condition condition : Condition.values()) {
      TextField field = new TextField();
      field.setId("condition-" + condition.name());
      field.setPrefWidth(106);
      field.setMinWidth(56);
      field.setPromptText(texts.name("condition.short", condition));
      field.textProperty().bindBidirectional(model.conditions().typed(condition));
      field.editableProperty().bind(model.readOnly().not());
      field.setAccessibleText(texts.name("condition", condition));
      field.setOnAction(event -> model.conditions().commit());
      field
          .focusedProperty()
          .addListener(
              (focus, before, now) -> {
                if (!now && !model.readOnly().get()) {
                  model.conditions().commit();
                }
              });
      Label unit = Panes.label(texts.name("condition.unit", condition), "quiet");
      unit.setLabelFor(field);
      unit.setMinWidth(Region.USE_PREF_SIZE);
      getChildren().addAll(field, unit);
    }
  }
}
