package org.evenbeam.store;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.junit.jupiter.params.provider.Arguments.arguments;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.Consumer;
import java.util.stream.Stream;
import org.assertj.core.api.ThrowableAssert.ThrowingCallable;
import org.evenbeam.logbook.AlreadyThere;
import org.evenbeam.logbook.NotFound;
import org.evenbeam.logbook.NotFound.Thing;
import org.evenbeam.logbook.Role;
import org.evenbeam.logbook.StoreFailed;
import org.evenbeam.logbook.StoreFailed.Reason;
import org.evenbeam.logbook.Transaction;
import org.evenbeam.logbook.UseCase;
import org.evenbeam.logbook.people.NewPerson;
import org.evenbeam.logbook.people.PasswordHash;
import org.evenbeam.logbook.run.Reading;
import org.evenbeam.logbook.run.Run;
import org.evenbeam.logbook.run.RunKind;
import org.evenbeam.logbook.run.RunState;
import org.evenbeam.logbook.run.RunStep;
import org.evenbeam.logbook.run.Signature;
import org.evenbeam.store.rows.OpenTransaction;
import org.evenbeam.store.rows.Row;
import org.evenbeam.store.rows.TrailedTable;
import org.evenbeam.trail.Cell;
import org.evenbeam.verification.Verdict;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;

/** What the database refuses, and that nothing of it is then kept. */
class RefusalTest {
  private final Story story = Story.inMemory().whole();
  private final LogbookStore store = story.store;

  @AfterEach
  void nothingHalfIsKeptAndTheStoreGoesOn() {
    story.does(
        UseCase.ADD_PERSON,
        t -> store.people().add(t, new NewPerson("late", "Late Comer", Role.AUDITOR)));
    assertThat(TrailAndTables.check(store)).isEmpty();
    store.close();
  }

  static Stream<Arguments> taken() {
    return Stream.of(
        taken(
            Thing.LABORATORY,
            "Tidewater Laboratory",
            s -> t -> s.store.laboratory().add(t, Story.LABORATORY)),
        taken(
            Thing.PERSON,
            "tam",
            s -> t -> s.store.people().add(t, new NewPerson("tam", "Other", Role.AUDITOR))),
        taken(Thing.INSTRUMENT, "BAL-01", s -> t -> s.store.instruments().add(t, Story.INSTRUMENT)),
        taken(Thing.STANDARD, "W-100", s -> t -> s.store.standards().add(t, Story.STANDARD)),
        taken(
            Thing.STANDARD_CERTIFICATE,
            "C-2025-118",
            s -> t -> s.store.standards().addCertificate(t, Story.WEIGHT, Story.CERTIFICATE)),
        taken(Thing.PLAN, "Monthly check 1", s -> t -> s.store.plans().add(t, Story.PLAN)),
        taken(
            Thing.READING,
            "file 7a line 3",
            s ->
                t ->
                    s.store.runs().addReading(t, 1, s.captured("50 g", 3, "50", "file 7a line 3"))),
        taken(
            Thing.CERTIFICATE,
            "2026-00001",
            s -> t -> s.store.certificates().add(t, s.certificate("2026-00001", 1, 3))),
        taken(
            Thing.CERTIFICATE,
            "2026-00001",
            s ->
                t -> s.store.certificates().addDocument(t, "2026-00001", new byte[1], Story.NOON)));
  }

  private static Arguments taken(Thing thing, String name, Work work) {
    return arguments(thing, name, work);
  }

  @ParameterizedTest
  @MethodSource("taken")
  void whatIsTakenIsNamed(Thing thing, String name, Work work) {
    Map<String, Map<String, Cell>> before = people();
    assertThatThrownBy(
            () ->
                story.does(
                    UseCase.ADD_PERSON,
                    t -> {
                      store.people().add(t, new NewPerson("half", "Half", Role.AUDITOR));
                      work.on(story).accept(t);
                    }))
        .isInstanceOfSatisfying(
            AlreadyThere.class,
            refusal -> assertThat(refusal.arguments()).containsExactly(thing, name));
    assertThat(people()).isEqualTo(before);
  }

  @Test
  void sameSequenceTwiceIsAChangeMeanwhile() {
    long run = story.startRun(Story.NOON);
    story.submit(run, 2, Optional.empty());
    refused(Reason.CHANGED_MEANWHILE, () -> story.submit(run, 2, Optional.empty()));
  }

  @Test
  void ofTwoAnswersToOneSubmissionOneWins() {
    long run = story.startRun(Story.NOON);
    long submission = story.submit(run, 2, Optional.of(Verdict.CONFORMS));
    story.approve(run, 3, submission, story.manager);
    refused(Reason.CHANGED_MEANWHILE, () -> story.approve(run, 4, submission, story.otherManager));
    assertThat(story.read(t -> store.runs().events(t, run)).get(2).personId())
        .isEqualTo(story.manager);
  }

  @Test
  void readingIsCorrectedOnce() {
    long run = story.startRun(Story.NOON);
    long reading = story.enter(run, story.reading("100 g", 1, "100"));
    story.enter(run, story.correctionOf(reading, "100 g", 1, "101"));
    refused(
        Reason.CHANGED_MEANWHILE,
        () -> story.enter(run, story.correctionOf(reading, "100 g", 1, "102")));
  }

  @Test
  void readingIsStruckOnce() {
    Reading.Strike strike = new Reading.Strike("bubble", Story.NOON, story.technician);
    refused(
        Reason.CHANGED_MEANWHILE,
        () -> story.does(UseCase.STRIKE_READING, t -> store.runs().addStrike(t, 3, strike)));
  }

  @Test
  void stepIsSignedOnce() {
    refused(
        Reason.CHANGED_MEANWHILE,
        () -> story.does(UseCase.APPROVE_RUN, t -> sign(t, 3, story.manager)));
  }

  @Test
  void stepIsSignedByWhoDidItOnly() {
    long run = story.startRun(Story.NOON);
    refused(
        Reason.RULE_BROKEN,
        () ->
            story.does(
                UseCase.SUBMIT_RUN,
                t ->
                    sign(
                        t,
                        story.event(
                            t, run, 2, RunStep.SUBMITTED, story.technician, Optional.empty()),
                        story.manager)));
  }

  @Test
  void nobodyApprovesARunThatTheySubmitted() {
    long run = story.startRun(Story.NOON);
    long submission = story.submit(run, 2, Optional.of(Verdict.CONFORMS));
    refused(Reason.RULE_BROKEN, () -> story.approve(run, 3, submission, story.technician));
    assertThat(story.read(t -> store.runs().inState(t, RunState.SUBMITTED)).get(0).number())
        .isEqualTo(run);
  }

  @Test
  void approvalAnswersASubmissionAndNoOtherStep() {
    long run = story.startRun(Story.NOON);
    long started = story.read(t -> store.runs().events(t, run)).get(0).id();
    refused(Reason.RULE_BROKEN, () -> story.approve(run, 2, started, story.manager));
  }

  @Test
  void approvalAnswersASubmissionOfTheSameRun() {
    long other = story.startRun(Story.NOON);
    long submission = story.submit(other, 2, Optional.of(Verdict.CONFORMS));
    long run = story.startRun(Story.NOON);
    refused(Reason.RULE_BROKEN, () -> story.approve(run, 2, submission, story.manager));
  }

  @Test
  void correctionStaysAtItsReadingsPlace() {
    long run = story.startRun(Story.NOON);
    long reading = story.enter(run, story.reading("100 g", 1, "100"));
    refused(
        Reason.RULE_BROKEN, () -> story.enter(run, story.correctionOf(reading, "100 g", 2, "101")));
    refused(
        Reason.RULE_BROKEN, () -> story.enter(run, story.correctionOf(reading, "50 g", 1, "101")));
    long other = story.startRun(Story.NOON);
    refused(
        Reason.RULE_BROKEN,
        () -> story.enter(other, story.correctionOf(reading, "100 g", 1, "101")));
  }

  @Test
  void asLeftRunNeedsWhatItFollows() {
    refused(
        Reason.RULE_BROKEN,
        () ->
            story.does(
                UseCase.START_RUN,
                t ->
                    store
                        .runs()
                        .add(t, story.newRun(RunKind.AS_LEFT, Story.NOON, Optional.empty()))));
  }

  @Test
  void tooLongATextIsRefusedWhole() {
    refused(
        Reason.RULE_BROKEN,
        () ->
            story.does(
                UseCase.ADD_PERSON,
                t -> store.people().add(t, new NewPerson("n".repeat(61), "Long", Role.AUDITOR))));
  }

  @Test
  void unknownPersonIsRefused() {
    refused(
        Reason.RULE_BROKEN,
        () ->
            story.does(
                UseCase.ADD_PERSON,
                t -> store.people().setPassword(t, 99, new PasswordHash("x"), Story.NOON)));
  }

  @Test
  void changeOfAnOlderVersionIsAChangeMeanwhile() {
    Row row = Row.of(TrailedTable.INSTRUMENT).with("location", "room 3");
    story.does(UseCase.ADD_INSTRUMENT, t -> OpenTransaction.rows(t).update(1, 1, row));
    refused(
        Reason.CHANGED_MEANWHILE,
        () -> story.does(UseCase.ADD_INSTRUMENT, t -> OpenTransaction.rows(t).update(1, 1, row)));
  }

  @Test
  void refusedRowCannotBePassedOver() {
    refused(
        Reason.RULE_BROKEN,
        () ->
            story.does(
                UseCase.ADD_PERSON,
                t -> {
                  store.people().add(t, new NewPerson("half", "Half", Role.AUDITOR));
                  refused(
                      Reason.RULE_BROKEN,
                      () -> store.people().setPassword(t, 99, new PasswordHash("x"), Story.NOON));
                }));
    assertThat(people()).hasSize(3);
  }

  static Stream<Arguments> missing() {
    return Stream.of(
        missing(Thing.INSTRUMENT, s -> t -> s.store.instruments().events(t, "nothing")),
        missing(Thing.STANDARD, s -> t -> s.store.standards().certificates(t, "nothing")),
        missing(Thing.RUN, s -> t -> s.store.runs().addReading(t, 99, s.reading("100 g", 1, "1"))),
        missing(
            Thing.CHECK_POINT, s -> t -> s.store.runs().addReading(t, 1, s.reading("1 g", 1, "1"))),
        missing(Thing.PLAN, s -> t -> s.store.runs().add(t, run(s, 9, "C-2025-118"))),
        missing(Thing.STANDARD_CERTIFICATE, s -> t -> s.store.runs().add(t, run(s, 1, "nothing"))));
  }

  private static Arguments missing(Thing thing, Work work) {
    return arguments(thing, work);
  }

  @ParameterizedTest
  @MethodSource("missing")
  void whatIsMissingIsNamed(Thing thing, Work work) {
    assertThatThrownBy(() -> story.does(UseCase.START_RUN, t -> work.on(story).accept(t)))
        .isInstanceOfSatisfying(
            NotFound.class, refusal -> assertThat(refusal.arguments()).startsWith(thing));
  }

  private static Run run(Story story, int revision, String certificate) {
    return new Run(
        0,
        Story.BALANCE,
        Story.PLAN.title(),
        revision,
        RunKind.AS_FOUND,
        story.technician,
        Story.NOON,
        Optional.empty(),
        List.of(new Run.StandardInUse("100 g", Story.WEIGHT, certificate)));
  }

  private void sign(Transaction transaction, long event, long person) {
    store
        .runs()
        .addSignature(
            transaction,
            event,
            new Signature(person, Signature.Meaning.APPROVED, Story.NOON, Story.HASH));
  }

  private Map<String, Map<String, Cell>> people() {
    return story.read(t -> TrailAndTables.rows(t, TrailedTable.PERSON));
  }

  private static void refused(Reason reason, ThrowingCallable work) {
    assertThatThrownBy(work)
        .isInstanceOfSatisfying(
            StoreFailed.class, failed -> assertThat(failed.reason()).isEqualTo(reason));
  }

  /** Something done to a story. */
  interface Work {
    Consumer<Transaction> on(Story story);
  }
}
