package org.evenbeam.store;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import org.evenbeam.logbook.UseCase;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class CompactionTest {
  @TempDir Path directory;
  private LogbookFolder folder;
  private String head;

  @BeforeEach
  void closeAGrownLogbook() {
    folder = LogbookFolder.at(directory);
    try (LogbookStore store = open()) {
      Story story = new Story(store).whole();
      for (int number = 0; number < 100; number++) {
        story.does(UseCase.ADD_PERSON, t -> {});
      }
      head = story.read(t -> store.trail().head(t).hash());
    }
  }

  @Test
  void fileShrinksAndEverythingIsStillThere() throws IOException {
    long before = Files.size(folder.database());
    Compaction.run(folder, Passwords.read(folder.passwords()), head);
    assertThat(Files.size(folder.database())).isLessThan(before);
    assertThat(folder.newDatabase()).doesNotExist();
    isWhole();
  }

  @Test
  void oldFileStaysWhereTheRewrittenOneHasAnotherHead() throws IOException {
    byte[] before = Files.readAllBytes(folder.database());
    Compaction.run(folder, Passwords.read(folder.passwords()), "of another trail");
    assertThat(Files.readAllBytes(folder.database())).isEqualTo(before);
    isWhole();
  }

  @Test
  void oldFileStaysWhereNoOtherCanBeWritten() throws IOException {
    Files.createDirectories(folder.newDatabase().resolve("in the way"));
    byte[] before = Files.readAllBytes(folder.database());
    Compaction.run(folder, Passwords.read(folder.passwords()), head);
    assertThat(Files.readAllBytes(folder.database())).isEqualTo(before);
    isWhole();
  }

  @ParameterizedTest
  @CsvSource({"33554432, 10, false", "33554433, 49, true", "33554433, 50, false", "0, 100, false"})
  void largeFilesThatAreMostlyWasteAreWorthIt(long bytes, int fillPercent, boolean worthIt) {
    assertThat(Compaction.isWorthIt(bytes, fillPercent)).isEqualTo(worthIt);
  }

  private void isWhole() {
    try (LogbookStore store = open()) {
      String found = store.transactions().read(t -> store.trail().head(t).hash());
      assertThat(found).isEqualTo(head);
      assertThat(TrailAndTables.check(store)).isEmpty();
    }
  }

  private LogbookStore open() {
    return LogbookStore.open(directory, () -> false);
  }
}
