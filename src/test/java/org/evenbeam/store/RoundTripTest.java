package org.evenbeam.store;

import static org.assertj.core.api.Assertions.assertThat;

import java.time.Instant;
import java.time.LocalDate;
import java.util.List;
import java.util.Optional;
import java.util.function.Function;
import org.evenbeam.logbook.Person;
import org.evenbeam.logbook.Role;
import org.evenbeam.logbook.Transaction;
import org.evenbeam.logbook.UseCase;
import org.evenbeam.logbook.certificates.CertificateFacts;
import org.evenbeam.logbook.instruments.InstrumentEvent;
import org.evenbeam.logbook.instruments.InstrumentOverview;
import org.evenbeam.logbook.instruments.InstrumentStatus;
import org.evenbeam.logbook.people.PasswordHash;
import org.evenbeam.logbook.run.Reading;
import org.evenbeam.logbook.run.Run;
import org.evenbeam.logbook.run.RunEvent;
import org.evenbeam.logbook.run.RunKind;
import org.evenbeam.logbook.run.RunState;
import org.evenbeam.logbook.run.RunStep;
import org.evenbeam.logbook.run.RunSummary;
import org.evenbeam.logbook.run.Scratch;
import org.evenbeam.logbook.run.Signature;
import org.evenbeam.trail.Sha256;
import org.evenbeam.verification.Verdict;
import org.evenbeam.verification.plan.Conditions;
import org.evenbeam.verification.plan.PlanRevision;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.Test;

class RoundTripTest {
  private final Story story = Story.inMemory();
  private final LogbookStore store = story.store;

  @AfterEach
  void close() {
    store.close();
  }

  @Test
  void laboratoryIsFoundAsAdded() {
    assertThat(one(store.laboratory()::find)).isEmpty();
    story.setUp();
    assertThat(one(store.laboratory()::find)).contains(Story.LABORATORY);
  }

  @Test
  void peopleAreFoundBySignInNameAndByKey() {
    story.setUp();
    Person mara = new Person(story.manager, "mara", "Mara Vole", Role.MANAGER, true);
    assertThat(one(t -> store.people().find(t, "mara"))).contains(mara);
    assertThat(one(t -> store.people().find(t, story.manager))).contains(mara);
    assertThat(one(t -> store.people().find(t, "nobody"))).isEmpty();
    assertThat(list(store.people()::all))
        .extracting(Person::name)
        .containsExactly("Mara Vole", "Olin Sedge", "Tam Reed");
  }

  @Test
  void newestPasswordIsInForce() {
    story.setUp();
    PasswordHash second = new PasswordHash("$argon2id$v=19$two");
    story.does(
        UseCase.ADD_PERSON, t -> store.people().setPassword(t, story.manager, second, Story.NOON));
    assertThat(one(t -> store.people().password(t, story.manager))).contains(second);
    assertThat(one(t -> store.people().password(t, story.technician))).isEmpty();
  }

  @Test
  void instrumentsKeepEveryDigit() {
    story.setUp();
    assertThat(one(t -> store.instruments().find(t, Story.BALANCE))).contains(Story.INSTRUMENT);
    assertThat(one(t -> store.instruments().find(t, "none"))).isEmpty();
  }

  @Test
  void instrumentEventsComeOldestFirst() {
    story.setUp();
    long stopped =
        story.change(
            UseCase.STOP_INSTRUMENT,
            t ->
                story.instrumentEvent(
                    t, InstrumentEvent.Kind.STOPPED, Optional.of(InstrumentStatus.OUT_OF_SERVICE)));
    List<InstrumentEvent> events = story.read(t -> store.instruments().events(t, Story.BALANCE));
    assertThat(events)
        .extracting(InstrumentEvent::kind)
        .containsExactly(InstrumentEvent.Kind.ADDED, InstrumentEvent.Kind.STOPPED);
    assertThat(events.get(1))
        .isEqualTo(
            new InstrumentEvent(
                stopped,
                InstrumentEvent.Kind.STOPPED,
                Story.NOON,
                story.manager,
                "As it was STOPPED",
                Optional.of(InstrumentStatus.OUT_OF_SERVICE)));
  }

  @Test
  void overviewHasTheStatusOfTheLastEventThatSetOne() {
    story.setUp();
    story.does(
        UseCase.STOP_INSTRUMENT,
        t ->
            story.instrumentEvent(
                t, InstrumentEvent.Kind.STOPPED, Optional.of(InstrumentStatus.OUT_OF_SERVICE)));
    story.does(
        UseCase.RECORD_INSTRUMENT_EVENT,
        t -> story.instrumentEvent(t, InstrumentEvent.Kind.MAINTENANCE, Optional.empty()));
    assertThat(list(store.instruments()::all))
        .containsExactly(
            new InstrumentOverview(
                Story.INSTRUMENT,
                InstrumentStatus.OUT_OF_SERVICE,
                "As it was STOPPED",
                Optional.empty(),
                Optional.empty()));
  }

  @Test
  void dueDateCountsFromTheLocalDayOfTheLastApprovedRunThatConforms() {
    story.setUp();
    approved(Instant.parse("2026-03-02T10:59:59Z"), Verdict.CONFORMS);
    assertThat(verified()).contains(LocalDate.of(2026, 3, 2));
    approved(Instant.parse("2026-03-02T11:00:00Z"), Verdict.CONFORMS);
    assertThat(verified()).contains(LocalDate.of(2026, 3, 3));
    approved(Instant.parse("2026-04-01T00:00:00Z"), Verdict.UNDECIDED);
    approved(Instant.parse("2026-04-02T00:00:00Z"), Verdict.DOES_NOT_CONFORM);
    approved(Instant.parse("2026-01-01T00:00:00Z"), Verdict.CONFORMS);
    story.submit(
        story.startRun(Instant.parse("2026-05-01T00:00:00Z")), 2, Optional.of(Verdict.CONFORMS));
    assertThat(verified()).contains(LocalDate.of(2026, 3, 3));
    assertThat(overview().nextDue()).contains(LocalDate.of(2026, 4, 2));
  }

  @Test
  void returnedRunThatConformsMovesNoDueDate() {
    story.setUp();
    long run = story.startRun(Story.NOON);
    long submission = story.submit(run, 2, Optional.of(Verdict.CONFORMS));
    story.does(
        UseCase.RETURN_RUN,
        t ->
            story.event(
                t,
                run,
                3,
                RunStep.RETURNED,
                story.manager,
                Optional.of(new RunEvent.Answered(submission, story.technician))));
    assertThat(verified()).isEmpty();
    assertThat(list(t -> store.runs().inState(t, RunState.RETURNED))).hasSize(1);
  }

  @Test
  void standardsAndCertificatesKeepBudgetsTermByTerm() {
    story.setUp();
    assertThat(list(store.standards()::all)).containsExactly(Story.STANDARD);
    assertThat(one(t -> store.standards().find(t, Story.WEIGHT))).contains(Story.STANDARD);
    assertThat(list(t -> store.standards().certificates(t, Story.WEIGHT)))
        .containsExactly(Story.CERTIFICATE);
  }

  @Test
  void newestRevisionOfAPlanIsCurrentAndTheFirstStaysAsItWas() {
    story.setUp();
    PlanRevision second = Story.plan(2);
    story.does(UseCase.ADD_PLAN_REVISION, t -> store.plans().add(t, second));
    assertThat(list(t -> store.plans().current(t, Story.BALANCE))).containsExactly(second);
    assertThat(one(t -> store.plans().find(t, Story.BALANCE, second.title(), 1)))
        .contains(Story.PLAN);
    assertThat(one(t -> store.plans().find(t, Story.BALANCE, second.title(), 3))).isEmpty();
  }

  @Test
  void runsAreNumberedFromOneWithoutAGap() {
    story.setUp();
    long first = story.startRun(Story.NOON);
    long second = story.startRun(Story.NOON);
    assertThat(List.of(first, second)).containsExactly(1L, 2L);
  }

  @Test
  void runIsFoundWithItsStandards() {
    story.setUp();
    long number = story.startRun(Story.NOON);
    Run expected = story.newRun(RunKind.AS_FOUND_LEFT_SO, Story.NOON, Optional.empty());
    assertThat(story.read(t -> store.runs().find(t, number)).orElseThrow())
        .usingRecursiveComparison()
        .ignoringFields("number")
        .isEqualTo(expected);
    assertThat(one(t -> store.runs().find(t, 99))).isEmpty();
  }

  @Test
  void asLeftRunNamesItsAsFoundRunAndTheAdjustment() {
    story.setUp();
    long asFound = story.startRun(Story.NOON);
    long adjustment =
        story.change(
            UseCase.RECORD_INSTRUMENT_EVENT,
            t -> story.instrumentEvent(t, InstrumentEvent.Kind.ADJUSTMENT, Optional.empty()));
    Run.AsLeftOf follows = new Run.AsLeftOf(asFound, adjustment);
    long asLeft =
        story.change(
            UseCase.START_RUN,
            t ->
                store
                    .runs()
                    .add(t, story.newRun(RunKind.AS_LEFT, Story.NOON, Optional.of(follows))));
    assertThat(story.read(t -> store.runs().find(t, asLeft)).orElseThrow().asLeftOf())
        .contains(follows);
  }

  @Test
  void summaryHasTheStateOfTheLastEventAndTheVerdictOfTheLastSubmission() {
    story.setUp();
    long run = story.startRun(Story.NOON);
    assertThat(list(t -> store.runs().inState(t, RunState.DRAFT)))
        .containsExactly(summary(run, RunState.DRAFT, Optional.empty()));
    long submission = story.submit(run, 2, Optional.of(Verdict.UNDECIDED));
    assertThat(list(t -> store.runs().inState(t, RunState.SUBMITTED)))
        .containsExactly(summary(run, RunState.SUBMITTED, Optional.of(Verdict.UNDECIDED)));
    story.approve(run, 3, submission, story.manager);
    assertThat(list(t -> store.runs().inState(t, RunState.DRAFT))).isEmpty();
    assertThat(list(t -> store.runs().ofInstrument(t, Story.BALANCE, 5)))
        .containsExactly(summary(run, RunState.APPROVED, Optional.of(Verdict.UNDECIDED)));
  }

  @Test
  void runsOfAnInstrumentComeNewestFirstUpToTheMost() {
    story.setUp();
    story.startRun(Story.NOON);
    story.startRun(Story.NOON.plusSeconds(60));
    story.startRun(Story.NOON.minusSeconds(60));
    assertThat(list(t -> store.runs().ofInstrument(t, Story.BALANCE, 2)))
        .extracting(RunSummary::number)
        .containsExactly(2L, 1L);
  }

  @Test
  void stepsAndSignaturesComeOldestFirst() {
    story.setUp();
    long run = story.startRun(Story.NOON);
    long submission = story.submit(run, 2, Optional.of(Verdict.CONFORMS));
    long approval = story.approve(run, 3, submission, story.manager);
    assertThat(list(t -> store.runs().events(t, run)))
        .extracting(RunEvent::step)
        .containsExactly(RunStep.STARTED, RunStep.SUBMITTED, RunStep.APPROVED);
    assertThat(story.read(t -> store.runs().events(t, run)).get(2))
        .isEqualTo(
            new RunEvent(
                approval,
                3,
                RunStep.APPROVED,
                story.manager,
                Story.NOON,
                Optional.empty(),
                Optional.of(new RunEvent.Answered(submission, story.technician))));
    assertThat(list(t -> store.runs().signatures(t, run)))
        .containsExactly(
            new Signature(story.technician, Signature.Meaning.PREPARED, Story.NOON, Story.HASH),
            new Signature(story.manager, Signature.Meaning.APPROVED, Story.NOON, Story.HASH));
  }

  @Test
  void conditionsRecordedLastAreInForce() {
    story.setUp();
    long run = story.startRun(Story.NOON);
    assertThat(story.<Conditions>read(t -> store.runs().conditions(t, run)))
        .isEqualTo(Conditions.NONE);
    for (String temperature : List.of("20,5", "21,00")) {
      story.does(
          UseCase.RECORD_CONDITIONS,
          t ->
              store
                  .runs()
                  .addConditions(
                      t, run, Story.conditions(temperature), story.technician, Story.NOON));
    }
    assertThat(story.<Conditions>read(t -> store.runs().conditions(t, run)))
        .isEqualTo(Story.conditions("21,00"));
  }

  @Test
  void readingsStayAsTypedWithCorrectionsAndStrikes() {
    story.setUp();
    long run = story.startRun(Story.NOON);
    Reading typed = story.reading("100 g", 1, "+100,00030");
    long first = story.enter(run, typed);
    Reading correction = story.correctionOf(first, "100 g", 1, "\u22120,5e-3");
    long second = story.enter(run, correction);
    long third = story.enter(run, story.captured("50 g", 1, "50", "port 2 number 8"));
    Reading.Strike strike = new Reading.Strike("draught", Story.NOON, story.technician);
    story.does(UseCase.STRIKE_READING, t -> store.runs().addStrike(t, third, strike));
    List<Reading> readings = story.read(t -> store.runs().readings(t, run));
    assertThat(readings).extracting(Reading::id).containsExactly(first, second, third);
    assertThat(readings.get(0)).usingRecursiveComparison().ignoringFields("id").isEqualTo(typed);
    assertThat(readings.get(1))
        .usingRecursiveComparison()
        .ignoringFields("id")
        .isEqualTo(correction);
    assertThat(readings.get(2).sourceKey()).contains("port 2 number 8");
    assertThat(readings.get(2).strike()).contains(strike);
  }

  @Test
  void findingsAreKeptInTheirOrder() {
    story.setUp();
    long submission = story.submit(story.startRun(Story.NOON), 2, Optional.empty());
    assertThat(list(t -> store.runs().findings(t, submission))).isEqualTo(Story.FINDINGS);
  }

  @Test
  void scratchIsReplacedAndAnEmptyOneRemovesIt() {
    story.setUp();
    long run = story.startRun(Story.NOON);
    scratch(run, "100,0");
    scratch(run, "100,00");
    assertThat(list(t -> store.runs().scratches(t, run)))
        .containsExactly(new Scratch("100 g", "100,00", Story.NOON));
    scratch(run, "");
    assertThat(list(t -> store.runs().scratches(t, run))).isEmpty();
  }

  @Test
  void certificatesAreFoundAndListed() {
    story.whole();
    assertThat(one(t -> store.certificates().find(t, "2026-00001")))
        .contains(story.certificate("2026-00001", 1, approvalOf(1)));
    CertificateFacts facts =
        new CertificateFacts(
            "2026-00001",
            1,
            Story.BALANCE,
            LocalDate.of(2026, 3, 3),
            Story.NOON,
            "Mara Vole",
            Optional.of(Verdict.CONFORMS),
            Optional.of(Sha256.hex(Story.DOCUMENT)));
    assertThat(list(t -> store.certificates().newest(t, 10))).containsExactly(facts);
    assertThat(list(t -> store.certificates().ofRun(t, 1))).containsExactly(facts);
    assertThat(story.read(t -> store.certificates().document(t, "2026-00001")).orElseThrow())
        .isEqualTo(Story.DOCUMENT);
  }

  @Test
  void certificateWithoutDocumentIsNamedUntilItHasOne() {
    story.whole();
    story.does(
        UseCase.ISSUE_CERTIFICATE,
        t -> store.certificates().add(t, story.certificate("2026-00002", 1, approvalOf(1))));
    assertThat(list(store.certificates()::withoutDocument)).containsExactly("2026-00002");
    assertThat(one(t -> store.certificates().document(t, "2026-00002"))).isEmpty();
    assertThat(story.read(t -> store.certificates().newest(t, 10)).get(0).documentSha256())
        .isEmpty();
  }

  @Test
  void certificatesAreCountedByTheLaboratorysYear() {
    story.whole();
    assertThat(story.<Integer>read(t -> store.certificates().countOfYear(t, 2026))).isOne();
    assertThat(story.<Integer>read(t -> store.certificates().countOfYear(t, 2025))).isZero();
    assertThat(story.<Integer>read(t -> store.certificates().countOfYear(t, 2027))).isZero();
  }

  @Test
  void partsOfAMicrosecondAreDroppedAndNotRounded() {
    story.setUp();
    long run = story.startRun(Instant.parse("2026-03-02T11:00:00.123456999Z"));
    assertThat(story.read(t -> store.runs().find(t, run)).orElseThrow().startedAt())
        .isEqualTo(Instant.parse("2026-03-02T11:00:00.123456Z"));
  }

  private <T> Optional<T> one(Function<Transaction, Optional<T>> work) {
    return story.read(work);
  }

  private <T> List<T> list(Function<Transaction, List<T>> work) {
    return story.read(work);
  }

  private void approved(Instant startedAt, Verdict verdict) {
    long run = story.startRun(startedAt);
    story.approve(run, 3, story.submit(run, 2, Optional.of(verdict)), story.manager);
  }

  private void scratch(long run, String text) {
    store
        .transactions()
        .scratch(
            t -> {
              store.runs().keepScratch(t, run, new Scratch("100 g", text, Story.NOON));
              return true;
            });
  }

  private long approvalOf(long run) {
    return story.read(t -> store.runs().events(t, run)).get(2).id();
  }

  private InstrumentOverview overview() {
    return story.read(store.instruments()::all).get(0);
  }

  private Optional<LocalDate> verified() {
    return overview().lastVerified();
  }

  private RunSummary summary(long run, RunState state, Optional<Verdict> verdict) {
    return new RunSummary(
        run,
        Story.BALANCE,
        Story.PLAN.title(),
        1,
        RunKind.AS_FOUND_LEFT_SO,
        story.technician,
        "Tam Reed",
        Story.NOON,
        state,
        verdict);
  }
}
