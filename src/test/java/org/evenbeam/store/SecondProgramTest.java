package org.evenbeam.store;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.io.IOException;
import java.nio.file.Path;
import java.util.List;
import org.evenbeam.logbook.Person;
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

  private void opensAgain() throws IOException {
    try (LogbookStore store = LogbookStore.open(folder, () -> false)) {
      List<Person> people = store.transactions().read(store.people()::all);
      assertThat(people).isEmpty();
    }
  }
}
