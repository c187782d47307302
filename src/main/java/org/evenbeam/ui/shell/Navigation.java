package org.evenbeam.ui.shell;

import java.util.ArrayList;
import java.util.List;
import javafx.geometry.Pos;
import javafx.scene.control.Label;
import javafx.scene.control.ToggleButton;
import javafx.scene.control.ToggleGroup;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import javafx.scene.layout.VBox;
import org.evenbeam.picture.VerdictMark;
import org.evenbeam.ui.common.Panes;
import org.evenbeam.ui.common.PicturePane;
import org.evenbeam.ui.common.ScreenTexts;

/** The ways to the screens, and who is signed in. */
final class Navigation extends VBox {
  /** One way: its name, and what it does. */
  record Way(String key, Runnable go) {}

  private final ToggleGroup group = new ToggleGroup();
  private final List<Way> ways;

  Navigation(ScreenTexts texts, List<Way> ways, Region foot) {
    super(6);
    this.ways = List.copyOf(ways);
    getStyleClass().add("navigation");
    String program = texts.text("program");
    HBox mark =
        new HBox(
            10,
            PicturePane.fixed(VerdictMark.program(16, program)),
            Panes.label(program, "program"));
    mark.setAlignment(Pos.CENTER_LEFT);
    mark.setMinHeight(44);
    getChildren().add(mark);
    for (int i = 0; i < ways.size(); i++) {
      getChildren().add(button(texts, ways.get(i), i + 1));
    }
    Region spring = new Region();
    VBox.setVgrow(spring, Priority.ALWAYS);
    getChildren().addAll(spring, foot);
  }

  private ToggleButton button(ScreenTexts texts, Way way, int digit) {
    ToggleButton button = new ToggleButton(texts.text("way." + way.key()));
    button.setId("way-" + way.key());
    button.setMaxWidth(Double.MAX_VALUE);
    button.setToggleGroup(group);
    button.setUserData(way.key());
    Label key = Panes.label(texts.text("way.key", Integer.toString(digit)), "quiet", "small");
    button.setGraphic(key);
    button.setContentDisplay(javafx.scene.control.ContentDisplay.RIGHT);
    button.setGraphicTextGap(10);
    button.setOnAction(event -> way.go().run());
    return button;
  }

  /** Goes the way of that digit, from 1; nothing where there is none. */
  void go(int digit) {
    if (digit >= 1 && digit <= ways.size()) {
      ways.get(digit - 1).go().run();
    }
  }

  /** Shows which screen is there. */
  void mark(String key) {
    List<ToggleButton> buttons = new ArrayList<>();
    group.getToggles().forEach(toggle -> buttons.add((ToggleButton) toggle));
    buttons.forEach(button -> button.setSelected(button.getUserData().equals(key)));
  }
}
