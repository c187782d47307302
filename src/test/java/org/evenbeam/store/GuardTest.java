package org.evenbeam.store;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.nio.file.Path;
import java.sql.SQLException;
import java.util.EnumSet;
import java.util.Set;
import org.assertj.core.api.ThrowableAssert.ThrowingCallable;
import org.evenbeam.store.rows.TrailedTable;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;

/** What neither the everyday user nor the owner can do to a laboratory with a whole story. */
class GuardTest {
  private static final Set<TrailedTable> MAY_CHANGE =
      EnumSet.of(
          TrailedTable.LABORATORY,
          TrailedTable.PERSON,
          TrailedTable.INSTRUMENT,
          TrailedTable.REFERENCE_STANDARD);

  @TempDir static Path folder;
  private static LogbookStore store;
  private static FolderStore database;

  @BeforeAll
  static void open() {
    store = LogbookStore.open(folder, () -> false);
    new Story(store).whole();
    database = new FolderStore(folder);
  }

  @AfterAll
  static void everythingIsAsItWas() {
    assertThat(TrailAndTables.check(store)).isEmpty();
    store.close();
  }

  static Set<TrailedTable> guarded() {
    return EnumSet.complementOf(EnumSet.copyOf(MAY_CHANGE));
  }

  @ParameterizedTest
  @MethodSource("guarded")
  void ownerCannotUpdateAGuardedTable(TrailedTable table) {
    String same = table.key() + " = " + table.key();
    refused("45000", () -> database.byOwner("update " + table.sqlName() + " set " + same));
  }

  @ParameterizedTest
  @EnumSource(TrailedTable.class)
  void ownerCannotDeleteFromATrailedTable(TrailedTable table) {
    refused("45000", () -> database.byOwner("delete from " + table.sqlName()));
  }

  @ParameterizedTest
  @EnumSource(TrailedTable.class)
  void ownerCannotTruncateATrailedTable(TrailedTable table) {
    refused("90106", () -> database.byOwner("truncate table " + table.sqlName()));
  }

  @ParameterizedTest
  @ValueSource(
      strings = {
        "update trail_entry set form = form",
        "delete from trail_entry",
        "delete from chain_head"
      })
  void ownerCannotChangeTheTrail(String sql) {
    refused("45000", () -> database.byOwner(sql));
  }

  @ParameterizedTest
  @ValueSource(strings = {"truncate table trail_entry", "truncate table chain_head"})
  void ownerCannotTruncateTheTrail(String sql) {
    refused("90106", () -> database.byOwner(sql));
  }

  @ParameterizedTest
  @MethodSource("guarded")
  void everydayUserHasNoRightToUpdateAGuardedTable(TrailedTable table) {
    String same = table.key() + " = " + table.key();
    refused("90096", () -> database.byEveryday("update " + table.sqlName() + " set " + same));
  }

  @ParameterizedTest
  @EnumSource(TrailedTable.class)
  void everydayUserHasNoRightToDelete(TrailedTable table) {
    refused("90096", () -> database.byEveryday("delete from " + table.sqlName()));
  }

  @ParameterizedTest
  @EnumSource(TrailedTable.class)
  void everydayUserHasNoRightToDrop(TrailedTable table) {
    refused("90096", () -> database.byEveryday("drop table " + table.sqlName() + " cascade"));
  }

  @ParameterizedTest
  @ValueSource(
      strings = {
        "update trail_entry set form = form",
        "delete from trail_entry",
        "delete from chain_head",
        "insert into chain_head (id, number, hash) values (1, 0, '0')",
        "drop trigger reading_append_only",
        "alter table reading drop constraint reading_corrected_once",
        "select * from \"schema_history\"",
      })
  void everydayUserHasNoRightToTheTrailOrTheSchema(String sql) {
    refused("90096", () -> database.byEveryday(sql));
  }

  @ParameterizedTest
  @ValueSource(
      strings = {
        "create user intruder password '1' admin",
        "alter user EVENBEAM_OWNER set password '1'",
        "backup to 'copy.zip'",
        "script to 'copy.sql'",
        "set write_delay 500",
        "set referential_integrity false",
        "shutdown"
      })
  void everydayUserIsNoAdministrator(String sql) {
    refused("90040", () -> database.byEveryday(sql));
  }

  @Test
  void everydayUserMayReadAndAdd() throws SQLException {
    assertThat(database.byEveryday("update instrument set version = version")).isOne();
  }

  private static void refused(String state, ThrowingCallable work) {
    assertThatThrownBy(work)
        .isInstanceOfSatisfying(
            SQLException.class, refusal -> assertThat(refusal.getSQLState()).isEqualTo(state));
  }
}
