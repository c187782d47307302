package org.evenbeam.ui.shell;

import java.awt.image.BufferedImage;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Locale;
import java.util.concurrent.TimeoutException;
import javafx.scene.image.PixelReader;
import javafx.scene.image.WritableImage;
import javafx.scene.input.KeyCode;
import javax.imageio.ImageIO;
import org.evenbeam.ui.TestLaboratory;
import org.evenbeam.ui.common.Theme;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;

/**
 * Writes pictures of every screen, light and dark, to target/screens: {@code mvn test
 * -Dtest=ScreenPictures -DexcludedTestGroups=none}.
 */
@Tag("pictures")
class ScreenPictures {
  private static final Path FOLDER = Path.of("target", "screens");

  @Test
  void large() throws TimeoutException {
    tour(1280, 800, "");
  }

  @Test
  void small() throws TimeoutException {
    tour(1024, 700, "small-");
  }

  private static void tour(double width, double height, String prefix) throws TimeoutException {
    try (WindowOnLaboratory window = new WindowOnLaboratory(width, height)) {
      picture(window, prefix + "sign-in");
      window.signIn(TestLaboratory.TECHNICIAN, TestLaboratory.TECHNICIANS_PASSWORD);
      picture(window, prefix + "bench");
      window.type("bal-01");
      window.press(KeyCode.ENTER);
      picture(window, prefix + "bench-start");
      window.press(KeyCode.ENTER);
      window.waitForFocus("reading");
      picture(window, prefix + "sheet-empty");
      readings(window, "50.0001", "50.0000", "49.9999", "50.0001", "50.0012", "50.0001");
      window.type("50.0002");
      picture(window, prefix + "sheet-typing");
      window.press(KeyCode.ESCAPE);
      window.type("50,1");
      window.press(KeyCode.ENTER);
      picture(window, prefix + "sheet-problem");
      window.press(KeyCode.ESCAPE);
      window.press(KeyCode.TAB);
      window.press(KeyCode.END);
      window.press(KeyCode.UP);
      window.press(KeyCode.DELETE);
      window.type("draught shield open");
      picture(window, prefix + "strike");
      window.press(KeyCode.ENTER);
      window.press(KeyCode.SHIFT, KeyCode.TAB);
      readings(window, "50.0002", "50.0000", "50.0001", "50.0000", "50.0001");
      picture(window, prefix + "sheet-full");
      window.press(KeyCode.CONTROL, KeyCode.ENTER);
      window.type("highwater");
      picture(window, prefix + "submit");
      window.press(KeyCode.ENTER);
      picture(window, prefix + "bench-after");
      signOut(window);
      window.signIn(TestLaboratory.MANAGER, TestLaboratory.MANAGERS_PASSWORD);
      picture(window, prefix + "sign-off");
      window.press(KeyCode.CONTROL, KeyCode.DIGIT3);
      picture(window, prefix + "certificates");
      window.press(KeyCode.CONTROL, KeyCode.DIGIT4);
      window.robot().interact(() -> window.node("check", javafx.scene.control.Button.class).fire());
      window.settle();
      picture(window, prefix + "trail");
    }
  }

  private static void signOut(WindowOnLaboratory window) {
    window
        .robot()
        .interact(() -> window.node("sign-out", javafx.scene.control.Button.class).fire());
  }

  private static void readings(WindowOnLaboratory window, String... texts) {
    for (String text : texts) {
      window.type(text);
      window.press(KeyCode.ENTER);
    }
  }

  private static void picture(WindowOnLaboratory window, String name) {
    for (Theme theme : Theme.values()) {
      window.dress(theme);
      WritableImage[] image = new WritableImage[1];
      window.robot().interact(() -> image[0] = window.scene().snapshot(null));
      write(image[0], name + "-" + theme.name().toLowerCase(Locale.ROOT) + ".png");
    }
    window.dress(Theme.LIGHT);
  }

  private static void write(WritableImage image, String file) {
    int width = (int) image.getWidth();
    int height = (int) image.getHeight();
    BufferedImage copy = new BufferedImage(width, height, BufferedImage.TYPE_INT_RGB);
    PixelReader pixels = image.getPixelReader();
    for (int y = 0; y < height; y++) {
      for (int x = 0; x < width; x++) {
        copy.setRGB(x, y, pixels.getArgb(x, y));
      }
    }
    try {
      Files.createDirectories(FOLDER);
      ImageIO.write(copy, "png", FOLDER.resolve(file).toFile());
    } catch (IOException failed) {
      throw new UncheckedIOException(failed);
    }
  }
}
