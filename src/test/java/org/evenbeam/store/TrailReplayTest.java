package org.evenbeam.store;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.sql.SQLException;
import java.util.List;
import java.util.Optional;
import org.evenbeam.logbook.UseCase;
import org.evenbeam.store.rows.OpenTransaction;
import org.evenbeam.store.rows.Row;
import org.evenbeam.store.rows.TrailedTable;
import org.evenbeam.trail.EntryReader;
import org.evenbeam.trail.SealedEntry;
import org.evenbeam.trail.Sha256;
import org.evenbeam.trail.TrailEntry;
import org.evenbeam.trail.TrailFault;
import org.evenbeam.trail.TrailFault.Kind;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;

class TrailReplayTest {
  @TempDir Path folder;
  private Story story;
  private LogbookStore store;
  private FolderStore database;

  @BeforeEach
  void open() {
    store = LogbookStore.open(folder, () -> false);
    story = new Story(store).whole();
    database = new FolderStore(folder);
  }

  @AfterEach
  void close() {
    store.close();
  }

  @Test
  void entriesOfTheWholeStoryMakeEveryTableAgain() {
    assertThat(TrailAndTables.check(store)).isEmpty();
  }

  @ParameterizedTest
  @EnumSource(TrailedTable.class)
  void storyTouchesEveryTable(TrailedTable table) {
    int rows = story.<Integer>read(t -> TrailAndTables.rows(t, table).size());
    assertThat(rows).isPositive();
  }

  @Test
  void changedRowIsInTheTrailBeforeAndAfter() {
    story.does(
        UseCase.RECORD_INSTRUMENT_EVENT,
        t ->
            OpenTransaction.rows(t)
                .update(1, 1, Row.of(TrailedTable.INSTRUMENT).with("location", "room 9")));
    TrailEntry entry = lastEntry();
    assertThat(entry.changes()).hasSize(1);
    assertThat(entry.changes().get(0).before().orElseThrow().get("location").text())
        .contains("room 2");
    assertThat(entry.changes().get(0).after().orElseThrow().get("location").text())
        .contains("room 9");
    assertThat(entry.changes().get(0).after().orElseThrow().get("version").text()).contains("2");
    assertThat(TrailAndTables.check(store)).isEmpty();
  }

  @Test
  void passwordHashIsInTheTrailByItsSha256Only() {
    List<SealedEntry> entries = story.read(t -> store.trail().after(t, 0, 100));
    assertThat(entries).noneMatch(entry -> entry.canonical().contains("argon2id"));
    assertThat(entries.get(0).canonical())
        .contains("sha256:" + Sha256.hex("$argon2id$v=19$one".getBytes(StandardCharsets.UTF_8)));
  }

  @Test
  void entrySaysWhoWhenWhatAndWhy() {
    TrailEntry entry =
        EntryReader.read(story.read(t -> store.trail().after(t, 1, 1)).get(0).canonical());
    assertThat(entry.number()).isEqualTo(2);
    assertThat(entry.at()).isEqualTo(Story.NOON);
    assertThat(entry.person()).contains("1");
    assertThat(entry.action()).isEqualTo("person added");
    assertThat(entry.reason()).isEmpty();
    assertThat(entry.changes())
        .extracting(change -> change.table())
        .containsExactly("person", "person");
  }

  @Test
  void rowAddedPastTheProgramIsFound() throws SQLException {
    database.byEveryday(
        "insert into person (version, sign_in_name, name, role, active)"
            + " values (1, 'ghost', 'Ghost', 'MANAGER', true)");
    assertThat(found()).contains(Kind.ROW_UNKNOWN);
  }

  @Test
  void columnChangedPastTheProgramIsFound() throws SQLException {
    database.byEveryday("update instrument set resolution = '0.001'");
    assertThat(found()).contains(Kind.ROW_DIFFERS);
  }

  @Test
  void readingRewrittenByTheOwnerWithoutItsGuardIsFound() throws SQLException {
    database.byOwner("drop trigger reading_append_only");
    database.byOwner("update reading set typed = '100,0001' where id = 1");
    assertThat(TrailAndTables.check(store))
        .hasValueSatisfying(
            fault -> {
              assertThat(fault.kind()).isEqualTo(Kind.ROW_DIFFERS);
              assertThat(fault.table()).isEqualTo("reading");
              assertThat(fault.key()).isEqualTo("1");
            });
  }

  @Test
  void documentRewrittenByTheOwnerWithoutItsGuardIsFound() throws SQLException {
    database.byOwner("drop trigger certificate_document_append_only");
    database.byOwner("update certificate_document set bytes = X'00'");
    assertThat(found()).contains(Kind.ROW_DIFFERS);
  }

  @Test
  void rowRemovedByTheOwnerWithoutItsGuardIsFound() throws SQLException {
    database.byOwner("drop trigger reading_strike_append_only");
    database.byOwner("delete from reading_strike");
    assertThat(found()).contains(Kind.ROW_MISSING);
  }

  @Test
  void lastEntryRemovedByTheOwnerWithoutItsGuardIsFound() throws SQLException {
    database.byOwner("drop trigger trail_entry_append_only");
    database.byOwner("delete from trail_entry where number = (select number from chain_head)");
    assertThat(found()).contains(Kind.HEAD_DIFFERS);
  }

  private Optional<Kind> found() {
    return TrailAndTables.check(store).map(TrailFault::kind);
  }

  private TrailEntry lastEntry() {
    long last = story.<Long>read(t -> store.trail().head(t).number());
    return EntryReader.read(
        story.read(t -> store.trail().after(t, last - 1, 1)).get(0).canonical());
  }
}
