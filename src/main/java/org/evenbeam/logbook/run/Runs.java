package org.evenbeam.logbook.run;

import java.time.LocalDate;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import org.evenbeam.logbook.Desk;
import org.evenbeam.logbook.NotFound;
import org.evenbeam.logbook.Session;
import org.evenbeam.logbook.Transaction;
import org.evenbeam.logbook.UseCase;
import org.evenbeam.logbook.instruments.InstrumentEvent;
import org.evenbeam.logbook.instruments.InstrumentRecords;
import org.evenbeam.logbook.instruments.InstrumentStatus;
import org.evenbeam.logbook.plans.PlanRecords;
import org.evenbeam.logbook.standards.StandardCertificate;
import org.evenbeam.logbook.standards.StandardRecords;
import org.evenbeam.verification.plan.PlanRevision;
import org.evenbeam.verification.plan.PlannedCheckPoint;

/**
 * Starting runs, finding them again and giving them up. What is measured is {@link Bench}'s
 * business.
 */
public final class Runs {
  private final Desk desk;
  private final RunRecords runs;
  private final InstrumentRecords instruments;
  private final StandardRecords standards;
  private final PlanRecords plans;
  private final SheetReader sheets;

  /** Works on the given store. */
  public Runs(
      Desk desk,
      RunRecords runs,
      InstrumentRecords instruments,
      StandardRecords standards,
      PlanRecords plans,
      SheetReader sheets) {
    this.desk = desk;
    this.runs = runs;
    this.instruments = instruments;
    this.standards = standards;
    this.plans = plans;
    this.sheets = sheets;
  }

  /**
   * Starts a run; the standards' certificates that hold today are settled with it.
   *
   * @return the run's number
   * @throws NotFound when the instrument or its plan is unknown
   * @throws RunRefused when a standard's certificate does not hold today, the instrument is
   *     retired, or an as-left run lacks its as-found run or the adjustment after it
   */
  public long start(Session session, NewRun wanted) {
    return desk.change(
        session,
        UseCase.START_RUN,
        transaction -> {
          sheets.instrument(transaction, wanted.instrumentTag());
          refuseRetired(transaction, wanted.instrumentTag());
          refuseAsLeftWithoutAdjustment(transaction, wanted);
          PlanRevision plan = plan(transaction, wanted);
          Run run =
              new Run(
                  0,
                  wanted.instrumentTag(),
                  plan.title(),
                  plan.revision(),
                  wanted.kind(),
                  session.person().id(),
                  session.now(),
                  wanted.asLeftOf(),
                  plan.checkPoints().stream()
                      .map(point -> standardInUse(transaction, point, session.today()))
                      .toList());
          long number = runs.add(transaction, run);
          runs.addEvent(transaction, number, step(session, 1, RunStep.STARTED, Optional.empty()));
          return number;
        });
  }

  /**
   * A run's sheet as it stands.
   *
   * @throws NotFound when there is no such run
   */
  public OpenSheet open(Session session, long number) {
    return desk.read(
        session,
        UseCase.READ_RUNS,
        transaction -> {
          List<RunEvent> events = runs.events(transaction, number);
          return new OpenSheet(
              sheets.read(transaction, number),
              state(events),
              events,
              runs.scratches(transaction, number));
        });
  }

  /** The runs in that state, oldest first. */
  public List<RunSummary> inState(Session session, RunState state) {
    return desk.read(session, UseCase.READ_RUNS, transaction -> runs.inState(transaction, state));
  }

  /** An instrument's runs, newest first, at most {@code most}. */
  public List<RunSummary> ofInstrument(Session session, String tag, int most) {
    return desk.read(
        session, UseCase.READ_RUNS, transaction -> runs.ofInstrument(transaction, tag, most));
  }

  /**
   * Takes a returned run up again.
   *
   * @throws RunRefused when it is not returned, or somebody else's
   */
  public void takeUp(Session session, long number) {
    advance(session, number, UseCase.TAKE_UP_RETURNED_RUN, RunState.RETURNED, RunStep.TAKEN_UP, "");
  }

  /**
   * Gives a draft up, with a reason.
   *
   * @throws RunRefused when it is no draft, somebody else's, or the reason is missing
   */
  public void abandon(Session session, long number, String reason) {
    advance(
        session,
        number,
        UseCase.ABANDON_RUN,
        RunState.DRAFT,
        RunStep.ABANDONED,
        Reasons.required(reason));
  }

  private void advance(
      Session session, long number, UseCase useCase, RunState from, RunStep step, String reason) {
    Optional<String> why = Optional.of(reason).filter(text -> !text.isEmpty());
    desk.change(
        session,
        useCase,
        why,
        transaction -> {
          List<RunEvent> events = runs.events(transaction, number);
          Drafts.requireOwn(session, sheets.read(transaction, number), state(events), from);
          return runs.addEvent(transaction, number, step(session, events.size() + 1, step, why));
        });
  }

  /** The state after the last of these steps. */
  static RunState state(List<RunEvent> events) {
    return events.stream()
        .max(Comparator.comparingInt(RunEvent::sequence))
        .orElseThrow()
        .step()
        .state();
  }

  private static RunEvent step(
      Session session, int sequence, RunStep step, Optional<String> reason) {
    return new RunEvent(
        0, sequence, step, session.person().id(), session.now(), reason, Optional.empty());
  }

  private PlanRevision plan(Transaction transaction, NewRun wanted) {
    return plans.current(transaction, wanted.instrumentTag()).stream()
        .filter(plan -> plan.title().equals(wanted.planTitle()))
        .findFirst()
        .orElseThrow(() -> new NotFound(NotFound.Thing.PLAN, wanted.planTitle()));
  }

  private Run.StandardInUse standardInUse(
      Transaction transaction, PlannedCheckPoint point, LocalDate day) {
    List<StandardCertificate> certificates =
        standards.certificates(transaction, point.standardTag());
    StandardCertificate newest =
        certificates.stream()
            .max(Comparator.comparing(StandardCertificate::expires))
            .orElseThrow(() -> RunRefused.standardWithoutCertificate(point.standardTag()));
    StandardCertificate holding =
        certificates.stream()
            .filter(certificate -> certificate.holdsOn(day))
            .max(Comparator.comparing(StandardCertificate::issued))
            .orElseThrow(
                () -> RunRefused.standardExpired(point.standardTag(), newest.expires(), day));
    SheetReader.certified(holding, point);
    return new Run.StandardInUse(point.label(), point.standardTag(), holding.number());
  }

  private void refuseRetired(Transaction transaction, String tag) {
    boolean retired =
        instruments.events(transaction, tag).stream()
            .anyMatch(event -> event.status().equals(Optional.of(InstrumentStatus.RETIRED)));
    if (retired) {
      throw RunRefused.instrumentRetired(tag);
    }
  }

  private void refuseAsLeftWithoutAdjustment(Transaction transaction, NewRun wanted) {
    if ((wanted.kind() == RunKind.AS_LEFT) != wanted.asLeftOf().isPresent()) {
      throw RunRefused.asLeftWithoutAdjustment();
    }
    wanted.asLeftOf().ifPresent(before -> requireAdjustment(transaction, wanted, before));
  }

  private void requireAdjustment(Transaction transaction, NewRun wanted, Run.AsLeftOf before) {
    Run asFound = sheets.run(transaction, before.asFoundRun());
    boolean adjusted =
        instruments.events(transaction, wanted.instrumentTag()).stream()
            .filter(event -> event.id() == before.adjustmentEvent())
            .filter(event -> event.kind() == InstrumentEvent.Kind.ADJUSTMENT)
            .anyMatch(event -> event.at().isAfter(asFound.startedAt()));
    boolean sameInstrument = asFound.instrumentTag().equals(wanted.instrumentTag());
    if (!adjusted || !sameInstrument || asFound.kind() == RunKind.AS_LEFT) {
      throw RunRefused.asLeftWithoutAdjustment();
    }
  }
}
