package org.evenbeam.store;

import java.math.BigDecimal;
import java.nio.charset.StandardCharsets;
import java.time.Instant;
import java.time.LocalDate;
import java.time.ZoneId;
import java.util.List;
import java.util.Optional;
import java.util.function.Consumer;
import java.util.function.Function;
import org.evenbeam.logbook.Change;
import org.evenbeam.logbook.Role;
import org.evenbeam.logbook.Transaction;
import org.evenbeam.logbook.UseCase;
import org.evenbeam.logbook.certificates.CertificateRecord;
import org.evenbeam.logbook.instruments.Instrument;
import org.evenbeam.logbook.instruments.InstrumentEvent;
import org.evenbeam.logbook.instruments.InstrumentStatus;
import org.evenbeam.logbook.laboratory.Laboratory;
import org.evenbeam.logbook.people.NewPerson;
import org.evenbeam.logbook.people.PasswordHash;
import org.evenbeam.logbook.run.KeptFinding;
import org.evenbeam.logbook.run.Reading;
import org.evenbeam.logbook.run.Run;
import org.evenbeam.logbook.run.RunEvent;
import org.evenbeam.logbook.run.RunKind;
import org.evenbeam.logbook.run.RunStep;
import org.evenbeam.logbook.run.Signature;
import org.evenbeam.logbook.standards.CertifiedValue;
import org.evenbeam.logbook.standards.ReferenceStandard;
import org.evenbeam.logbook.standards.StandardCertificate;
import org.evenbeam.metrology.DecimalSign;
import org.evenbeam.metrology.Spread;
import org.evenbeam.metrology.TypedDecimal;
import org.evenbeam.metrology.UncertaintyBudget;
import org.evenbeam.metrology.UncertaintyTerm;
import org.evenbeam.store.rows.OpenTransaction;
import org.evenbeam.store.rows.Row;
import org.evenbeam.store.rows.TrailedTable;
import org.evenbeam.verification.Criterion;
import org.evenbeam.verification.DecisionRule;
import org.evenbeam.verification.Verdict;
import org.evenbeam.verification.plan.Bounds;
import org.evenbeam.verification.plan.Conditions;
import org.evenbeam.verification.plan.EnvironmentLimits;
import org.evenbeam.verification.plan.LimitTerms;
import org.evenbeam.verification.plan.PlanRevision;
import org.evenbeam.verification.plan.PlannedCheckPoint;

/** A small laboratory's first days, step by step, for tests that need some of it. */
final class Story {
  static final Instant NOON = Instant.parse("2026-03-02T11:00:00.123456Z");
  static final String BALANCE = "BAL-01";
  static final String WEIGHT = "W-100";
  static final Laboratory LABORATORY =
      new Laboratory(
          "Tidewater Laboratory",
          "1 Quay Road\nMudflats",
          ZoneId.of("Pacific/Auckland"),
          DecimalSign.COMMA,
          "en");
  static final Instrument INSTRUMENT =
      new Instrument(
          BALANCE,
          "analytical balance",
          "Norrow",
          "N-220",
          "000417",
          "room 2",
          "mass",
          "g",
          new BigDecimal("0.00"),
          new BigDecimal("220.0000"),
          new BigDecimal("0.0001"),
          "");
  static final ReferenceStandard STANDARD =
      new ReferenceStandard(WEIGHT, "weight of class E2", "Ballaster", "77-3", "g");
  static final StandardCertificate CERTIFICATE =
      new StandardCertificate(
          "C-2025-118",
          "Mass Laboratory Sund",
          "Traceable to the SI by the national standard",
          LocalDate.of(2025, 9, 1),
          LocalDate.of(2027, 8, 31),
          List.of(
              new CertifiedValue(
                  "100 g",
                  new BigDecimal("100.000010"),
                  new UncertaintyBudget(
                      List.of(
                          new UncertaintyTerm(
                              "certificate",
                              new BigDecimal("0.000050"),
                              Spread.NORMAL,
                              new BigDecimal("2.0"),
                              Double.POSITIVE_INFINITY),
                          UncertaintyTerm.of(
                              "drift", new BigDecimal("1.0E-5"), Spread.RECTANGULAR, 12.5)))),
              new CertifiedValue(
                  "50 g", new BigDecimal("50.00"), new UncertaintyBudget(List.of()))));
  static final PlanRevision PLAN = plan(1);

  final LogbookStore store;
  long technician;
  long manager;
  long otherManager;

  Story(LogbookStore store) {
    this.store = store;
  }

  /** In memory, on no screen's thread. */
  static Story inMemory() {
    return new Story(LogbookStore.openInMemory(() -> false));
  }

  static PlanRevision plan(int revision) {
    LimitTerms bias = LimitTerms.of(new BigDecimal("0.0010"));
    LimitTerms mixed =
        new LimitTerms(
            Optional.empty(),
            Optional.of(new BigDecimal("0.10")),
            Optional.of(new BigDecimal("0.001")),
            LimitTerms.Combination.GREATER);
    return new PlanRevision(
        BALANCE,
        "Monthly check",
        revision,
        "Weigh each weight; close the doors.",
        30,
        new EnvironmentLimits(
            new Bounds(Optional.of(new BigDecimal("18.0")), Optional.of(new BigDecimal("24.0"))),
            new Bounds(Optional.empty(), Optional.of(new BigDecimal("70"))),
            Bounds.NONE),
        List.of(
            new PlannedCheckPoint(
                "100 g",
                new BigDecimal("100"),
                WEIGHT,
                "100 g",
                10,
                Optional.of(bias),
                Optional.of(bias),
                Optional.of(mixed),
                0.05,
                DecisionRule.GUARDED_ACCEPTANCE,
                DecisionRule.GUARDED_REJECTION,
                Optional.empty()),
            new PlannedCheckPoint(
                "50 g",
                new BigDecimal("50.0"),
                WEIGHT,
                "50 g",
                6,
                Optional.empty(),
                Optional.of(bias),
                Optional.empty(),
                0.01,
                DecisionRule.SIMPLE_ACCEPTANCE,
                DecisionRule.GUARDED_REJECTION,
                Optional.of("The weight's share is below a tenth"))));
  }

  <T> T change(UseCase useCase, Function<Transaction, T> work) {
    return store
        .transactions()
        .change(new Change(NOON, Optional.of(1L), useCase, Optional.empty()), work);
  }

  void does(UseCase useCase, Consumer<Transaction> work) {
    change(
        useCase,
        transaction -> {
          work.accept(transaction);
          return true;
        });
  }

  <T> T read(Function<Transaction, T> work) {
    return store.transactions().read(work);
  }

  /** Laboratory, people, an instrument in service, a standard and a plan. */
  Story setUp() {
    does(
        UseCase.SET_UP_LABORATORY,
        t -> {
          store.laboratory().add(t, LABORATORY);
          manager = store.people().add(t, new NewPerson("mara", "Mara Vole", Role.MANAGER));
          store.people().setPassword(t, manager, new PasswordHash("$argon2id$v=19$one"), NOON);
        });
    does(
        UseCase.ADD_PERSON,
        t -> {
          technician = store.people().add(t, new NewPerson("tam", "Tam Reed", Role.TECHNICIAN));
          otherManager = store.people().add(t, new NewPerson("olin", "Olin Sedge", Role.MANAGER));
        });
    does(
        UseCase.ADD_INSTRUMENT,
        t -> {
          store.instruments().add(t, INSTRUMENT);
          instrumentEvent(t, InstrumentEvent.Kind.ADDED, Optional.of(InstrumentStatus.IN_SERVICE));
        });
    does(UseCase.ADD_STANDARD, t -> store.standards().add(t, STANDARD));
    does(
        UseCase.ADD_STANDARD_CERTIFICATE,
        t -> store.standards().addCertificate(t, WEIGHT, CERTIFICATE));
    does(UseCase.ADD_PLAN_REVISION, t -> store.plans().add(t, PLAN));
    return this;
  }

  long instrumentEvent(
      Transaction transaction, InstrumentEvent.Kind kind, Optional<InstrumentStatus> status) {
    return store
        .instruments()
        .addEvent(
            transaction,
            BALANCE,
            new InstrumentEvent(0, kind, NOON, manager, "As it was " + kind, status));
  }

  Run newRun(RunKind kind, Instant startedAt, Optional<Run.AsLeftOf> asLeftOf) {
    return new Run(
        0,
        BALANCE,
        PLAN.title(),
        1,
        kind,
        technician,
        startedAt,
        asLeftOf,
        List.of(
            new Run.StandardInUse("100 g", WEIGHT, CERTIFICATE.number()),
            new Run.StandardInUse("50 g", WEIGHT, CERTIFICATE.number())));
  }

  long startRun(Instant at) {
    return change(
        UseCase.START_RUN,
        t -> {
          long run = store.runs().add(t, newRun(RunKind.AS_FOUND_LEFT_SO, at, Optional.empty()));
          event(t, run, 1, RunStep.STARTED, technician, Optional.empty());
          return run;
        });
  }

  long event(
      Transaction transaction,
      long run,
      int sequence,
      RunStep step,
      long person,
      Optional<RunEvent.Answered> answers) {
    Optional<String> reason =
        step == RunStep.ABANDONED || step == RunStep.RETURNED
            ? Optional.of("The door stood open")
            : Optional.empty();
    return store
        .runs()
        .addEvent(transaction, run, new RunEvent(0, sequence, step, person, NOON, reason, answers));
  }

  Reading reading(String checkPoint, int position, String typed) {
    return new Reading(
        0,
        checkPoint,
        position,
        TypedDecimal.parse(typed, DecimalSign.COMMA),
        NOON,
        technician,
        Reading.Source.KEYBOARD,
        Optional.empty(),
        Optional.empty(),
        Optional.empty());
  }

  long enter(long run, Reading reading) {
    return change(UseCase.ENTER_READING, t -> store.runs().addReading(t, run, reading));
  }

  /** Submits at that sequence, with a verdict, and returns the submission's key. */
  long submit(long run, int sequence, Optional<Verdict> verdict) {
    return change(
        UseCase.SUBMIT_RUN,
        t -> {
          long event = event(t, run, sequence, RunStep.SUBMITTED, technician, Optional.empty());
          store.runs().addFindings(t, event, verdict, FINDINGS);
          store
              .runs()
              .addSignature(
                  t, event, new Signature(technician, Signature.Meaning.PREPARED, NOON, HASH));
          return event;
        });
  }

  long approve(long run, int sequence, long submission, long by) {
    return change(
        UseCase.APPROVE_RUN,
        t -> {
          long event =
              event(
                  t,
                  run,
                  sequence,
                  RunStep.APPROVED,
                  by,
                  Optional.of(new RunEvent.Answered(submission, technician)));
          store
              .runs()
              .addSignature(t, event, new Signature(by, Signature.Meaning.APPROVED, NOON, HASH));
          return event;
        });
  }

  CertificateRecord certificate(String number, long run, long approval) {
    return new CertificateRecord(
        number,
        run,
        approval,
        LocalDate.of(2026, 3, 3),
        NOON,
        manager,
        HASH,
        HASH,
        "0.1.0",
        1,
        "{\"number\":\"" + number + "\",\"readings\":\"" + "9".repeat(5000) + "\"}");
  }

  /** Everything that can happen to the records, once: a run from its start to its certificate. */
  Story whole() {
    setUp();
    long run = startRun(NOON);
    does(
        UseCase.RECORD_CONDITIONS,
        t -> store.runs().addConditions(t, run, conditions("20,5"), technician, NOON));
    long first = enter(run, reading("100 g", 1, "100,0003"));
    enter(run, correctionOf(first, "100 g", 1, "100,0002"));
    long struck = enter(run, reading("50 g", 1, "\u22120,5e-3"));
    does(
        UseCase.STRIKE_READING,
        t ->
            store
                .runs()
                .addStrike(t, struck, new Reading.Strike("wrong weight", NOON, technician)));
    enter(run, captured("50 g", 2, "49,9999", "file 7a line 3"));
    long submission = submit(run, 2, Optional.of(Verdict.CONFORMS));
    long approval = approve(run, 3, submission, manager);
    does(
        UseCase.ISSUE_CERTIFICATE,
        t -> store.certificates().add(t, certificate("2026-00001", run, approval)));
    does(
        UseCase.KEEP_CERTIFICATE_DOCUMENT,
        t -> store.certificates().addDocument(t, "2026-00001", DOCUMENT, NOON));
    does(UseCase.ISSUE_CERTIFICATE, this::withdraw);
    return this;
  }

  private void withdraw(Transaction transaction) {
    OpenTransaction.rows(transaction)
        .addNumbered(
            Row.of(TrailedTable.CERTIFICATE_EVENT)
                .with("number", "2026-00001")
                .with("kind", "WITHDRAWN")
                .with("at", NOON)
                .with("person_id", manager)
                .with("reason", "The weight was the wrong one"));
  }

  Reading correctionOf(long reading, String checkPoint, int position, String typed) {
    return new Reading(
        0,
        checkPoint,
        position,
        TypedDecimal.parse(typed, DecimalSign.COMMA),
        NOON,
        technician,
        Reading.Source.KEYBOARD,
        Optional.empty(),
        Optional.of(new Reading.Correction(reading, "typed the wrong digit")),
        Optional.empty());
  }

  Reading captured(String checkPoint, int position, String typed, String sourceKey) {
    return new Reading(
        0,
        checkPoint,
        position,
        TypedDecimal.parse(typed, DecimalSign.COMMA),
        NOON,
        technician,
        Reading.Source.FILE,
        Optional.of(sourceKey),
        Optional.empty(),
        Optional.empty());
  }

  static Conditions conditions(String temperature) {
    return new Conditions(
        Optional.of(TypedDecimal.parse(temperature, DecimalSign.COMMA)),
        Optional.empty(),
        Optional.of(TypedDecimal.parse("1013.25", DecimalSign.POINT)));
  }

  static final String HASH = "ab".repeat(32);
  static final byte[] DOCUMENT = "%PDF-1.7 ".repeat(2000).getBytes(StandardCharsets.US_ASCII);
  static final List<KeptFinding> FINDINGS =
      List.of(
          new KeptFinding(
              "100 g",
              Criterion.BIAS,
              DecisionRule.GUARDED_ACCEPTANCE,
              Optional.of(Verdict.CONFORMS),
              1,
              "{\"b\":\"0.0002\"}"),
          new KeptFinding(
              "50 g",
              Criterion.PRECISION,
              DecisionRule.GUARDED_REJECTION,
              Optional.empty(),
              1,
              "{}"));
}
