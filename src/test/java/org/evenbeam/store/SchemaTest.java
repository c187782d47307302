package org.evenbeam.store;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.file.Path;
import java.sql.Connection;
import java.sql.ResultSet;
import java.sql.SQLException;
import java.sql.Statement;
import java.util.Arrays;
import java.util.List;
import java.util.Locale;
import java.util.Set;
import java.util.TreeSet;
import java.util.stream.Collectors;
import org.evenbeam.store.rows.TrailedTable;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** What every migration has to keep to. */
class SchemaTest {
  private static final Set<String> OUTSIDE_THE_TRAIL =
      Set.of("trail_entry", "chain_head", "scratch", "schema_history");
  private static final Set<String> MAY_CHANGE =
      Set.of("laboratory", "person", "instrument", "reference_standard", "chain_head");

  @TempDir static Path folder;
  private static LogbookStore store;
  private static Connection owner;

  @BeforeAll
  static void open() throws SQLException {
    store = LogbookStore.open(folder, () -> false);
    owner = new FolderStore(folder).owner();
  }

  @AfterAll
  static void close() throws SQLException {
    owner.close();
    store.close();
  }

  @Test
  void everyTableIsTrailedButFour() throws SQLException {
    Set<String> expected =
        Arrays.stream(TrailedTable.values())
            .map(TrailedTable::sqlName)
            .collect(Collectors.toCollection(TreeSet::new));
    expected.addAll(OUTSIDE_THE_TRAIL);
    assertThat(tables()).containsExactlyElementsOf(expected);
  }

  @Test
  void everyConstraintHasAName() throws SQLException {
    assertThat(
            texts(
                "select constraint_name from information_schema.table_constraints"
                    + " where table_schema = 'PUBLIC' and table_name <> 'schema_history'"))
        .isNotEmpty()
        .noneMatch(name -> name.startsWith("constraint_"));
  }

  @Test
  void columnsHaveOnlyTypesThatPostgresqlHasToo() throws SQLException {
    assertThat(
            texts(
                "select distinct data_type from information_schema.columns"
                    + " where table_schema = 'PUBLIC' and table_name <> 'schema_history'"))
        .containsExactlyInAnyOrder(
            "bigint",
            "integer",
            "boolean",
            "character varying",
            "date",
            "timestamp with time zone",
            "binary varying",
            "binary large object");
  }

  @Test
  void timesAreKeptToTheMicrosecond() throws SQLException {
    assertThat(
            texts(
                "select distinct datetime_precision from information_schema.columns"
                    + " where table_schema = 'PUBLIC' and table_name <> 'schema_history'"
                    + " and data_type = 'TIMESTAMP WITH TIME ZONE'"))
        .containsExactly("6");
  }

  @Test
  void everyTableButScratchRefusesToLoseRows() throws SQLException {
    Set<String> expected = new TreeSet<>(tables());
    expected.removeAll(Set.of("scratch", "schema_history"));
    assertThat(
            texts(
                "select event_object_table from information_schema.triggers"
                    + " where event_manipulation = 'DELETE'"))
        .containsExactlyInAnyOrderElementsOf(expected);
  }

  @Test
  void everyTableButTheFewThatMayChangeRefusesUpdates() throws SQLException {
    Set<String> expected = new TreeSet<>(tables());
    expected.removeAll(Set.of("scratch", "schema_history"));
    expected.removeAll(MAY_CHANGE);
    assertThat(
            texts(
                "select event_object_table from information_schema.triggers"
                    + " where event_manipulation = 'UPDATE'"))
        .containsExactlyInAnyOrderElementsOf(expected);
  }

  @Test
  void everydayUserHasTheRightsThatAreMeantAndNoOthers() throws SQLException {
    Set<String> expected =
        tables().stream()
            .filter(table -> !"schema_history".equals(table))
            .flatMap(table -> rights(table).stream().map(right -> table + " " + right))
            .collect(Collectors.toCollection(TreeSet::new));
    assertThat(
            texts(
                "select table_name || ' ' || privilege_type from information_schema.table_privileges"
                    + " where grantee = 'EVERYDAY'"))
        .containsExactlyInAnyOrderElementsOf(expected);
  }

  private static List<String> rights(String table) {
    return switch (table) {
      case "scratch" -> List.of("select", "insert", "update", "delete");
      case "chain_head" -> List.of("select", "update");
      case "laboratory", "person", "instrument", "reference_standard" ->
          List.of("select", "insert", "update");
      default -> List.of("select", "insert");
    };
  }

  private static Set<String> tables() throws SQLException {
    return texts(
        "select table_name from information_schema.tables where table_schema = 'PUBLIC'"
            + " and table_type = 'BASE TABLE'");
  }

  private static Set<String> texts(String sql) throws SQLException {
    Set<String> texts = new TreeSet<>();
    try (Statement statement = owner.createStatement();
        ResultSet rows = statement.executeQuery(sql)) {
      while (rows.next()) {
        texts.add(rows.getString(1).toLowerCase(Locale.ROOT));
      }
    }
    return texts;
  }
}
