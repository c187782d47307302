package org.evenbeam.stats.failures;

/**
 * The exact binomial test of a failure rate.
 *
 * @param pTwoSided probability of all counts no more probable than the one observed
 * @param pLess probability of a count at most as large: small where the rate is below the one
 *     tested
 * @param pGreater probability of a count at least as large: small where it is above
 */
public record BinomialTest(double pTwoSided, double pLess, double pGreater) {}
