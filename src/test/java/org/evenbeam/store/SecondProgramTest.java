package org.evenbeam.store;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.nio.file.Files;
import java.nio.file.Path;
import org.evenbeam.logbook.StoreFailed;
import org.evenbeam.logbook.StoreFailed.Reason;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class SecondProgramTest {
  @TempDir Path folder;

  @Test
  void secondProgramIsToldWhichFileIsInUse() throws Exception {
    try (LogbookStore store = LogbookStore.open(folder, () -> false);
        ChildStore other = new ChildStore(folder, "hold")) {
      assertThat(other.line()).isEqualTo("IN_USE " + folder.resolve("logbook.mv.db"));
      new Story(store).setUp();
      assertThat(TrailAndTables.check(store)).isEmpty();
    }
  }

  @Test
  void secondProgramIsRefusedAlsoAfterTheDatabaseFileWasCopied() throws Exception {
    try (LogbookStore store = LogbookStore.open(folder, () -> false)) {
      new Story(store).setUp();
      Files.copy(folder.resolve("logbook.mv.db"), folder.resolve("copy"));
      try (ChildStore other = new ChildStore(folder, "hold")) {
        assertThat(other.line()).startsWith("IN_USE");
      }
    }
  }

  @Test
  void holdingProcessIsNamed() throws Exception {
    try (ChildStore other = new ChildStore(folder, "hold")) {
      assertThat(other.line()).isEqualTo(ChildStore.READY);
      assertThatThrownBy(() -> LogbookStore.open(folder, () -> false))
          .hasMessageContaining("process " + other.pid());
    }
  }

  @Test
  void sameProgramIsRefusedASecondTimeAndTheFirstGoesOn() throws Exception {
    try (LogbookStore store = LogbookStore.open(folder, () -> false)) {
      assertThatThrownBy(() -> LogbookStore.open(folder, () -> false))
          .isInstanceOfSatisfying(
              StoreFailed.class, failed -> assertThat(failed.reason()).isEqualTo(Reason.IN_USE));
      try (ChildStore other = new ChildStore(folder, "hold")) {
        assertThat(other.line()).startsWith("IN_USE");
      }
      new Story(store).setUp();
      assertThat(TrailAndTables.check(store)).isEmpty();
    }
    opensAgain();
  }

  @Test
  void folderIsFreeAgainOnceTheFirstProgramWasKilled() throws Exception {
    try (ChildStore other = new ChildStore(folder, "hold")) {
      assertThat(other.line()).isEqualTo(ChildStore.READY);
      assertThatThrownBy(() -> LogbookStore.open(folder, () -> false))
          .isInstanceOfSatisfying(
              StoreFailed.class, failed -> assertThat(failed.reason()).isEqualTo(Reason.IN_USE));
      other.kill();
      opensAgain();
    }
  }

  private void opensAgain() {
    try (LogbookStore store = LogbookStore.open(folder, () -> false)) {
      assertThat(TrailAndTables.check(store)).isEmpty();
    }
  }
}
