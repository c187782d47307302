package org.evenbeam.store;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.time.Instant;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.Callable;
import java.util.concurrent.ExecutionException;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.Future;
import java.util.concurrent.atomic.AtomicBoolean;
import java.util.concurrent.atomic.AtomicReference;
import org.evenbeam.logbook.Change;
import org.evenbeam.logbook.Person;
import org.evenbeam.logbook.Role;
import org.evenbeam.logbook.Transaction;
import org.evenbeam.logbook.UseCase;
import org.evenbeam.logbook.history.TrailRecords.Head;
import org.evenbeam.logbook.people.NewPerson;
import org.evenbeam.logbook.run.Scratch;
import org.evenbeam.trail.EntryReader;
import org.evenbeam.trail.TrailEntry;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.Test;

class StoreTransactionsTest {
  private final AtomicBoolean onScreen = new AtomicBoolean();
  private final LogbookStore store = LogbookStore.openInMemory(onScreen::get);
  private final Story story = new Story(store);

  @AfterEach
  void trailIsWhole() {
    onScreen.set(false);
    assertThat(TrailAndTables.check(store)).isEmpty();
    store.close();
  }

  @Test
  void headIsZeroBeforeAnyEntry() {
    Head head = story.read(store.trail()::head);
    assertThat(head).isEqualTo(new Head(0, TrailEntry.NO_PREVIOUS));
  }

  @Test
  void changeThatTouchesNoRowIsSealedWithoutChanges() {
    story.does(UseCase.ADD_PERSON, t -> {});
    TrailEntry entry = entries().get(0);
    assertThat(entry.changes()).isEmpty();
    assertThat(entry.action()).isEqualTo("person added");
  }

  @Test
  void reasonAndProgramsOwnActsAreInTheEntry() {
    Change change =
        new Change(
            Story.NOON, Optional.empty(), UseCase.ABANDON_RUN, Optional.of("the power failed"));
    store.transactions().change(change, t -> true);
    assertThat(entries().get(0).reason()).contains("the power failed");
    assertThat(entries().get(0).person()).isEmpty();
  }

  @Test
  void workThatThrowsLeavesNothing() {
    assertThatThrownBy(
            () ->
                story.does(
                    UseCase.ADD_PERSON,
                    t -> {
                      add(t, "gone");
                      throw new IllegalArgumentException("no");
                    }))
        .isInstanceOf(IllegalArgumentException.class);
    List<Person> people = story.read(store.people()::all);
    assertThat(people).isEmpty();
    assertThat(entries()).isEmpty();
  }

  @Test
  void readCannotChangeAnything() {
    assertThatThrownBy(() -> story.read(t -> add(t, "new")))
        .isInstanceOf(IllegalStateException.class);
    assertThatThrownBy(
            () ->
                story.read(
                    t -> {
                      store.runs().keepScratch(t, 1, new Scratch("100 g", "1", Story.NOON));
                      return true;
                    }))
        .isInstanceOf(IllegalStateException.class);
  }

  @Test
  void scratchCannotChangeATrailedTable() {
    assertThatThrownBy(() -> store.transactions().scratch(t -> add(t, "new")))
        .isInstanceOf(IllegalStateException.class);
  }

  @Test
  void scratchIsOutsideTheTrail() {
    story.setUp();
    long run = story.startRun(Story.NOON);
    int before = entries().size();
    store
        .transactions()
        .scratch(
            t -> {
              store.runs().keepScratch(t, run, new Scratch("100 g", "1", Story.NOON));
              return true;
            });
    assertThat(entries()).hasSize(before);
  }

  @Test
  void changeMayRemoveAScratchWithItsReading() {
    story.setUp();
    long run = story.startRun(Story.NOON);
    story.does(
        UseCase.ENTER_READING,
        t -> store.runs().keepScratch(t, run, new Scratch("100 g", "1", Story.NOON)));
    List<Scratch> scratches = story.read(t -> store.runs().scratches(t, run));
    assertThat(scratches).hasSize(1);
  }

  @Test
  void changeInsideAChangeIsRefused() {
    assertThatThrownBy(
            () -> story.does(UseCase.ADD_PERSON, t -> story.does(UseCase.ADD_PERSON, u -> {})))
        .isInstanceOf(IllegalStateException.class);
    assertThat(entries()).isEmpty();
  }

  @Test
  void transactionIsOfNoUseOnceItIsOver() {
    AtomicReference<Transaction> kept = new AtomicReference<>();
    story.does(UseCase.ADD_PERSON, kept::set);
    assertThatThrownBy(() -> store.people().all(kept.get()))
        .isInstanceOf(IllegalStateException.class);
  }

  @Test
  void transactionOfAnotherStoreIsRefused() {
    assertThatThrownBy(() -> store.people().all(new Transaction() {}))
        .isInstanceOf(IllegalArgumentException.class);
  }

  @Test
  void screensThreadIsRefused() {
    onScreen.set(true);
    assertThatThrownBy(() -> story.read(store.people()::all))
        .isInstanceOf(IllegalStateException.class)
        .hasMessageContaining("screen");
    assertThatThrownBy(() -> story.does(UseCase.ADD_PERSON, t -> {}))
        .isInstanceOf(IllegalStateException.class);
    assertThatThrownBy(() -> store.transactions().scratch(t -> true))
        .isInstanceOf(IllegalStateException.class);
    assertThatThrownBy(() -> store.inBulk(() -> {})).isInstanceOf(IllegalStateException.class);
  }

  @Test
  void readSeesOneViewWhileAnotherThreadChanges() throws Exception {
    ExecutorService other = Executors.newSingleThreadExecutor();
    try {
      story.does(UseCase.ADD_PERSON, t -> add(t, "first"));
      List<Integer> counts = new ArrayList<>();
      Callable<Object> change =
          () -> story.<Object>change(UseCase.ADD_PERSON, t -> add(t, "second"));
      story.read(
          t -> {
            counts.add(store.people().all(t).size());
            finish(other.submit(change));
            counts.add(store.people().all(t).size());
            return counts;
          });
      assertThat(counts).containsExactly(1, 1);
      List<Person> people = story.read(store.people()::all);
      assertThat(people).hasSize(2);
    } finally {
      other.shutdownNow();
    }
  }

  @Test
  void changesOfManyThreadsFollowOneAnother() {
    ExecutorService threads = Executors.newFixedThreadPool(8);
    try {
      List<Future<Object>> done = new ArrayList<>();
      for (int number = 0; number < 80; number++) {
        String name = "person" + number;
        done.add(
            threads.submit(
                () -> {
                  story.read(store.people()::all);
                  return story.<Object>change(UseCase.ADD_PERSON, t -> add(t, name));
                }));
      }
      done.forEach(StoreTransactionsTest::finish);
    } finally {
      threads.shutdownNow();
    }
    assertThat(entries()).extracting(TrailEntry::number).hasSize(80).isSorted();
    List<Person> people = story.read(store.people()::all);
    assertThat(people).hasSize(80);
  }

  @Test
  void bulkWorkIsSealedChangeByChange() {
    store.inBulk(
        () -> {
          for (int number = 0; number < 20; number++) {
            String name = "person" + number;
            story.does(UseCase.ADD_PERSON, t -> add(t, name));
          }
        });
    assertThat(entries()).hasSize(20);
  }

  @Test
  void trailIsReadPageByPage() {
    for (int number = 0; number < 5; number++) {
      story.does(UseCase.ADD_PERSON, t -> {});
    }
    List<Long> page =
        story.read(
            t -> store.trail().after(t, 2, 2).stream().map(entry -> entry.number()).toList());
    assertThat(page).containsExactly(3L, 4L);
  }

  @Test
  void timeOfAnEntryIsKeptToTheMicrosecond() {
    Change change =
        new Change(
            Instant.parse("2026-03-02T11:00:00.999999999Z"),
            Optional.of(1L),
            UseCase.ADD_PERSON,
            Optional.empty());
    store.transactions().change(change, t -> true);
    assertThat(entries().get(0).at()).isEqualTo(Instant.parse("2026-03-02T11:00:00.999999Z"));
  }

  @Test
  void closedStoreSaysSo() {
    LogbookStore other = LogbookStore.openInMemory(() -> false);
    other.close();
    other.close();
    assertThatThrownBy(() -> other.transactions().read(t -> true))
        .isInstanceOf(IllegalStateException.class)
        .hasMessageContaining("closed");
  }

  private long add(Transaction transaction, String name) {
    return store.people().add(transaction, new NewPerson(name, name, Role.AUDITOR));
  }

  private List<TrailEntry> entries() {
    return story.read(
        t ->
            store.trail().after(t, 0, 1000).stream()
                .map(entry -> EntryReader.read(entry.canonical()))
                .toList());
  }

  private static void finish(Future<Object> future) {
    try {
      future.get();
    } catch (ExecutionException | InterruptedException failed) {
      throw new AssertionError(failed);
    }
  }
}
