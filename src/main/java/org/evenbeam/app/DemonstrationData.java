package org.evenbeam.app;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.net.URI;
import java.net.URISyntaxException;
import java.net.URL;
import java.nio.file.FileSystem;
import java.nio.file.FileSystems;
import java.nio.file.Path;
import java.util.Map;
import java.util.function.Consumer;

/** The demonstration laboratory's tables, wherever the program lies: in its jar or in a folder. */
final class DemonstrationData {
  private static final String FOLDER = "demo-data";

  private DemonstrationData() {}

  /** Hands the folder of tables to the reader; it can be read only within. */
  static void read(Consumer<Path> reader) {
    URL found = DemonstrationData.class.getClassLoader().getResource(FOLDER + "/journal.csv");
    if (found == null) {
      throw new IllegalStateException("the program was built without " + FOLDER);
    }
    try {
      URI place = found.toURI();
      if (!place.getScheme().equals("jar")) {
        reader.accept(Path.of(place).getParent());
        return;
      }
      try (FileSystem jar = FileSystems.newFileSystem(place, Map.of())) {
        reader.accept(jar.getPath("/" + FOLDER));
      }
    } catch (URISyntaxException | IOException unreadable) {
      throw new UncheckedIOException(new IOException(unreadable));
    }
  }
}
