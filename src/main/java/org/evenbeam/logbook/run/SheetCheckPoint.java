package org.evenbeam.logbook.run;

import java.math.BigDecimal;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.stream.Collectors;
import org.evenbeam.logbook.standards.CertifiedValue;
import org.evenbeam.logbook.standards.ReferenceStandard;
import org.evenbeam.logbook.standards.StandardCertificate;
import org.evenbeam.verification.CheckPointEvaluation;
import org.evenbeam.verification.CheckPointFindings;
import org.evenbeam.verification.CheckPointQuestion;
import org.evenbeam.verification.plan.PlannedCheckPoint;

/**
 * One check point of a run sheet.
 *
 * @param planned what the plan asks
 * @param standard the reference standard
 * @param certificate its certificate in use
 * @param certified the certified value in use
 * @param question the plan's limits resolved against that value
 * @param readings every reading in the order of entry, corrected and struck ones too
 */
public record SheetCheckPoint(
    PlannedCheckPoint planned,
    ReferenceStandard standard,
    StandardCertificate certificate,
    CertifiedValue certified,
    CheckPointQuestion question,
    List<Reading> readings) {
  /** Keeps the readings unchangeable. */
  public SheetCheckPoint {
    readings = List.copyOf(readings);
  }

  /** The readings that stand: not corrected by a later one, struck ones included, by position. */
  public List<Reading> standing() {
    Set<Long> replaced =
        readings.stream()
            .flatMap(reading -> reading.corrects().stream())
            .map(Reading.Correction::readingId)
            .collect(Collectors.toSet());
    return readings.stream()
        .filter(reading -> !replaced.contains(reading.id()))
        .sorted(Comparator.comparingInt(Reading::position))
        .toList();
  }

  /** The readings that enter the statistics, by position. */
  public List<Reading> counting() {
    return standing().stream().filter(reading -> reading.strike().isEmpty()).toList();
  }

  /** How many readings the plan still asks for. */
  public int toGo() {
    return Math.max(0, planned.readings() - counting().size());
  }

  /** What the counting readings show; empty before the first. */
  public Optional<CheckPointFindings> findings() {
    return findings(counting());
  }

  /** What they would show with the struck ones in; empty where none was struck. */
  public Optional<CheckPointFindings> findingsWithStruck() {
    return standing().size() == counting().size() ? Optional.empty() : findings(standing());
  }

  private Optional<CheckPointFindings> findings(List<Reading> chosen) {
    List<BigDecimal> values = chosen.stream().map(reading -> reading.value().value()).toList();
    return values.isEmpty()
        ? Optional.empty()
        : Optional.of(CheckPointEvaluation.of(question, values));
  }
}
