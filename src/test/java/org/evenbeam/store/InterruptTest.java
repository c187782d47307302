package org.evenbeam.store;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.file.Path;
import java.util.List;
import java.util.concurrent.atomic.AtomicReference;
import org.evenbeam.logbook.Person;
import org.evenbeam.logbook.Role;
import org.evenbeam.logbook.UseCase;
import org.evenbeam.logbook.people.NewPerson;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** A cancelled background task interrupts its thread, at any moment. */
class InterruptTest {
  @TempDir Path folder;

  @Test
  void interruptedThreadLosesNeitherItsChangeNorTheLogbook() throws Exception {
    try (LogbookStore store = LogbookStore.open(folder, () -> false)) {
      Story story = new Story(store);
      AtomicReference<Throwable> failure = new AtomicReference<>();
      for (int number = 0; number < 20; number++) {
        String name = "person" + number;
        Thread worker = new Thread(() -> addInterrupted(story, name));
        worker.setUncaughtExceptionHandler((thread, thrown) -> failure.set(thrown));
        worker.start();
        worker.interrupt();
        worker.join();
      }
      assertThat(failure.get()).isNull();
      List<Person> people = story.read(store.people()::all);
      assertThat(people).hasSize(20);
      assertThat(TrailAndTables.check(store)).isEmpty();
    }
  }

  private static void addInterrupted(Story story, String name) {
    Thread.currentThread().interrupt();
    story.does(
        UseCase.ADD_PERSON,
        t -> story.store.people().add(t, new NewPerson(name, name, Role.AUDITOR)));
  }
}
