package org.evenbeam.ui.common;

import javafx.beans.property.StringProperty;
import javafx.beans.value.ObservableValue;
import javafx.scene.AccessibleRole;
import javafx.scene.Node;
import javafx.scene.control.Button;
import javafx.scene.control.Label;
import javafx.scene.control.TextField;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import javafx.scene.layout.VBox;

/** Small parts that all screens are made of. */
public final class Panes {
  private Panes() {}

  /** A text in that style. */
  public static Label label(String text, String... styles) {
    Label label = new Label(text);
    label.getStyleClass().addAll(styles);
    return label;
  }

  /** A text that follows a value and wraps; without a text it takes no room. */
  public static Label following(ObservableValue<String> text, String... styles) {
    Label label = label("", styles);
    label.textProperty().bind(text);
    label.setWrapText(true);
    label.managedProperty().bind(label.textProperty().isNotEmpty());
    label.visibleProperty().bind(label.managedProperty());
    label.setMinHeight(Region.USE_PREF_SIZE);
    return label;
  }

  /** The strip that says what went wrong; nothing while nothing did. */
  public static Label problem(ObservableValue<String> problem) {
    Label strip = following(problem, "problem");
    strip.setMaxWidth(Double.MAX_VALUE);
    strip.setAccessibleRole(AccessibleRole.TEXT);
    return strip;
  }

  /** A button. */
  public static Button button(String text, Runnable action, String... styles) {
    Button button = new Button(text);
    button.getStyleClass().addAll(styles);
    button.setOnAction(event -> action.run());
    button.setMinWidth(Region.USE_PREF_SIZE);
    return button;
  }

  /** A field bound both ways, under its name; the name is also what a screen reader says. */
  public static VBox field(String name, TextField field, StringProperty text) {
    field.textProperty().bindBidirectional(text);
    return named(name, field);
  }

  /** A control under its name. */
  public static VBox named(String name, Node control) {
    Label label = label(name, "quiet", "small");
    label.setLabelFor(control);
    control.setAccessibleText(name);
    return new VBox(4, label, control);
  }

  /** A card on the sheet. */
  public static VBox card(double spacing, Node... parts) {
    VBox card = new VBox(spacing, parts);
    card.getStyleClass().add("card");
    return card;
  }

  /** What pushes its neighbours apart. */
  public static Region spring() {
    Region spring = new Region();
    HBox.setHgrow(spring, Priority.ALWAYS);
    return spring;
  }
}
