package org.evenbeam.logbook.run;

import java.time.Instant;
import java.util.List;
import java.util.Optional;

/**
 * What is settled about a run when it starts.
 *
 * @param number the run's number, 0 before it is kept
 * @param instrumentTag the instrument measured
 * @param planTitle its plan
 * @param planRevision the plan's revision in force
 * @param kind in which state the instrument is measured
 * @param technicianId who measures
 * @param startedAt when it was started; the day of this moment is the day performed
 * @param asLeftOf for an as-left run, what came before it
 * @param standards the standard's certificate in use at each check point, in the plan's order
 */
public record Run(
    long number,
    String instrumentTag,
    String planTitle,
    int planRevision,
    RunKind kind,
    long technicianId,
    Instant startedAt,
    Optional<AsLeftOf> asLeftOf,
    List<StandardInUse> standards) {
  /** Keeps the standards unchangeable. */
  public Run {
    standards = List.copyOf(standards);
  }

  /**
   * What an as-left run follows.
   *
   * @param asFoundRun the as-found run's number
   * @param adjustmentEvent the key of the instrument's adjustment between the two
   */
  public record AsLeftOf(long asFoundRun, long adjustmentEvent) {}

  /**
   * The certificate in use at one check point.
   *
   * @param checkPoint the check point's label
   * @param standardTag the reference standard
   * @param certificateNumber the number of its certificate that held on the day
   */
  public record StandardInUse(String checkPoint, String standardTag, String certificateNumber) {}
}
