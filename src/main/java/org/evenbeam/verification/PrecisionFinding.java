package org.evenbeam.verification;

import java.util.Optional;
import java.util.OptionalDouble;
import org.evenbeam.stats.Shown;
import org.evenbeam.stats.StandardDeviationBounds;
import org.evenbeam.stats.VarianceTest;

/**
 * The outcome of the precision criterion.
 *
 * @param bounds what chi-square says about the true standard deviation; empty for one reading and
 *     for equal readings
 * @param test against the limit; empty where not asked or without bounds
 * @param lowerBound one-sided lower bound of the true standard deviation
 * @param upperBound one-sided upper bound of it, never below what the resolution allows
 * @param shown what was shown; empty where not asked or where something is missing
 * @param outcome what was decided; empty where not asked or where something is missing
 */
public record PrecisionFinding(
    Optional<StandardDeviationBounds> bounds,
    Optional<VarianceTest> test,
    OptionalDouble lowerBound,
    OptionalDouble upperBound,
    Optional<Shown> shown,
    Optional<Verdict> outcome) {}
