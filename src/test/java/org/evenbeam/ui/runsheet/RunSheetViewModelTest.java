package org.evenbeam.ui.runsheet;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayList;
import java.util.List;
import java.util.function.Consumer;
import java.util.function.Supplier;
import org.evenbeam.logbook.Session;
import org.evenbeam.logbook.StoreFailed;
import org.evenbeam.logbook.run.RunState;
import org.evenbeam.logbook.run.SheetCheckPoint;
import org.evenbeam.ui.TestLaboratory;
import org.evenbeam.ui.common.Background;
import org.evenbeam.verification.Condition;
import org.evenbeam.verification.Verdict;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;

class RunSheetViewModelTest {
  private static TestLaboratory laboratory;
  private Session technician;
  private long run;
  private RunSheetViewModel sheet;

  @BeforeAll
  static void openLaboratory() {
    laboratory = new TestLaboratory();
  }

  @AfterAll
  static void closeLaboratory() {
    laboratory.close();
  }

  @BeforeEach
  void open() {
    technician = laboratory.technician();
    run = laboratory.newRun(technician);
    sheet = sheet(technician, Background.direct());
    sheet.load();
  }

  private RunSheetViewModel sheet(Session session, Background background) {
    return new RunSheetViewModel(
        laboratory.logbook(), session, background, laboratory.texts(), run);
  }

  @Test
  void aTypedReadingIsTakenAndMarkedKept() {
    type("50.0001");
    assertThat(sheet.typed().get()).isEmpty();
    assertThat(sheet.lines())
        .singleElement()
        .matches(line -> line.text().equals("50.0001"))
        .matches(line -> line.state() == ReadingLine.State.COUNTS);
    assertThat(sheet.kept().get()).startsWith("Draft kept at ");
    assertThat(kept().counting()).hasSize(1);
  }

  @Test
  void aReadingIsOnItsWayUntilTheSaveReturns() {
    Held held = new Held();
    RunSheetViewModel slow = sheet(technician, held);
    slow.load();
    held.releaseAll();
    slow.typed().set("50.0001");
    slow.enter();
    assertThat(slow.lines())
        .extracting(ReadingLine::state)
        .containsExactly(ReadingLine.State.ON_ITS_WAY);
    held.releaseAll();
    assertThat(slow.lines())
        .extracting(ReadingLine::state)
        .containsExactly(ReadingLine.State.COUNTS);
  }

  @Test
  void aReadingThatCannotBeKeptGoesBackIntoItsField() {
    Held held = new Held();
    RunSheetViewModel slow = sheet(technician, held);
    slow.load();
    held.releaseAll();
    slow.typed().set("50.0001");
    slow.enter();
    held.failAll();
    assertThat(slow.lines()).isEmpty();
    assertThat(slow.typed().get()).isEqualTo("50.0001");
    assertThat(slow.problem().get()).contains("The disk is full");
  }

  @Test
  void whatIsNoNumberStaysToBeMended() {
    type("50,0001");
    assertThat(sheet.typed().get()).isEqualTo("50,0001");
    assertThat(sheet.problem().get()).contains("\"50,0001\" was not taken");
    assertThat(kept().readings()).isEmpty();
  }

  @Test
  void pastingIsAllOrNothingAndNamesTheLine() {
    sheet.paste("50.0001\n50.0002\nx50\n");
    assertThat(sheet.problem().get()).contains("Line 3", "None of the pasted lines");
    assertThat(kept().readings()).isEmpty();
    sheet.paste("50.0001\n50.0002\n");
    assertThat(sheet.problem().get()).isEmpty();
    assertThat(kept().counting()).hasSize(2);
  }

  @Test
  void whatWasBeingTypedIsOfferedAgain() {
    sheet.typed().set("50.00");
    RunSheetViewModel reopened = sheet(technician, Background.direct());
    reopened.load();
    assertThat(reopened.typed().get()).isEqualTo("50.00");
    assertThat(reopened.kept().get()).startsWith("Taken up from what was typed at ");
  }

  @Test
  void anEnteredReadingLeavesNoScratch() {
    sheet.typed().set("50.0001");
    sheet.enter();
    RunSheetViewModel reopened = sheet(technician, Background.direct());
    reopened.load();
    assertThat(reopened.typed().get()).isEmpty();
    assertThat(reopened.kept().get()).isEmpty();
  }

  @Test
  void aSaveThatWaitedDoesNotBringBackWhatWasEntered() {
    Held held = new Held();
    RunSheetViewModel slow = sheet(technician, held);
    slow.load();
    held.releaseAll();
    slow.typed().set("5");
    slow.typed().set("50.0001");
    slow.enter();
    held.releaseAll();
    RunSheetViewModel reopened = sheet(technician, Background.direct());
    reopened.load();
    assertThat(reopened.lines()).hasSize(1);
    assertThat(reopened.typed().get()).isEmpty();
  }

  @Test
  void whatIsTypedStaysWithItsCheckPoint() {
    sheet.typed().set("50.00");
    sheet.select("100 g");
    assertThat(sheet.typed().get()).isEmpty();
    sheet.select("50 g");
    assertThat(sheet.typed().get()).isEqualTo("50.00");
  }

  @Test
  void picturesFormWithAWholeNumberBeingTypedButFindingsDoNot() {
    type("50.0001");
    sheet.typed().set("50.0");
    assertThat(sheet.picture().get().readings()).hasSize(1);
    sheet.typed().set("50.0003");
    assertThat(sheet.picture().get().readings()).hasSize(2);
    assertThat(sheet.picture().get().withTyped()).isTrue();
    assertThat(sheet.notes()).anyMatch(note -> note.startsWith("9 of 10 readings to go"));
  }

  @Test
  void thereIsNoVerdictBeforeThePlannedReadingsAreIn() {
    for (int i = 0; i < 9; i++) {
      type("50.0000");
    }
    assertThat(tab("50 g").verdict()).isEmpty();
    assertThat(sheet.findings()).allMatch(sentence -> sentence.startsWith("So far"));
    type("50.0001");
    assertThat(tab("50 g").verdict()).contains(Verdict.CONFORMS);
    type("50.0001");
    assertThat(sheet.problem().get()).contains("has all its 10 readings");
  }

  @Test
  void enterWithNothingTypedGoesToTheNextCheckPoint() {
    fill("50.0000");
    sheet.enter();
    assertThat(sheet.selected().get()).isEqualTo("100 g");
  }

  @Test
  void struckAndCorrectedReadingsStayVisible() {
    type("50.0001");
    type("50.0100");
    List<String> refusals = new ArrayList<>();
    sheet.strike(sheet.lines().get(0), " ", () -> {}, refusals::add);
    assertThat(refusals).singleElement().asString().contains("A reason in words is needed");
    sheet.strike(sheet.lines().get(0), "draught", () -> {}, refusals::add);
    sheet.correct(sheet.lines().get(1), "50.0010", "digits swapped", () -> {}, refusals::add);
    assertThat(sheet.lines())
        .extracting(ReadingLine::state)
        .containsExactly(
            ReadingLine.State.STRUCK, ReadingLine.State.CORRECTED, ReadingLine.State.COUNTS);
    assertThat(sheet.lines().get(0).remark()).isEqualTo("struck: draught");
    assertThat(refusals).hasSize(1);
  }

  @Test
  void conditionsAreRecordedWhenTheyChange() {
    sheet.conditions().typed(Condition.TEMPERATURE).set("20.6");
    sheet.conditions().commit();
    assertThat(read().conditions().temperature().orElseThrow().text()).isEqualTo("20.6");
    sheet.conditions().typed(Condition.TEMPERATURE).set("20,7");
    sheet.conditions().commit();
    assertThat(sheet.conditions().problem().get()).contains("\"20,7\" was not recorded");
    assertThat(read().conditions().temperature().orElseThrow().text()).isEqualTo("20.6");
  }

  @Test
  void aRunWithoutAVerdictIsSubmittedOnlyAsOne() {
    type("50.0001");
    List<String> refusals = new ArrayList<>();
    sheet.submit(TestLaboratory.TECHNICIANS_PASSWORD, false, () -> {}, refusals::add);
    assertThat(refusals).singleElement().asString().contains("no verdict yet");
    assertThat(sheet.readOnly().get()).isFalse();
    sheet.submit(TestLaboratory.TECHNICIANS_PASSWORD, true, () -> {}, refusals::add);
    assertThat(sheet.readOnly().get()).isTrue();
    assertThat(sheet.state().get().open().state()).isEqualTo(RunState.SUBMITTED);
  }

  @Test
  void aWrongPasswordSignsNothing() {
    type("50.0001");
    List<String> refusals = new ArrayList<>();
    sheet.submit("neverwater", true, () -> {}, refusals::add);
    assertThat(refusals).singleElement().asString().contains("not your password");
    assertThat(sheet.state().get().open().state()).isEqualTo(RunState.DRAFT);
  }

  @Test
  void somebodyElsesRunIsReadOnly() {
    RunSheetViewModel managers = sheet(laboratory.manager(), Background.direct());
    managers.load();
    assertThat(managers.readOnly().get()).isTrue();
    managers.typed().set("50.0001");
    managers.enter();
    assertThat(kept().readings()).isEmpty();
  }

  @Test
  void itSaysWhatTheCheckCouldMiss() {
    assertThat(sheet.risks()).anyMatch(said -> said.startsWith("With 10 readings, a bias of"));
  }

  private void type(String text) {
    sheet.typed().set(text);
    sheet.enter();
  }

  private void fill(String text) {
    for (int i = 0; i < 10; i++) {
      type(text);
    }
  }

  private PointTab tab(String label) {
    return sheet.tabs().stream().filter(tab -> tab.label().equals(label)).findFirst().get();
  }

  private org.evenbeam.logbook.run.RunSheet read() {
    return laboratory.logbook().runs().open(technician, run).sheet();
  }

  private SheetCheckPoint kept() {
    return read().checkPoint("50 g").orElseThrow();
  }

  /** Work that waits until it is let go, or told to fail. */
  private static final class Held implements Background {
    private final List<Runnable> waiting = new ArrayList<>();
    private final List<Runnable> failing = new ArrayList<>();

    @Override
    public <T> void run(Supplier<T> work, Consumer<T> done, Consumer<Throwable> failed) {
      waiting.add(() -> done.accept(work.get()));
      failing.add(
          () ->
              failed.accept(
                  new StoreFailed(
                      StoreFailed.Reason.DISK_FULL,
                      java.nio.file.Path.of("memory"),
                      "no room",
                      null)));
    }

    void releaseAll() {
      while (!waiting.isEmpty()) {
        failing.remove(0);
        waiting.remove(0).run();
      }
    }

    void failAll() {
      waiting.clear();
      List<Runnable> now = List.copyOf(failing);
      failing.clear();
      now.forEach(Runnable::run);
    }
  }
}
