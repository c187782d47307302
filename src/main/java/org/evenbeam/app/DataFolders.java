package org.evenbeam.app;

import java.nio.file.Path;
import java.util.Locale;
import java.util.Map;

/**
 * Where the program keeps its data: the platform's folder for it (on Linux by the XDG Base
 * Directory Specification).
 */
final class DataFolders {
  private static final String NAME = "evenbeam";

  private final String system;
  private final String home;
  private final Map<String, String> environment;

  /**
   * Folders of that machine.
   *
   * @param system the system's name, as in the property {@code os.name}
   * @param home the person's home folder
   * @param environment the environment's variables
   */
  DataFolders(String system, String home, Map<String, String> environment) {
    this.system = system.toLowerCase(Locale.ROOT);
    this.home = home;
    this.environment = environment;
  }

  /** Those of this machine. */
  static DataFolders ofThisMachine() {
    return new DataFolders(
        System.getProperty("os.name"), System.getProperty("user.home"), System.getenv());
  }

  /** The folder of the laboratory's own logbook. */
  Path laboratory() {
    return base().resolve("laboratory");
  }

  /** The folder of the demonstration laboratory. */
  Path demonstration() {
    return base().resolve("demonstration");
  }

  private Path base() {
    if (system.contains("win")) {
      return from("APPDATA", "AppData/Roaming").resolve(NAME);
    }
    if (system.contains("mac")) {
      return Path.of(home, "Library", "Application Support", NAME);
    }
    return from("XDG_DATA_HOME", ".local/share").resolve(NAME);
  }

  /** A relative path in the variable does not count, as the specification says. */
  private Path from(String variable, String otherwise) {
    String value = environment.getOrDefault(variable, "");
    return !value.isEmpty() && Path.of(value).isAbsolute()
        ? Path.of(value)
        : Path.of(home).resolve(otherwise);
  }
}
