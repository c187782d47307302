package org.evenbeam.logbook.run;

import java.time.LocalDate;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalInt;
import java.util.stream.Collectors;
import org.evenbeam.logbook.NotFound;
import org.evenbeam.logbook.Person;
import org.evenbeam.logbook.Transaction;
import org.evenbeam.logbook.instruments.Instrument;
import org.evenbeam.logbook.instruments.InstrumentRecords;
import org.evenbeam.logbook.laboratory.Laboratory;
import org.evenbeam.logbook.laboratory.LaboratoryRecords;
import org.evenbeam.logbook.people.PersonRecords;
import org.evenbeam.logbook.plans.PlanRecords;
import org.evenbeam.logbook.standards.CertifiedValue;
import org.evenbeam.logbook.standards.ReferenceStandard;
import org.evenbeam.logbook.standards.StandardCertificate;
import org.evenbeam.logbook.standards.StandardRecords;
import org.evenbeam.verification.CheckPointQuestion;
import org.evenbeam.verification.plan.PlanRevision;
import org.evenbeam.verification.plan.PlannedCheckPoint;

/** Puts a run sheet together from what is kept about it. */
public final class SheetReader {
  private final RunRecords runs;
  private final InstrumentRecords instruments;
  private final StandardRecords standards;
  private final PlanRecords plans;
  private final PersonRecords people;
  private final LaboratoryRecords laboratories;

  /** Reads from the given records. */
  public SheetReader(
      RunRecords runs,
      InstrumentRecords instruments,
      StandardRecords standards,
      PlanRecords plans,
      PersonRecords people,
      LaboratoryRecords laboratories) {
    this.runs = runs;
    this.instruments = instruments;
    this.standards = standards;
    this.plans = plans;
    this.people = people;
    this.laboratories = laboratories;
  }

  /**
   * The sheet of a run.
   *
   * @throws NotFound when there is no such run
   */
  public RunSheet read(Transaction transaction, long number) {
    Run run = run(transaction, number);
    Instrument instrument = instrument(transaction, run.instrumentTag());
    PlanRevision plan =
        plans
            .find(transaction, run.instrumentTag(), run.planTitle(), run.planRevision())
            .orElseThrow(() -> new NotFound(NotFound.Thing.PLAN, run.planTitle()));
    Map<String, List<Reading>> readings =
        runs.readings(transaction, number).stream()
            .collect(Collectors.groupingBy(Reading::checkPoint));
    return new RunSheet(
        run,
        LocalDate.ofInstant(run.startedAt(), laboratory(transaction).zone()),
        people.find(transaction, run.technicianId()).map(Person::name).orElseThrow(),
        instrument,
        plan,
        run.standards().stream()
            .map(
                inUse ->
                    checkPoint(
                        transaction,
                        instrument,
                        plan.checkPoint(inUse.checkPoint()),
                        inUse,
                        readings.getOrDefault(inUse.checkPoint(), List.of())))
            .toList(),
        runs.conditions(transaction, number));
  }

  /** The run itself. */
  Run run(Transaction transaction, long number) {
    return runs.find(transaction, number)
        .orElseThrow(() -> new NotFound(NotFound.Thing.RUN, Long.toString(number)));
  }

  /** The instrument of that tag. */
  Instrument instrument(Transaction transaction, String tag) {
    return instruments
        .find(transaction, tag)
        .orElseThrow(() -> new NotFound(NotFound.Thing.INSTRUMENT, tag));
  }

  /** The laboratory's own facts. */
  Laboratory laboratory(Transaction transaction) {
    return laboratories
        .find(transaction)
        .orElseThrow(() -> new NotFound(NotFound.Thing.LABORATORY, ""));
  }

  private SheetCheckPoint checkPoint(
      Transaction transaction,
      Instrument instrument,
      PlannedCheckPoint planned,
      Run.StandardInUse inUse,
      List<Reading> readings) {
    ReferenceStandard standard =
        standards
            .find(transaction, inUse.standardTag())
            .orElseThrow(() -> new NotFound(NotFound.Thing.STANDARD, inUse.standardTag()));
    StandardCertificate certificate =
        standards.certificates(transaction, inUse.standardTag()).stream()
            .filter(c -> c.number().equals(inUse.certificateNumber()))
            .findFirst()
            .orElseThrow(() -> new NotFound(NotFound.Thing.CERTIFICATE, inUse.certificateNumber()));
    CertifiedValue certified = certified(certificate, planned);
    CheckPointQuestion question =
        new CheckPointQuestion(
            planned.label(),
            certified.reference(),
            Optional.of(instrument.resolution()),
            planned.criteria(certified.value(), instrument.rangeSpan()),
            OptionalInt.of(planned.readings()));
    return new SheetCheckPoint(planned, standard, certificate, certified, question, readings);
  }

  /** The certified value that a check point asks for. */
  static CertifiedValue certified(StandardCertificate certificate, PlannedCheckPoint planned) {
    return certificate
        .value(planned.valueLabel())
        .orElseThrow(() -> new NotFound(NotFound.Thing.CERTIFIED_VALUE, planned.valueLabel()));
  }
}
