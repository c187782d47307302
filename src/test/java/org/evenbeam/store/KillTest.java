package org.evenbeam.store;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import org.evenbeam.logbook.Person;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** A program that is killed loses nothing that it had acknowledged. */
class KillTest {
  private static final int LONGEST_LIFE_MILLIS = 400;

  @TempDir Path folder;

  @Test
  void acknowledgedChangesOutliveFiveKills() throws Exception {
    kill(5);
  }

  @Tag("slow")
  @Test
  void acknowledgedChangesOutliveFiftyKills() throws Exception {
    kill(50);
  }

  private void kill(int times) throws Exception {
    Random moments = new Random(times);
    List<String> acknowledged = new ArrayList<>();
    for (int time = 0; time < times; time++) {
      try (ChildStore child = new ChildStore(folder, "write")) {
        assertThat(child.line()).isEqualTo(ChildStore.READY);
        acknowledged.add(child.line());
        Thread.sleep(moments.nextInt(LONGEST_LIFE_MILLIS));
        acknowledged.addAll(child.kill());
      }
      allThere(acknowledged);
    }
  }

  /** A name that was cut off in the middle was not acknowledged; no name is another's beginning. */
  private void allThere(List<String> acknowledged) {
    try (LogbookStore store = LogbookStore.open(folder, () -> false)) {
      List<Person> people = store.transactions().read(store.people()::all);
      assertThat(people).extracting(Person::signInName).containsAll(acknowledged);
      assertThat(TrailAndTables.check(store)).isEmpty();
    }
  }
}
