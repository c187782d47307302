package org.evenbeam.app;

import static org.assertj.core.api.Assertions.assertThat;
import static org.junit.jupiter.api.Assumptions.assumeTrue;

import java.io.IOException;
import java.io.InputStream;
import java.net.URISyntaxException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.HashMap;
import java.util.Map;
import java.util.Set;
import java.util.TreeSet;
import java.util.jar.JarFile;
import javafx.application.Platform;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;

/** What a fresh machine must have for a window, read from the toolkit's own native libraries. */
class WindowPackagesTest {
  private static final Path TABLE =
      Path.of("src/test/resources/reference/debian/window_packages.csv");
  private static final Map<String, String> BROUGHT_BY = new HashMap<>();

  @BeforeAll
  static void readTable() throws IOException {
    for (String line : Files.readAllLines(TABLE)) {
      String[] cells = line.split(",", -1);
      if (!line.startsWith("#") && cells.length == 3) {
        BROUGHT_BY.put(cells[0], cells[2]);
      }
    }
  }

  private static Set<String> linkedWith() throws IOException, URISyntaxException {
    Path classes =
        Path.of(Platform.class.getProtectionDomain().getCodeSource().getLocation().toURI());
    TreeSet<String> own = new TreeSet<>();
    TreeSet<String> needed = new TreeSet<>();
    try (JarFile jar = new JarFile(classes.toFile())) {
      for (var entry : jar.stream().filter(e -> e.getName().endsWith(".so")).toList()) {
        own.add(entry.getName());
        try (InputStream content = jar.getInputStream(entry)) {
          needed.addAll(new SharedLibrary(content.readAllBytes()).needed());
        }
      }
    }
    assumeTrue(!own.isEmpty(), "the toolkit of another system has other libraries");
    needed.removeAll(own);
    return needed;
  }

  @Test
  void everyLibraryThatTheToolkitIsLinkedWithHasItsPackage() throws Exception {
    assertThat(linkedWith()).contains("libgtk-3.so.0").isSubsetOf(BROUGHT_BY.keySet());
  }

  @Test
  void whatTheJavaPackageDoesNotBringIsNamedInReadme() throws Exception {
    String readme = Files.readString(Path.of("README.md"));
    for (String library : linkedWith()) {
      String debian = BROUGHT_BY.get(library);
      if (!debian.equals("jdk")) {
        assertThat(readme).as(library).contains("`" + debian + "`");
      }
    }
  }
}
