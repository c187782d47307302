package org.evenbeam.app;

import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Clock;
import java.util.List;
import java.util.concurrent.CountDownLatch;
import javafx.application.Platform;
import javafx.stage.Stage;
import org.evenbeam.logbook.NotFound;
import org.evenbeam.logbook.certificates.CertificatePress;
import org.evenbeam.logbook.laboratory.Laboratory;
import org.evenbeam.ui.common.Fonts;
import org.evenbeam.ui.common.ScreenBackground;
import org.evenbeam.ui.shell.DesktopViewer;
import org.evenbeam.ui.shell.EvenbeamWindow;
import org.evenbeam.ui.shell.Surroundings;

/** The program's window on a laboratory's folder. */
final class Window {
  private final Path folder;
  private final CertificatePress press;
  private final List<String> signInHints;

  /**
   * A window to be opened.
   *
   * @param folder the laboratory's folder
   * @param press prints its certificates
   * @param signInHints lines below the sign-in card
   */
  Window(Path folder, CertificatePress press, List<String> signInHints) {
    this.folder = folder;
    this.press = press;
    this.signInHints = signInHints;
  }

  /**
   * Opens the window and returns when it is closed.
   *
   * @return the exit status
   * @throws NotFound when there is no laboratory in the folder
   * @throws NoDisplay when there is no display to open it on
   * @throws org.evenbeam.logbook.StoreFailed when the logbook cannot be opened
   */
  int open() {
    if (!Display.isThere()) {
      throw new NoDisplay();
    }
    if (!Files.isDirectory(folder)) {
      throw new NotFound(NotFound.Thing.LABORATORY, folder.toString());
    }
    Logs.into(folder);
    try (OpenLaboratory open =
            OpenLaboratory.in(folder, press, () -> Platform.isFxApplicationThread());
        PendingPrints prints = new PendingPrints(open.logbook().certificates());
        ScreenBackground background = new ScreenBackground()) {
      Laboratory laboratory =
          open.logbook()
              .laboratory()
              .find()
              .orElseThrow(() -> new NotFound(NotFound.Thing.LABORATORY, folder.toString()));
      prints.begin();
      show(open, laboratory, background);
      return 0;
    }
  }

  private void show(OpenLaboratory open, Laboratory laboratory, ScreenBackground background) {
    CountDownLatch closed = new CountDownLatch(1);
    Surroundings surroundings =
        new Surroundings(background, Clock.systemUTC(), new DesktopViewer(), signInHints);
    Toolkit.start(
        () -> {
          Fonts.load();
          Stage stage = new Stage();
          stage.setOnHidden(hidden -> closed.countDown());
          new EvenbeamWindow(open.logbook(), laboratory, surroundings).show(stage);
        });
    await(closed);
    Platform.exit();
  }

  private static void await(CountDownLatch closed) {
    try {
      closed.await();
    } catch (InterruptedException stopped) {
      Thread.currentThread().interrupt();
    }
  }
}
