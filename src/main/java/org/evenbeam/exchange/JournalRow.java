package org.evenbeam.exchange;

import java.nio.file.Path;
import java.time.Instant;
import java.time.format.DateTimeParseException;
import java.util.List;
import org.evenbeam.logbook.files.BadInput;

/**
 * One thing that somebody did, from the journal of a laboratory's import.
 *
 * @param row the row, for its cells and its place
 * @param at when it was done
 * @param action what was done
 */
record JournalRow(TableRow row, Instant at, Action action) {
  private static final List<String> HEADER =
      List.of(
          "at",
          "person",
          "action",
          "run",
          "instrument",
          "plan",
          "kind",
          "check_point",
          "position",
          "text",
          "reason");

  /** What can be done in a journal. */
  enum Action {
    START,
    CONDITIONS,
    ENTER,
    CORRECT,
    STRIKE,
    SUBMIT,
    SUBMIT_WITHOUT_VERDICT,
    APPROVE,
    GIVE_BACK,
    TAKE_UP,
    ABANDON,
    ISSUE,
    EVENT,
    STOP,
    RELEASE
  }

  /** Reads the journal, in the file's order. */
  static List<JournalRow> read(Path file) {
    return TableFile.read(file, HEADER).stream()
        .map(
            row ->
                new JournalRow(
                    row, time(row), LaboratoryTables.constant(row, "action", Action.class)))
        .toList();
  }

  private static Instant time(TableRow row) {
    try {
      return Instant.parse(row.text("at"));
    } catch (DateTimeParseException notATime) {
      throw BadInput.range(row.place("at"), row.text("at"), "2026-02-11T08:30:00Z");
    }
  }
}
