package org.evenbeam.store;

import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.nio.file.Path;
import java.sql.SQLException;
import java.util.Optional;
import org.evenbeam.verification.Verdict;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Nobody approves a run of their own, not even by SQL past the program. */
class ForgedApprovalTest {
  @TempDir static Path folder;
  private static LogbookStore store;
  private static long run;

  @BeforeAll
  static void submitARun() {
    store = LogbookStore.open(folder, () -> false);
    Story story = new Story(store).setUp();
    run = story.startRun(Story.NOON);
    story.submit(run, 2, Optional.of(Verdict.CONFORMS));
  }

  @AfterAll
  static void close() {
    store.close();
  }

  @ParameterizedTest
  @CsvSource({
    "id, person_id, RUN_EVENT_APPROVED_BY_ANOTHER",
    "id, null, RUN_EVENT_ANSWER_IS_WHOLE",
    "null, null, RUN_EVENT_ANSWER_WHERE_DUE",
    "id, person_id + 1, RUN_EVENT_ANSWERS",
    "id - 1, 1, RUN_EVENT_ANSWERS"
  })
  void submitterIsRefusedAsApprover(String event, String submitter, String constraint) {
    String sql =
        "insert into run_event (run, sequence, step, person_id, at, answers_event_id,"
            + " answers_person_id) select run, 3, 'APPROVED', person_id, at, %s, %s"
            + " from run_event where step = 'SUBMITTED' and run = %d";
    assertThatThrownBy(
            () -> new FolderStore(folder).byEveryday(sql.formatted(event, submitter, run)))
        .isInstanceOf(SQLException.class)
        .hasMessageContaining("\"" + constraint + ":");
  }
}
