package org.evenbeam.store;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.catchThrowable;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import org.evenbeam.logbook.Person;
import org.evenbeam.logbook.Role;
import org.evenbeam.logbook.StoreFailed;
import org.evenbeam.logbook.StoreFailed.Reason;
import org.evenbeam.logbook.UseCase;
import org.evenbeam.logbook.people.NewPerson;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class FullDiskTest {
  @TempDir Path folder;

  @BeforeEach
  void register() {
    FullDisk.register();
  }

  @AfterEach
  void free() {
    FullDisk.free();
  }

  @Test
  void changeThatDoesNotFitIsRefusedAndTheStoreGoesOnOnceThereIsSpace() {
    try (LogbookStore store = open()) {
      Story story = new Story(store).setUp();
      FullDisk.leave(0);
      assertThatThrownBy(() -> add(story, "late"))
          .isInstanceOfSatisfying(
              StoreFailed.class, failed -> assertThat(failed.reason()).isEqualTo(Reason.DISK_FULL));
      FullDisk.free();
      assertThat(names(story)).containsExactlyInAnyOrder("mara", "tam", "olin");
      add(story, "late");
      assertThat(names(story)).contains("late");
      assertThat(TrailAndTables.check(store)).isEmpty();
    }
  }

  /** The disk fills up at every place of the writing in turn. */
  @Test
  void acknowledgedMeansKeptAndRefusedMeansNotKeptWhereverTheDiskFillsUp() {
    try (LogbookStore store = open()) {
      Story story = new Story(store).setUp();
      List<String> expected = new ArrayList<>(List.of("mara", "tam", "olin"));
      List<String> refusals = new ArrayList<>();
      for (int left = 0; left < 50_000; left += 1499) {
        String name = "at" + left;
        FullDisk.leave(left);
        Throwable failed = catchThrowable(() -> add(story, name));
        FullDisk.free();
        if (failed == null) {
          expected.add(name);
        } else {
          assertThat(failed).isInstanceOf(StoreFailed.class);
          assertThat(((StoreFailed) failed).reason()).isEqualTo(Reason.DISK_FULL);
          refusals.add(name);
        }
        assertThat(names(story)).containsExactlyInAnyOrderElementsOf(expected);
      }
      assertThat(refusals).isNotEmpty();
      assertThat(expected).hasSizeGreaterThan(3);
      assertThat(TrailAndTables.check(store)).isEmpty();
    }
    try (LogbookStore store = open()) {
      assertThat(TrailAndTables.check(store)).isEmpty();
    }
  }

  @Test
  void changeThatIsKeptThoughOneWritingThroughFailedIsAcknowledged() {
    try (LogbookStore store = open()) {
      Story story = new Story(store).setUp();
      FullDisk.failOneForce();
      add(story, "kept");
      assertThat(names(story)).contains("kept");
      assertThat(TrailAndTables.check(store)).isEmpty();
    }
  }

  @Test
  void fullDiskAtSetUpIsSaid() {
    FullDisk.leave(20_000);
    assertThatThrownBy(this::open)
        .isInstanceOfSatisfying(
            StoreFailed.class, failed -> assertThat(failed.reason()).isEqualTo(Reason.DISK_FULL));
    FullDisk.free();
    try (LogbookStore store = open()) {
      assertThat(TrailAndTables.check(store)).isEmpty();
    }
  }

  private LogbookStore open() {
    return LogbookStore.open(folder, () -> false, FullDisk.SCHEME + ":");
  }

  private static void add(Story story, String name) {
    story.does(
        UseCase.ADD_PERSON,
        t -> story.store.people().add(t, new NewPerson(name, name, Role.AUDITOR)));
  }

  private static List<String> names(Story story) {
    List<Person> people = story.read(story.store.people()::all);
    return people.stream().map(Person::signInName).toList();
  }
}
