package org.evenbeam.app;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.logging.FileHandler;
import java.util.logging.Level;
import java.util.logging.Logger;
import java.util.logging.SimpleFormatter;
import org.evenbeam.logbook.StoreFailed;

/** Where the program's technical messages go: warnings to the terminal, all of them into a file. */
final class Logs {
  private static final int LARGEST_BYTES = 1_000_000;
  private static final int KEPT = 5;
  private static final Logger TOOLKIT = Logger.getLogger("javafx");
  private static final String ON_THE_CLASS_PATH = "Unsupported JavaFX configuration";

  private Logs() {}

  /**
   * From now on only warnings and errors are kept; libraries tell much more than anyone reads. That
   * the toolkit lies on the class path is meant so, and no news to a person at the bench.
   */
  static void onlyWarnings() {
    Logger.getLogger("").setLevel(Level.WARNING);
    TOOLKIT.setFilter(message -> !message.getMessage().startsWith(ON_THE_CLASS_PATH));
  }

  /**
   * From now on messages are also written into the laboratory's folder.
   *
   * @throws StoreFailed when the folder cannot be written to
   */
  static void into(Path folder) {
    Path logs = folder.resolve("log");
    try {
      Files.createDirectories(logs);
      FileHandler file = new FileHandler(logs + "/evenbeam-%g.log", LARGEST_BYTES, KEPT, true);
      file.setFormatter(new SimpleFormatter());
      Logger.getLogger("").addHandler(file);
    } catch (IOException unwritable) {
      throw new StoreFailed(StoreFailed.Reason.READ_ONLY, logs, unwritable.toString(), unwritable);
    }
  }
}
