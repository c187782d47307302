package org.evenbeam.app;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.Map;
import org.junit.jupiter.api.Test;

class DataFoldersTest {
  @Test
  void onLinuxTheXdgFolderIsTakenWhereItIsSet() {
    assertThat(
            new DataFolders("Linux", "/home/tess", Map.of("XDG_DATA_HOME", "/data"))
                .demonstration())
        .hasToString("/data/evenbeam/demonstration");
  }

  @Test
  void aRelativeXdgFolderDoesNotCount() {
    assertThat(new DataFolders("Linux", "/home/tess", Map.of("XDG_DATA_HOME", "data")).laboratory())
        .hasToString("/home/tess/.local/share/evenbeam/laboratory");
  }

  @Test
  void otherSystemsHaveTheirOwnFolders() {
    assertThat(new DataFolders("Mac OS X", "/Users/tess", Map.of()).laboratory())
        .hasToString("/Users/tess/Library/Application Support/evenbeam/laboratory");
    assertThat(
            new DataFolders("Windows 11", "/Users/tess", Map.of("APPDATA", "/roaming"))
                .laboratory())
        .hasToString("/roaming/evenbeam/laboratory");
  }
}
