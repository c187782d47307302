package org.evenbeam.ui.shell;

import java.util.List;
import java.util.concurrent.TimeoutException;
import javafx.application.Platform;
import javafx.scene.Node;
import javafx.scene.Scene;
import javafx.scene.input.KeyCode;
import javafx.stage.Stage;
import org.evenbeam.ui.TestLaboratory;
import org.evenbeam.ui.common.Fonts;
import org.evenbeam.ui.common.ScreenBackground;
import org.evenbeam.ui.common.Theme;
import org.testfx.api.FxRobot;
import org.testfx.api.FxToolkit;
import org.testfx.util.WaitForAsyncUtils;

/** The window on the demonstration laboratory, without a display, worked by keyboard. */
public final class WindowOnLaboratory implements AutoCloseable {
  private static final int LONGEST_WAIT_SECONDS = 30;

  private final TestLaboratory laboratory = new TestLaboratory(Platform::isFxApplicationThread);
  private final ScreenBackground background = new ScreenBackground();
  private final FxRobot robot = new FxRobot();
  private final EvenbeamWindow window;
  private final Stage stage;

  /** Opens it with that size. */
  public WindowOnLaboratory(double width, double height) throws TimeoutException {
    stage = FxToolkit.registerPrimaryStage();
    Fonts.load();
    Surroundings surroundings =
        new Surroundings(
            background,
            laboratory.clock(),
            file -> false,
            List.of("Technician: tomas, highwater", "Manager: maren, lowwater"));
    window =
        WaitForAsyncUtils.waitForAsyncFx(
            LONGEST_WAIT_SECONDS * 1000L,
            () -> new EvenbeamWindow(laboratory.logbook(), facts(), surroundings));
    robot.interact(
        () -> {
          window.show(stage);
          stage.setWidth(width);
          stage.setHeight(height);
        });
  }

  private org.evenbeam.logbook.laboratory.Laboratory facts() {
    return factsRead;
  }

  private final org.evenbeam.logbook.laboratory.Laboratory factsRead = laboratory.facts();

  /** The laboratory below. */
  public TestLaboratory laboratory() {
    return laboratory;
  }

  /** The robot. */
  public FxRobot robot() {
    return robot;
  }

  /** The scene. */
  public Scene scene() {
    return window.scene();
  }

  /** Light or dark. */
  public void dress(Theme theme) {
    robot.interact(() -> window.dress(theme));
    settle();
  }

  /** Signs in by keyboard. */
  public void signIn(String name, String password) {
    waitForFocus("name");
    type(name);
    press(KeyCode.TAB);
    type(password);
    press(KeyCode.ENTER);
    settle();
  }

  /** Types a text into what has the focus. */
  public void type(String text) {
    robot.write(text, 0);
    settle();
  }

  /** Presses keys together. */
  public void press(KeyCode... keys) {
    robot.press(keys).release(keys);
    settle();
  }

  /** Waits until what has the focus has that id. */
  public void waitForFocus(String id) {
    waitUntil(() -> id.equals(focused()));
  }

  /** The id of what has the focus. */
  public String focused() {
    Node owner = scene().getFocusOwner();
    return owner == null ? null : owner.getId();
  }

  /** The node of that id. */
  public <T extends Node> T node(String id, Class<T> type) {
    return robot.lookup("#" + id).queryAs(type);
  }

  /** Waits until it is so. */
  public void waitUntil(java.util.concurrent.Callable<Boolean> so) {
    try {
      WaitForAsyncUtils.waitFor(LONGEST_WAIT_SECONDS, java.util.concurrent.TimeUnit.SECONDS, so);
    } catch (TimeoutException tooLong) {
      throw new AssertionError("waited in vain; the focus is on " + focused(), tooLong);
    }
  }

  /** Waits until the work asked for so far has arrived. */
  public void settle() {
    java.util.concurrent.CountDownLatch arrived = new java.util.concurrent.CountDownLatch(1);
    robot.interact(
        () -> background.run(() -> 0, zero -> arrived.countDown(), thrown -> arrived.countDown()));
    waitUntil(() -> arrived.getCount() == 0);
    WaitForAsyncUtils.waitForFxEvents();
  }

  @Override
  public void close() throws TimeoutException {
    robot.interact(stage::hide);
    background.close();
    laboratory.close();
  }
}
