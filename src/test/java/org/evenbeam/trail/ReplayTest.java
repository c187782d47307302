package org.evenbeam.trail;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.evenbeam.trail.TrailFault.Kind;
import org.junit.jupiter.api.Test;

class ReplayTest {
  private final Replay replay = new Replay();

  @Test
  void addedRowsAreCompared() {
    take(Entries.added("1", Entries.row("20.0")), Entries.added("2", Entries.row("20.1")));
    Map<String, Map<String, Cell>> table =
        Map.of("1", Entries.row("20.0"), "2", Entries.row("20.1"));
    assertThat(replay.compare("reading", table)).isEmpty();
    assertThat(replay.tables()).containsExactly("reading");
  }

  @Test
  void rowThatNoEntryMadeIsUnknown() {
    assertThat(replay.compare("reading", Map.of("1", Entries.row("20.0"))))
        .contains(new TrailFault(Kind.ROW_UNKNOWN, 0, "reading", "1"));
  }

  @Test
  void rowThatIsGoneIsMissing() {
    take(Entries.added("1", Entries.row("20.0")));
    assertThat(replay.compare("reading", Map.of()))
        .contains(new TrailFault(Kind.ROW_MISSING, 1, "reading", "1"));
  }

  @Test
  void otherContentDiffers() {
    take(Entries.added("1", Entries.row("20.0")));
    assertThat(replay.compare("reading", Map.of("1", Entries.row("20.00"))))
        .contains(new TrailFault(Kind.ROW_DIFFERS, 1, "reading", "1"));
  }

  @Test
  void changedAndRemovedRowsFollow() {
    take(Entries.added("1", Entries.row("20.0")));
    take(change(Optional.of(Entries.row("20.0")), Optional.of(Entries.row("20.9"))));
    assertThat(replay.compare("reading", Map.of("1", Entries.row("20.9")))).isEmpty();
    take(change(Optional.of(Entries.row("20.9")), Optional.empty()));
    assertThat(replay.compare("reading", Map.of())).isEmpty();
  }

  @Test
  void changeFromAnotherRowThanTheEntriesLeftIsFound() {
    take(Entries.added("1", Entries.row("20.0")));
    assertThat(replay.next(entry(change(Optional.of(Entries.row("99")), Optional.empty()))))
        .contains(new TrailFault(Kind.BEFORE_DIFFERS, 1, "reading", "1"));
  }

  @Test
  void rowAddedTwiceIsFound() {
    take(Entries.added("1", Entries.row("20.0")));
    assertThat(replay.next(entry(Entries.added("1", Entries.row("20.0")))))
        .map(TrailFault::kind)
        .contains(Kind.BEFORE_DIFFERS);
  }

  @Test
  void columnOfALaterSchemaCountsAsEmptyInOlderEntries() {
    take(Entries.added("1", Entries.row("20.0")));
    Map<String, Cell> row = new HashMap<>(Entries.row("20.0"));
    row.put("later", Cell.nothing());
    assertThat(replay.compare("reading", Map.of("1", row))).isEmpty();
    row.put("later", Cell.of("filled in afterwards"));
    assertThat(replay.compare("reading", Map.of("1", row)))
        .map(TrailFault::kind)
        .contains(Kind.ROW_DIFFERS);
  }

  private void take(RowChange... changes) {
    assertThat(replay.next(entry(changes))).isEmpty();
  }

  private static TrailEntry entry(RowChange... changes) {
    return Entries.entry(1, TrailEntry.NO_PREVIOUS, List.of(changes));
  }

  private static RowChange change(
      Optional<Map<String, Cell>> before, Optional<Map<String, Cell>> after) {
    return new RowChange("reading", "1", before, after);
  }
}
