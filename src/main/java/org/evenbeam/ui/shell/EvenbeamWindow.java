package org.evenbeam.ui.shell;

import java.util.function.Consumer;
import javafx.geometry.Rectangle2D;
import javafx.scene.Scene;
import javafx.scene.control.Button;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyEvent;
import javafx.scene.layout.StackPane;
import javafx.scene.layout.VBox;
import javafx.stage.Screen;
import javafx.stage.Stage;
import org.evenbeam.logbook.Session;
import org.evenbeam.logbook.laboratory.Laboratory;
import org.evenbeam.logbook.open.OpenLogbook;
import org.evenbeam.ui.common.Panes;
import org.evenbeam.ui.common.ScreenTexts;
import org.evenbeam.ui.common.Theme;
import org.evenbeam.ui.signin.SignInPane;
import org.evenbeam.ui.signin.SignInViewModel;

/** The program's window: signing in first, then the screens. */
public final class EvenbeamWindow {
  private static final double WIDTH = 1280;
  private static final double HEIGHT = 800;
  private static final double LEAST_WIDTH = 1024;
  private static final double LEAST_HEIGHT = 700;

  private final OpenLogbook logbook;
  private final Laboratory laboratory;
  private final Surroundings surroundings;
  private final ScreenTexts texts;
  private final StackPane root = new StackPane();
  private final Scene scene = new Scene(root, WIDTH, HEIGHT);
  private Theme theme = Theme.LIGHT;
  private Consumer<Integer> ways = digit -> {};

  /**
   * A window on that logbook; fonts must be loaded before.
   *
   * @param laboratory as read before, because nothing is read on the screen's thread
   */
  public EvenbeamWindow(OpenLogbook logbook, Laboratory laboratory, Surroundings surroundings) {
    this.logbook = logbook;
    this.laboratory = laboratory;
    this.surroundings = surroundings;
    this.texts = new ScreenTexts(laboratory);
    theme.dress(scene);
    scene.addEventFilter(KeyEvent.KEY_PRESSED, this::keyPressed);
  }

  /** Opens on that stage, with signing in. */
  public void show(Stage stage) {
    stage.setTitle(texts.text("window", texts.text("program"), laboratory.name()));
    stage.setScene(scene);
    Rectangle2D screen = Screen.getPrimary().getVisualBounds();
    stage.setMinWidth(Math.min(LEAST_WIDTH, screen.getWidth()));
    stage.setMinHeight(Math.min(LEAST_HEIGHT, screen.getHeight()));
    signIn();
    stage.show();
  }

  /** Its scene. */
  public Scene scene() {
    return scene;
  }

  /** Light or dark from now on. */
  public void dress(Theme chosen) {
    theme = chosen;
    theme.dress(scene);
  }

  private void signIn() {
    ways = digit -> {};
    SignInViewModel model =
        new SignInViewModel(
            logbook.people(),
            surroundings.background(),
            texts,
            laboratory.zone(),
            surroundings.clock(),
            this::signedIn);
    SignInPane pane = new SignInPane(model, texts, laboratory.name(), surroundings.signInHints());
    root.getChildren().setAll(pane);
    pane.start();
  }

  private void signedIn(Session session) {
    Screens screens = new Screens(logbook, session, texts, surroundings, foot(session));
    ways = screens::go;
    root.getChildren().setAll(screens);
    screens.start();
  }

  private VBox foot(Session session) {
    Button light = Panes.button(texts.text("theme"), () -> dress(theme.other()), "flat", "small");
    light.setId("theme");
    Button signOut = Panes.button(texts.text("sign-out"), this::signIn, "flat", "small");
    signOut.setId("sign-out");
    return new VBox(
        4,
        Panes.label(session.person().name(), "strong"),
        Panes.label(texts.name("role", session.person().role()), "quiet", "small"),
        signOut,
        light);
  }

  private void keyPressed(KeyEvent event) {
    KeyCode code = event.getCode();
    if (event.isShortcutDown() && code.isDigitKey()) {
      ways.accept(Character.digit(code.getChar().charAt(0), 10));
      event.consume();
    }
  }
}
