package org.evenbeam.logbook.run;

import java.nio.charset.StandardCharsets;
import java.time.LocalDate;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.evenbeam.logbook.LastingJson;
import org.evenbeam.logbook.instruments.Instrument;
import org.evenbeam.trail.Sha256;
import org.evenbeam.verification.CheckPointFindings;
import org.evenbeam.verification.Note;
import org.evenbeam.verification.RunFindings;
import org.evenbeam.verification.Verdict;
import org.evenbeam.verification.plan.Conditions;
import org.evenbeam.verification.plan.PlanRevision;

/**
 * A run with everything that belongs to its measurement, as it stands now.
 *
 * @param run what was settled at its start
 * @param performed the day of its start in the laboratory's zone
 * @param technician the name of who measures
 * @param instrument the instrument as described at present
 * @param plan the plan revision in force
 * @param checkPoints in the plan's order
 * @param conditions of the room, as recorded last
 */
public record RunSheet(
    Run run,
    LocalDate performed,
    String technician,
    Instrument instrument,
    PlanRevision plan,
    List<SheetCheckPoint> checkPoints,
    Conditions conditions) {
  /** Keeps the check points unchangeable. */
  public RunSheet {
    checkPoints = List.copyOf(checkPoints);
  }

  /** The check point of that label. */
  public Optional<SheetCheckPoint> checkPoint(String label) {
    return checkPoints.stream().filter(point -> point.planned().label().equals(label)).findFirst();
  }

  /** What the whole run shows so far. */
  public RunFindings findings() {
    List<CheckPointFindings> found =
        checkPoints.stream().map(SheetCheckPoint::findings).flatMap(Optional::stream).toList();
    RunFindings findings = RunFindings.of(checkPoints.size(), found, obstacles());
    int struck = struckThatDecide(findings.verdict());
    if (struck == 0) {
      return findings;
    }
    List<Note> notes = new ArrayList<>(findings.notes());
    notes.add(new Note.StruckReadingsDecide(struck));
    return new RunFindings(found, findings.verdict(), notes);
  }

  /** What keeps the run from a verdict whatever its readings say. */
  public List<Note> obstacles() {
    List<Note> obstacles = new ArrayList<>();
    conditions
        .missing(plan.environment())
        .forEach(c -> obstacles.add(new Note.ConditionMissing(c)));
    conditions
        .outside(plan.environment())
        .forEach(c -> obstacles.add(new Note.ConditionOutside(c)));
    for (SheetCheckPoint point : checkPoints) {
      if (!point.certificate().holdsOn(performed)) {
        obstacles.add(
            new Note.StandardExpired(point.standard().tag(), point.certificate().expires()));
      }
    }
    return obstacles;
  }

  /** SHA-256 of the run's content in canonical form: what a signature is bound to. */
  public String contentSha256() {
    return Sha256.hex(LastingJson.write(this).getBytes(StandardCharsets.UTF_8));
  }

  /** How many readings were struck, where the verdict would differ with them in; else 0. */
  private int struckThatDecide(Optional<Verdict> verdict) {
    int struck = 0;
    List<CheckPointFindings> withStruck = new ArrayList<>();
    for (SheetCheckPoint point : checkPoints) {
      struck += point.standing().size() - point.counting().size();
      point.findingsWithStruck().or(point::findings).ifPresent(withStruck::add);
    }
    Optional<Verdict> other = RunFindings.of(checkPoints.size(), withStruck, obstacles()).verdict();
    return other.equals(verdict) ? 0 : struck;
  }
}
