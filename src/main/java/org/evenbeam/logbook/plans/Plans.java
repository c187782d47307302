package org.evenbeam.logbook.plans;

import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;
import org.evenbeam.logbook.Desk;
import org.evenbeam.logbook.NotFound;
import org.evenbeam.logbook.Session;
import org.evenbeam.logbook.Transaction;
import org.evenbeam.logbook.UseCase;
import org.evenbeam.logbook.instruments.Instrument;
import org.evenbeam.logbook.instruments.InstrumentRecords;
import org.evenbeam.logbook.standards.ReferenceStandard;
import org.evenbeam.logbook.standards.StandardRecords;
import org.evenbeam.verification.plan.PlanRevision;
import org.evenbeam.verification.plan.PlannedCheckPoint;

/** Verification plans, in numbered revisions that are never edited. */
public final class Plans {
  private final Desk desk;
  private final PlanRecords plans;
  private final InstrumentRecords instruments;
  private final StandardRecords standards;

  /** Works on the given store. */
  public Plans(
      Desk desk, PlanRecords plans, InstrumentRecords instruments, StandardRecords standards) {
    this.desk = desk;
    this.plans = plans;
    this.instruments = instruments;
    this.standards = standards;
  }

  /**
   * Adds a revision, the next one of its plan.
   *
   * @throws NotFound when the instrument or a standard is unknown
   * @throws PlanRefused when it is not the next revision, or it asks what cannot be asked
   */
  public void add(Session session, PlanRevision revision) {
    desk.change(
        session,
        UseCase.ADD_PLAN_REVISION,
        transaction -> {
          check(transaction, revision);
          plans.add(transaction, revision);
          return revision;
        });
  }

  /** The newest revision of each plan of an instrument, by title. */
  public List<PlanRevision> current(Session session, String instrumentTag) {
    return desk.read(
        session, UseCase.READ_PLANS, transaction -> plans.current(transaction, instrumentTag));
  }

  private void check(Transaction transaction, PlanRevision revision) {
    Instrument instrument =
        instruments
            .find(transaction, revision.instrumentTag())
            .orElseThrow(() -> new NotFound(NotFound.Thing.INSTRUMENT, revision.instrumentTag()));
    int last =
        plans.current(transaction, revision.instrumentTag()).stream()
            .filter(plan -> plan.title().equals(revision.title()))
            .mapToInt(PlanRevision::revision)
            .findFirst()
            .orElse(0);
    if (revision.revision() != last + 1) {
      throw PlanRefused.notTheNextRevision(revision.title(), revision.revision(), last + 1);
    }
    revision.checkPoints().forEach(point -> check(transaction, instrument, point));
  }

  private void check(Transaction transaction, Instrument instrument, PlannedCheckPoint point) {
    ReferenceStandard standard =
        standards
            .find(transaction, point.standardTag())
            .orElseThrow(() -> new NotFound(NotFound.Thing.STANDARD, point.standardTag()));
    if (!standard.unit().equals(instrument.unit())) {
      throw PlanRefused.otherUnit(
          point.label(), standard.tag(), standard.unit(), instrument.unit());
    }
    boolean shareOfReference =
        Stream.of(point.biasBelow(), point.biasAbove(), point.maximumStandardDeviation())
            .flatMap(Optional::stream)
            .anyMatch(limit -> limit.percentOfReference().isPresent());
    if (shareOfReference && !RatioScale.isOne(instrument.unit())) {
      throw PlanRefused.shareOnIntervalScale(point.label(), instrument.unit());
    }
    resolvable(instrument, point);
  }

  private static void resolvable(Instrument instrument, PlannedCheckPoint point) {
    try {
      point.criteria(point.nominal(), instrument.rangeSpan());
    } catch (IllegalArgumentException unresolvable) {
      throw PlanRefused.cannotBeAsked(point.label(), unresolvable);
    }
  }
}
