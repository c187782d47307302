package org.evenbeam.verification;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.evenbeam.stats.StudentTTest;

/**
 * Everything found at one check point.
 *
 * @param question what was asked
 * @param n how many readings counted, 1 or more
 * @param mean of the readings
 * @param standardDeviation s, with n − 1; empty for one reading
 * @param bias mean less reference value, rounded once
 * @param tTest the classical one-sample t test, as information; empty for one reading and for equal
 *     readings
 * @param biasFinding the bias criterion
 * @param precisionFinding the precision criterion
 * @param fitness whether the readings are fit for the tests made on them
 * @param verdict the worst outcome; empty where nothing was asked, something is missing or readings
 *     are still to come
 * @param notes what a reader must know beside the figures
 */
public record CheckPointFindings(
    CheckPointQuestion question,
    int n,
    double mean,
    OptionalDouble standardDeviation,
    double bias,
    Optional<StudentTTest> tTest,
    BiasFinding biasFinding,
    PrecisionFinding precisionFinding,
    Fitness fitness,
    Optional<Verdict> verdict,
    List<Note> notes) {
  /** Keeps the notes unchangeable. */
  public CheckPointFindings {
    notes = List.copyOf(notes);
  }
}
