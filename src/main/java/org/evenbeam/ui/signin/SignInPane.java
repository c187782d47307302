package org.evenbeam.ui.signin;

import java.util.List;
import javafx.geometry.Pos;
import javafx.scene.control.Button;
import javafx.scene.control.PasswordField;
import javafx.scene.control.TextField;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Region;
import javafx.scene.layout.StackPane;
import javafx.scene.layout.VBox;
import org.evenbeam.picture.VerdictMark;
import org.evenbeam.ui.common.Panes;
import org.evenbeam.ui.common.PicturePane;
import org.evenbeam.ui.common.ScreenTexts;

/** Asks who works here. */
public final class SignInPane extends StackPane {
  private final TextField name = new TextField();
  private final PasswordField password = new PasswordField();

  /**
   * A pane for that laboratory.
   *
   * @param laboratory the laboratory's name
   * @param hints lines below, such as who may sign in at the demonstration laboratory
   */
  public SignInPane(
      SignInViewModel model, ScreenTexts texts, String laboratory, List<String> hints) {
    Button signIn = Panes.button(texts.text("sign-in.do"), model::signIn, "accent");
    signIn.setId("sign-in");
    signIn.setMaxWidth(Double.MAX_VALUE);
    signIn.disableProperty().bind(model.busy());
    name.setId("name");
    password.setId("password");
    name.setOnAction(event -> password.requestFocus());
    password.setOnAction(event -> model.signIn());
    VBox card =
        Panes.card(
            14,
            title(texts),
            Panes.label(laboratory, "quiet"),
            Panes.field(texts.text("sign-in.name"), name, model.name()),
            Panes.field(texts.text("sign-in.password"), password, model.password()),
            Panes.problem(model.problem()),
            signIn);
    card.setMaxSize(360, Region.USE_PREF_SIZE);
    VBox below = new VBox(4);
    hints.forEach(hint -> below.getChildren().add(Panes.label(hint, "quiet", "small")));
    below.setAlignment(Pos.CENTER);
    VBox middle = new VBox(18, card, below);
    middle.setAlignment(Pos.CENTER);
    getChildren().add(middle);
  }

  /** Puts the cursor where typing starts. */
  public void start() {
    name.requestFocus();
  }

  private static HBox title(ScreenTexts texts) {
    String program = texts.text("program");
    HBox title =
        new HBox(
            12, PicturePane.fixed(VerdictMark.program(22, program)), Panes.label(program, "title"));
    title.setAlignment(Pos.CENTER_LEFT);
    return title;
  }
}
