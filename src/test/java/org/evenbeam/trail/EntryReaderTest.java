package org.evenbeam.trail;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class EntryReaderTest {
  private static final TrailEntry ENTRY =
      new TrailEntry(
          12,
          Entries.NOON,
          Optional.empty(),
          "reading \"corrected\"",
          Optional.of("\u2212 typed twice\n"),
          List.of(
              new RowChange(
                  "reading",
                  "4",
                  Optional.of(Map.of("typed", Cell.of("1,0"), "active", Cell.of(true))),
                  Optional.of(Map.of("typed", Cell.nothing(), "active", Cell.of(false)))),
              new RowChange("reading", "5", Optional.empty(), Optional.empty())),
          "ab".repeat(32));

  @Test
  void readsBackWhatWasSealed() {
    assertThat(EntryReader.read(CanonicalForm.seal(ENTRY).canonical())).isEqualTo(ENTRY);
  }

  @ParameterizedTest
  @ValueSource(
      strings = {
        "",
        "7",
        "{}",
        "not JSON",
        "{\"form\":\"2\"}",
        "{\"form\":1}",
        "{\"form\":\"1\",\"number\":\"x\"}",
        "{\"form\":\"1\",\"number\":1}"
      })
  void refusesWhatIsNoEntry(String text) {
    assertThatThrownBy(() -> EntryReader.read(text)).isInstanceOf(UnreadableEntry.class);
  }

  @ParameterizedTest
  @ValueSource(strings = {"number", "at", "person", "action", "reason", "changes", "previous"})
  void refusesAnEntryWithoutAMember(String member) {
    String canonical = CanonicalForm.seal(ENTRY).canonical();
    String without = canonical.replace("\"" + member + "\":", "\"other\":");
    assertThatThrownBy(() -> EntryReader.read(without))
        .isInstanceOf(UnreadableEntry.class)
        .hasMessageContaining(member);
  }

  @Test
  void refusesANumberInAColumn() {
    String canonical = CanonicalForm.seal(ENTRY).canonical().replace("\"1,0\"", "10");
    assertThatThrownBy(() -> EntryReader.read(canonical)).isInstanceOf(UnreadableEntry.class);
  }
}
